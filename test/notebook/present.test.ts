import { afterEach, describe, expect, it } from "vitest";
import { model } from "../../kernel-helpers/method/index.js";
import { showIn } from "../../kernel-helpers/notebook/display-system.js";
import type { KnownType } from "../../kernel-helpers/notebook/known-type.js";
import { present } from "../../kernel-helpers/notebook/present.js";
import { ergun } from "../../kernel-helpers/physics/bed/ergun-1952.js";
import { degF, ft, mm, psi } from "../../kernel-helpers/units/index.js";

const plain = async (value: unknown, known: KnownType | null = null): Promise<unknown> =>
  (await present(value, known))["text/plain"];
const length = { kind: "length" } as const;
const pressure = { kind: "pressure" } as const;
const bare = (text: unknown): string => String(text).replaceAll("\u202f", " ");

describe("a quantity", () => {
  afterEach(() => showIn("SI"));
  it("has its unit and kind, which the number alone does not tell", async () => {
    expect(await plain(mm(216.8), length)).toBe("216.8 mm (length)");
    expect(bare(await plain(psi(5200), pressure))).toBe("35.85 MPa (absolute pressure)");
    expect(await plain(mm(216.8))).toBe("0.21680000000000002");
  });
  it("is shown in field units when the notebook asks for them", async () => {
    showIn("field");
    expect(await plain(degF(230), { kind: "temperature" })).toBe("230.0 °F (temperature)");
  });
  it("has the words of its kind without what stands in brackets there", async () => {
    expect(await plain(ft(10), { kind: "measuredDepth" })).toMatch(/\(measured depth\)$/);
  });
  it("shows a dimensionless number and what is no number as they are", async () => {
    expect(await plain(0.4, { kind: "dimensionless" })).toBe("0.4");
    expect(await plain("text", length)).toBe("'text'");
    expect(await plain(NaN, length)).toBe("NaN");
  });
  it("shares one unit with its neighbours in a list", async () => {
    expect(await plain([mm(5), mm(1200)], { each: length })).toBe("[0.005, 1.200] m (length)");
    const many = Array.from({ length: 200 }, () => mm(5));
    expect(bare(await plain(many, { each: length }))).toMatch(/, … 200 in all\] mm \(length\)$/);
    expect(await plain([], { each: length })).toBe("[]");
  });
  it("is found in the fields of a result", async () => {
    const known = { fields: { q: length, in: { fields: { p: pressure } } } };
    const text = bare(await plain({ q: mm(5), n: 3, in: { p: psi(14.7) } }, known));
    expect(text.split("\n")).toEqual([
      "q     5.000 mm    length",
      "n     3",
      "in.p  0.1014 MPa  absolute pressure",
    ]);
  });
});

describe("a value that brings its own display", () => {
  const shown = (display: () => unknown) => ({ [Symbol.for("Jupyter.display")]: display });
  it("is asked for it, and waited for", async () => {
    const bundle = await present(shown(() => Promise.resolve({ "text/html": "<b>x</b>" })));
    expect(bundle).toEqual({ "text/plain": "(shown as text/html)", "text/html": "<b>x</b>" });
  });
  it("comes before every other way of showing, and its bytes travel as base64", async () => {
    const value = shown(() => ({ "text/plain": "p", "image/png": new Uint8Array([1, 2, 3]) }));
    expect(await present(value, length)).toEqual({ "text/plain": "p", "image/png": "AQID" });
  });
  it("is refused when it gives no mime bundle", async () => {
    for (const wrong of [null, undefined, "text", { html: "no mime type" }])
      await expect(present(shown(() => wrong))).rejects.toMatchObject({
        code: "not-a-mime-bundle",
      });
  });
});

describe("a reference to a recorded item", () => {
  const reference = (type: unknown, value: () => unknown, path: unknown[] = []) => ({
    __ref: type,
    id: "bed",
    path,
    get value() {
      return value();
    },
  });
  it("shows which item it is and the value it has now", async () => {
    let now = mm(5);
    const ref = reference("length", () => now);
    expect(await plain(ref)).toBe("bed: 5.000 mm (length)");
    now = mm(6);
    expect(await plain(ref)).toBe("bed: 6.000 mm (length)");
  });
  it("reads the fields of a struct, lists and profiles by their declared types", async () => {
    const struct = {
      type: "struct",
      fields: {
        p: { kind: "pressure" },
        along: { kind: { type: "profile", of: "velocity" } },
        gap: { kind: { type: "optional", of: "length" } },
      },
    };
    const value = { p: psi(14.7), along: { depth: [ft(1)], value: [2] }, gap: null };
    const text = bare(await plain(reference(struct, () => value, ["result", 1])));
    expect(text.split("\n").map((row) => row.split(/ {2,}/).join(" | "))).toEqual([
      "bed › result › 1: ",
      "p | 0.1014 MPa | absolute pressure",
      "along.depth | [0.3048] m MD | measured depth",
      "along.value | [2.000] m/s | velocity",
      "gap | null",
    ]);
    expect(await plain(reference({ type: "list", each: "length" }, () => [mm(5)]))).toBe(
      "bed: [5.000] mm (length)",
    );
  });
  it("says why there is no value, and does not fail", async () => {
    const stopped = reference("length", () => {
      throw new Error("bed: no length");
    });
    expect(await plain(stopped)).toBe("bed: bed: no length");
  });
});

it("to show a value runs none of its accessors", async () => {
  let looks = 0;
  const value = {
    q: mm(5),
    get trap() {
      return (looks += 1);
    },
  };
  const known = { fields: { q: length, trap: { kind: "mass" } } } as const;
  expect(await plain(value, known)).toBe("q  5.000 mm  length");
  expect(looks).toBe(0);
});

describe("a declared method", () => {
  it("is a card with its equation, inputs, ranges and source", async () => {
    const bundle = await present(ergun);
    expect(bundle["text/latex"]).toBe(`$$${ergun.result.symbol} = ${ergun.tex}$$`);
    const card = String(bundle["text/markdown"]);
    expect(card).toContain("`ergun-1952`, revision");
    expect(card).toContain(String(bundle["text/latex"]));
    expect(card).toMatch(/\| `mu` \| \$\\mu\$ \| .* \| a dynamic viscosity \| Pa s \| above 0 \|/);
    expect(card).toContain("Source: Ergun (1952)");
    for (const row of card.split("\n").filter((line) => line.startsWith("|")))
      expect(row.replaceAll("\\|", "").split("|")).toHaveLength(8);
    expect(bundle["text/plain"]).toContain(ergun.title);
  });
});

describe("a declared model", () => {
  it("is a card with what it is about, its inputs, results and tolerances", async () => {
    const twice = model({
      id: "twice",
      revision: 2,
      title: "Twice a length",
      about: ["Doubles | a length."],
      uses: [],
      tolerances: { relative: 1e-6 },
      inputs: { x: { kind: "length", note: "a length | with a bar" } },
      results: { y: { kind: "length", note: "its double" } },
      solve: ({ x }) => ({ y: 2 * x }),
    });
    const card = String((await present(twice))["text/markdown"]);
    expect(card).toContain("**Twice a length** · `twice`, revision 2");
    expect(card).toContain("a length \\| with a bar");
    expect(card).toContain("| `y` |");
    expect(card).toContain("Tolerances: relative 0.000001.");
  });
});

describe("a data frame", () => {
  const frame = (columns: string[], values: unknown[]) => ({
    $columns: columns,
    columns,
    index: values.map((_, i) => i),
    values,
  });
  it("is a table in text and in HTML, escaped, with even decimals in a column", async () => {
    const bundle = await present(
      frame(
        ["a", "<b>"],
        [
          [1, "x & y"],
          [2.5, null],
          [-3, "z"],
        ],
      ),
    );
    expect(String(bundle["text/plain"]).split("\n")).toEqual([
      "         a    <b>",
      "0   1.0000  x & y",
      "1   2.5000",
      "2  −3.0000      z",
    ]);
    expect(bundle["text/html"]).toContain("<th>&lt;b&gt;</th>");
    expect(bundle["text/html"]).toContain("<td>x &amp; y</td>");
  });
  it("leaves whole numbers whole and shows each of numbers that span decades", async () => {
    const text = bare(
      await plain(
        frame(
          ["n", "k"],
          [
            [1, 1e-9],
            [20, 1e6],
          ],
        ),
      ),
    );
    expect(text.split("\n").map((row) => row.trim().split(/ {2,}/))).toEqual([
      ["n", "k"],
      ["0", "1", "1.0000 × 10⁻⁹"],
      ["1", "20", "1 000 000"],
    ]);
  });
  it("leaves out the middle of a long one and says how long it is", async () => {
    const rows = Array.from({ length: 500 }, (_, i) => [i]);
    const lines = String(await plain(frame(["i"], rows))).split("\n");
    expect(lines.length).toBeLessThan(45);
    expect(lines.join("\n")).toContain("… 500 rows");
    expect(lines.at(-1)).toMatch(/499 +499/);
  });
  it("may have one column only, as a series has", async () => {
    expect(String(await plain(frame(["a"], [1, 2]))).split("\n")).toHaveLength(3);
  });
});

it("any other value is shown as Node shows it", async () => {
  expect(await plain({ a: [1, "x"] })).toBe("{ a: [ 1, 'x' ] }");
});
