import { describe, expect, it } from "vitest";
import { StillwellError } from "../../kernel-helpers/errors/index.js";
import { frame } from "../../kernel-helpers/tables/frame.js";
import { loadDanfo } from "../../kernel-helpers/tables/load-danfo.js";
import { codeOf } from "../code-of.js";

const profile = () =>
  frame([
    { head: "depth", unit: "m MD", values: [0, 1000.25, 2000.5, 3000] },
    { head: "pressure", unit: "MPa", values: [1234567.891, 0.1, null, 2.5] },
    { head: "fluid", values: ["a-b", "007", null, "a"] },
    { head: "in bed", values: [true, false, false, true] },
  ]);
const rejection = async (act: Promise<unknown>): Promise<StillwellError> => {
  const error: unknown = await act.then(
    () => null,
    (e: unknown) => e,
  );
  if (error instanceof StillwellError) return error;
  throw new Error("was not refused by name", { cause: error });
};

describe("frame", () => {
  it("keeps every value as it was given, with units in the labels", async () => {
    const f = await profile();
    expect(f.columns).toEqual(["depth [m MD]", "pressure [MPa]", "fluid", "in bed"]);
    expect(f.shape).toEqual([4, 4]);
    expect(f.values).toEqual([
      [0, 1234567.891, "a-b", true],
      [1000.25, 0.1, "007", false],
      [2000.5, null, null, false],
      [3000, 2.5, "a", true],
    ]);
    expect(f.column("pressure [MPa]")).toEqual([1234567.891, 0.1, null, 2.5]);
    expect(f.at(1, "fluid")).toBe("007");
    expect(f.iat(3, 0)).toBe(3000);
  });
  it("can be sliced, shown and exported", async () => {
    const f = await profile();
    expect(f.head(2).column("depth [m MD]")).toEqual([0, 1000.25]);
    expect(f.tail(1).values).toEqual([[3000, 2.5, "a", true]]);
    expect(f.iloc({ rows: [1, 3], columns: [0] }).values).toEqual([[1000.25], [3000]]);
    expect(f.loc({ columns: ["fluid"] }).values).toEqual([["a-b"], ["007"], [null], ["a"]]);
    expect(f.query([false, true, false, true]).column("depth [m MD]")).toEqual([1000.25, 3000]);
    expect(f.drop({ columns: ["fluid"] }).columns).not.toContain("fluid");
    expect(f.toJSON()[1]).toEqual({
      "depth [m MD]": 1000.25,
      "pressure [MPa]": 0.1,
      fluid: "007",
      "in bed": false,
    });
    expect(f.toString()).toContain("1234567.891");
  });
  it("shows itself to whoever looks for a danfojs frame", async () => {
    const f = await profile();
    expect("$columns" in f).toBe(true);
    expect((f as unknown as { $columns: string[] }).$columns).toHaveLength(4);
    expect((f as unknown as Record<string, unknown>)["fluid"]).toEqual(["a-b", "007", null, "a"]);
  });
  it("takes a float64 array and a column whose first rows are whole or missing", async () => {
    const late = [...Array<number>(30).fill(1), 2.5];
    const f = await frame([
      { head: "late", values: late },
      { head: "array", values: new Float64Array(31).fill(0.1) },
      { head: "gone", values: Array<null>(31).fill(null) },
    ]);
    expect(f.column("late")).toEqual(late);
    expect(f.iat(30, 1)).toBe(0.1);
    expect(f.iat(30, 2)).toBeNull();
  });
});

describe("a frame refuses", () => {
  const refused = [
    ...["add", "sub", "mul", "div", "pow", "mod", "sum", "mean", "std", "describe", "groupby"],
    ...["sortValues", "sortIndex", "toCSV", "dtypes", "ctypes", "apply", "merge", "addColumn"],
  ].filter((name) => name !== "merge");
  it.each(refused)("%s, which danfojs does wrongly or guesses", async (name) => {
    const f = await profile();
    const sliced = f.head(2);
    for (const each of [f, sliced])
      expect(codeOf(() => (each as unknown as Record<string, unknown>)[name])).toBe(
        "not-in-a-frame",
      );
  });
  it("with the way to do it instead", async () => {
    const f = (await profile()) as unknown as Record<string, unknown>;
    expect(() => f["toCSV"]).toThrow(/use toCsv/);
    expect(() => f["groupby"]).toThrow(/frame\.column\(label\)/);
  });
  it("a label that is a property of a frame", async () => {
    for (const head of ["shape", "mean", "toString", "constructor", "$data", "values", "T"]) {
      const error = await rejection(frame([{ head, values: [1] }]));
      expect([head, error.code]).toEqual([head, "reserved-name"]);
    }
    expect((await frame([{ head: "mean", unit: "m", values: [1] }])).columns).toEqual(["mean [m]"]);
  });
  it("numbers among texts, no rows, ragged columns", async () => {
    const code = async (...columns: Parameters<typeof frame>[0]): Promise<string> =>
      (await rejection(frame(columns))).code;
    expect(await code({ head: "a", values: [1, "2"] })).toBe("mixed-column");
    expect(await code({ head: "a", values: [NaN] })).toBe("not-a-number");
    expect(await code({ head: "a", values: [] })).toBe("no-rows");
    expect(await code({ head: "a", values: [1] }, { head: "b", values: [1, 2] })).toBe(
      "ragged-columns",
    );
  });
  it("a column that it does not have, naming those it has", async () => {
    const f = await profile();
    expect(codeOf(() => f.column("depth"))).toBe("unknown-column");
    expect(() => f.column("depth")).toThrow(/"depth \[m MD\]"/);
  });
  it("to guess when danfojs is not there", async () => {
    const absent = await rejection(loadDanfo(() => Promise.reject(new Error("no such module"))));
    expect(absent.code).toBe("not-installed");
    expect(absent.remedy).toContain("npm install danfojs-node@1.2.0");
    expect((await rejection(loadDanfo(() => Promise.resolve({})))).code).toBe("not-installed");
  });
});
