import fc from "fast-check";
import { describe, expect, it } from "vitest";
import type { Cell, Column } from "../../kernel-helpers/tables/column.js";
import { toCsv } from "../../kernel-helpers/tables/to-csv.js";
import { codeOf } from "../code-of.js";

const csv = (...columns: Column[]): string => toCsv({ columns });
const one = (...values: Cell[]): string => csv({ head: "h", values }, { head: "k", values });

/** A reader of RFC 4180 by its grammar, one character at a time. */
function parse(text: string): string[][] {
  const rows: string[][] = [[]];
  let cell = "";
  let inside = false;
  for (let i = 0; i < text.length; i++) {
    const c = text.charAt(i);
    if (inside) {
      if (c !== '"') cell += c;
      else if (text.charAt(i + 1) === '"') cell += text.charAt(++i);
      else inside = false;
    } else if (c === '"') inside = true;
    else if (c === "," || c === "\r") {
      rows[rows.length - 1]?.push(cell);
      cell = "";
      if (c === "\r") {
        rows.push([]);
        i++;
      }
    } else cell += c;
  }
  return rows.slice(0, -1);
}

describe("toCsv", () => {
  it("writes units in the header and ends every line with CRLF", () => {
    expect(
      csv(
        { head: "depth", unit: "m MD", values: [0, 1500.5] },
        { head: "note", values: ["surface", null] },
        { head: "open", values: [true, false] },
      ),
    ).toBe("depth [m MD],note,open\r\n0,surface,true\r\n1500.5,,false\r\n");
  });
  it("quotes commas, quotes and line ends as RFC 4180 section 2 prints them", () => {
    expect(csv({ head: "a", values: ["aaa", "b\r\nbb", 'b"bb', "x,y"] })).toBe(
      'a\r\naaa\r\n"b\r\nbb"\r\n"b""bb"\r\n"x,y"\r\n',
    );
    expect(csv({ head: 'say "a", b', values: [] })).toBe('"say ""a"", b"\r\n');
  });
  it("keeps every digit of a number", () => {
    const number = fc.double({ noNaN: true, noDefaultInfinity: true });
    fc.assert(
      fc.property(fc.array(number, { minLength: 1 }), (values) => {
        const back = parse(csv({ head: "x", values })).slice(1);
        expect(back.map(([x]) => Number(x))).toEqual(values.map((x) => x + 0));
      }),
    );
  });
  it("reads back as what was written, whatever the text", () => {
    const text = fc.string({
      unit: fc.constantFrom("a", "b", ",", '"', "\r", "\n", "\t", "=", " ", "µ", "'"),
    });
    fc.assert(
      fc.property(fc.array(text, { minLength: 1 }), (values) => {
        const back = parse(csv({ head: "x", values })).slice(1);
        expect(back).toHaveLength(values.length);
        back.forEach(([cell], i) => {
          const meant = values[i] as string;
          expect([meant, `'${meant}`]).toContain(cell);
          if (cell !== meant) expect(meant).toMatch(/^[=+\-@\t\r]/);
        });
      }),
    );
  });
  it("disarms what a spreadsheet would run, and nothing else", () => {
    const body = one("=1+1", "+cmd", "-2+3", "@SUM(A1)", "-5", "+1.5e3", "a=b", "'x").split("\r\n");
    expect(body.slice(1, -1).map((row) => row.split(",")[0])).toEqual([
      "'=1+1",
      "'+cmd",
      "'-2+3",
      "'@SUM(A1)",
      "-5",
      "+1.5e3",
      "a=b",
      "'x",
    ]);
    expect(one(-5, 1e-7)).toBe("h,k\r\n-5,-5\r\n1e-7,1e-7\r\n");
    expect(csv({ head: "=a", values: [] })).toBe("'=a\r\n");
  });
  it("writes a missing value so that its row is kept", () => {
    expect(csv({ head: "x", values: [1, null, 2] })).toBe('x\r\n1\r\n""\r\n2\r\n');
    expect(one(null)).toBe("h,k\r\n,\r\n");
  });
  it("takes a float64 array", () => {
    expect(csv({ head: "x", values: new Float64Array([0.1, -0]) })).toBe("x\r\n0.1\r\n0\r\n");
  });
});

describe("toCsv refuses", () => {
  const code = (...columns: Column[]): string => codeOf(() => toCsv({ columns }));
  it("columns of unlike length, naming both", () => {
    const act = (): string =>
      csv({ head: "a", values: [1, 2] }, { head: "b", unit: "m", values: [1] });
    expect(codeOf(act)).toBe("ragged-columns");
    expect(act).toThrow(/"b \[m\]": has 1 values; expected 2, as many as "a"/);
  });
  it("no columns, a column without a head, a head twice", () => {
    expect(code()).toBe("no-columns");
    expect(code({ head: " ", values: [] })).toBe("no-head");
    expect(code({ head: "a", values: [] }, { head: "a", values: [] })).toBe("duplicate-head");
  });
  it("a column of several types, and what is no cell", () => {
    expect(code({ head: "a", values: [null, 1, "1"] })).toBe("mixed-column");
    expect(code({ head: "a", values: [1, NaN] })).toBe("not-a-number");
    expect(code({ head: "a", values: [1, -Infinity] })).toBe("not-a-number");
    expect(code({ head: "a", values: [undefined] as unknown as Cell[] })).toBe("wrong-cell");
    expect(code({ head: "a", values: [{}] as unknown as Cell[] })).toBe("wrong-cell");
  });
});
