import { readdirSync, readFileSync, writeFileSync } from "node:fs";
import { join } from "node:path";
import { afterAll, beforeAll, describe, expect, it } from "vitest";
import {
  kernelCommand,
  KernelClient,
  type CellResult,
} from "../../../kernel-helpers/notebook/index.js";
import { scratchFolders } from "./scratch.js";

const folders = scratchFolders();
let kernel: KernelClient;
beforeAll(async () => {
  const argv = kernelCommand();
  kernel = await KernelClient.start({ argv, cwd: folders.work, startTimeoutMs: 60_000 });
});
afterAll(() => kernel.stop());

const run = (code: string): Promise<CellResult> => kernel.execute(code, { timeoutMs: 30_000 });
const good = async (code: string): Promise<CellResult> => {
  const result = await run(code);
  expect(result.error).toBeNull();
  expect(result.status).toBe("ok");
  return result;
};
const textsOf = ({ outputs }: CellResult, name: "stdout" | "stderr"): string =>
  outputs.map((o) => (o.output_type === "stream" && o.name === name ? o.text : "")).join("");
const resultOf = ({ outputs }: CellResult): unknown =>
  outputs.map((o) => (o.output_type === "execute_result" ? o.data["text/plain"] : [])).flat()[0];
const timesIn = (result: CellResult, part: string): number =>
  JSON.stringify(result.outputs).split(part).length - 1;

const given = `import { ergun, inUnit, mm, mps, kgpm3, cP, psi, ft } from "stillwell";
import type { Quantity } from "stillwell";`;

describe("our package", () => {
  it("is found from a folder with no packages, and its quantities have a kind", async () => {
    expect(resultOf(await good(`${given}\nconst d = mm(216.8);\nd`))).toBe("216.8 mm (length)");
  });
  it("keeps its types over cells, in lists and in the fields of a result", async () => {
    await good("const hole = { d, depth: ft(100), n: 2 };");
    expect(resultOf(await good("hole.depth"))).toBe("30.48 m (length)");
    expect(resultOf(await good("[d, d]"))).toBe("[216.8, 216.8] mm (length)");
    expect(String(resultOf(await good("hole"))).split("\n")[0]).toMatch(/^d +216\.8 mm +length$/);
    expect(resultOf(await good("d * 2"))).toBe("0.43360000000000004");
  });
  it("shows a method as a card with its equation", async () => {
    const [output] = (await good("ergun")).outputs;
    expect(output).toMatchObject({ output_type: "execute_result" });
    expect(JSON.stringify(output)).toContain('"text/latex":"$$');
  });
});

describe("a wrong kind", () => {
  const wrong = `console.log("has run");
const p = psi(5200);
const f = (bore: Quantity<"length">) => bore;
f(
  p,
);`;
  it("is refused before the cell runs, once, in the analyst's terms, with its line", async () => {
    const result = await run(wrong);
    const says = "expected a length, got an absolute pressure";
    expect(result).toMatchObject({ status: "failed", error: { ename: "TypeMismatch", line: 5 } });
    expect(result.error?.evalue).toBe(says);
    expect(result.error?.traceback).toEqual([`line 5: ${says}\n    p,\n    ^`]);
    expect(result.outputs).toEqual([
      {
        output_type: "error",
        ename: "TypeMismatch",
        evalue: says,
        traceback: [`line 5: ${says}\n    p,\n    ^`],
      },
    ]);
  });
  it("is also a bare number, which has no unit", async () => {
    const { error } = await run('const bare: Quantity<"length"> = 0.2;');
    expect(error?.evalue).toMatch(
      /^expected a length, got a number without a unit; units: .*\bft\b/,
    );
  });
  it("is also a unit that is not called, or an argument that is not given", async () => {
    await good('const needs = (bore: Quantity<"length">, why: string) => bore + why.length;');
    expect((await run('needs(mm, "x")')).error?.evalue).toBe(
      "expected a length, got a unit; it is called with a number",
    );
    expect((await run("needs(mm(3))")).error?.evalue).toBe(
      "An argument for 'why' was not provided",
    );
  });
  it("is also a null where a value must be", async () => {
    expect(await run("const s: string = null;")).toMatchObject({
      status: "failed",
      error: { ename: "TypeMismatch" },
    });
    expect((await run("const list = [1]; list.find((x) => x > 5).toFixed(1);")).error?.evalue).toBe(
      "Object is possibly 'undefined'",
    );
  });
  it("leaves nothing declared", async () => {
    expect((await run("p")).error?.evalue).toBe("Cannot find name 'p'");
  });
});

describe("an error at run time", () => {
  it("of ours is one sentence, once, with the line of the cell", async () => {
    const result = await run('const first = 1;\nmm("a b");');
    expect(result).toMatchObject({ status: "failed", error: { ename: "InputError", line: 2 } });
    expect(timesIn(result, "cannot be made from")).toBe(2); // evalue and traceback, as the protocol has both
    expect(result.error?.traceback).toHaveLength(2);
    expect(result.outputs).toHaveLength(1);
  });
  it("names the cells it came through, and nothing of the machinery", async () => {
    const made = await good(
      "interface Unused { x: number }\nfunction fail(): never {\n  throw new RangeError('no');\n}",
    );
    const { error } = await run("\nfail();\n1;");
    const at = made.executionCount ?? 0;
    expect(error?.traceback).toEqual([
      "RangeError: no",
      "line 2:\n  fail();\n  ^",
      `    at fail (cell ${at}, line 3)`,
      `    at cell ${at + 1}, line 2`,
    ]);
  });
  it("names the line of a module beside the notebook", async () => {
    writeFileSync(
      join(folders.work, "side.ts"),
      'import { mm } from "stillwell";\nexport const bore = mm(4);\ninterface Unused {}\nexport function boom(): never {\n  throw new Error("side");\n}\n',
    );
    expect(resultOf(await good('import { bore, boom } from "./side";\nbore'))).toBe(
      "4.000 mm (length)",
    );
    expect((await run("boom();")).error?.traceback[2]).toBe("    at boom (side.ts, line 5)");
  });
  it("fails the cell when nobody waits for it", async () => {
    const { status, error } = await run('void Promise.reject(new Error("stray"));\n1;');
    expect({ status, evalue: error?.evalue }).toEqual({ status: "failed", evalue: "stray" });
  });
  it("after the cell is told under it, and the kernel lives on", async () => {
    await good('setTimeout(() => { throw new Error("late"); }, 1);');
    await new Promise((resolve) => setTimeout(resolve, 100));
    expect(resultOf(await good("1 + 1"))).toBe("2");
  });
});

describe("what a cell puts out", () => {
  it.each([2000, 5000])("is complete: %i lines", async (n) => {
    const text = textsOf(
      await good(`for (let i = 0; i < ${n}; i++) console.log("line " + i)`),
      "stdout",
    );
    expect(text).toBe(Array.from({ length: n }, (_, i) => `line ${i}\n`).join(""));
  });
  it("is complete: 1500 displays, each a message of its own", async () => {
    const { outputs } = await good(
      'import { display } from "tslab";\nfor (let i = 0; i < 1500; i++) display.text(String(i));',
    );
    const shown = outputs.map((o) =>
      o.output_type === "display_data" ? o.data["text/plain"] : "",
    );
    expect(shown).toEqual(Array.from({ length: 1500 }, (_, i) => String(i)));
  });
  it("keeps its order over both streams and displays", async () => {
    const { outputs } = await good(
      'console.log("a"); console.error("b"); display.text("c"); process.stdout.write("d"); "e"',
    );
    expect(outputs.map((o) => o.output_type)).toEqual([
      "stream",
      "stream",
      "display_data",
      "stream",
      "execute_result",
    ]);
  });
  it("has the value of a display that is promised, before the cell ends", async () => {
    const { outputs } = await good(`({ [Symbol.for("Jupyter.display")]: async () => {
  await new Promise((resolve) => setTimeout(resolve, 50));
  return { "text/html": "<b>done</b>" };
} })`);
    expect(outputs).toMatchObject([{ data: { "text/html": "<b>done</b>" } }]);
  });
  it("fails the cell when a display fails", async () => {
    const { error } = await run(
      '({ [Symbol.for("Jupyter.display")]: () => { throw new Error("no chart"); } })',
    );
    expect(error?.evalue).toBe("no chart");
  });
  it("has nothing for undefined", async () => {
    expect((await good("undefined")).outputs).toEqual([]);
  });
});

describe("cells run again", () => {
  it("replace what they declared, also with another type", async () => {
    await good("const x = 1; class C { a = 1 }");
    await good("const x = 'text'; class C { b = 2 }");
    expect(resultOf(await good("x.length + new C().b"))).toBe("6");
  });
  it("reach what earlier cells declared wherever a name may stand", async () => {
    await good(`let a = 1;
const pair = { a: 7, b: 2 };
class Holder { a = 4 }
import * as path from "node:path";`);
    expect(resultOf(await good('({ a, b: a, ["c" + a]: a })'))).toBe("{ a: 1, b: 1, c1: 1 }");
    expect(resultOf(await good("const { a: x, b } = pair; x + b"))).toBe("9");
    expect(resultOf(await good("const { a: y } = new Holder(); y"))).toBe("4");
    expect(resultOf(await good("(({ a: z }: typeof pair) => z)(pair)"))).toBe("7");
    expect(resultOf(await good("({ path }).path.join('u', 'v')"))).toBe("'u/v'");
    expect(resultOf(await good("({ a } = pair); a"))).toBe("7");
    expect(
      resultOf(
        await good("({ b: a, missing: a = 3 } = { b: 5 } as { b: number; missing?: number }); a"),
      ),
    ).toBe("3");
    expect(resultOf(await good("const f = () => ({ a }); a = 8; f()"))).toBe("{ a: 8 }");
  });
  it("may await at the top, also in a loop", async () => {
    await good("let sum = 0; for await (const n of [Promise.resolve(1), 2]) sum += n;");
    expect(resultOf(await good("sum"))).toBe("3");
    expect(resultOf(await good("const late = await Promise.resolve(mm(3));\nlate"))).toBe(
      "3.000 mm (length)",
    );
  });
  it("count up by one each, and a failure aborts the cells that wait behind it", async () => {
    const [failed, behind] = await Promise.all([run("throw new Error('first')"), run("1")]);
    expect([failed.status, behind.status]).toEqual(["failed", "aborted"]);
    const next = await good("1");
    expect(next.executionCount).toBe((failed.executionCount ?? 0) + 1);
  });
});

describe("the editor's questions", () => {
  it("complete the members of our types and our names", async () => {
    const code = "d.toFi";
    const members = await kernel.request("complete", { code, cursor_pos: code.length }, 10_000);
    expect(members["matches"]).toContain("toFixed");
    const names = 'import { erg } from "stillwell"';
    const found = await kernel.request("complete", { code: names, cursor_pos: 12 }, 10_000);
    expect(found["matches"]).toContain("ergun");
  });
  it("count characters, not UTF-16 units", async () => {
    const code = '"😀"; d.toFi';
    const answer = await kernel.request("complete", { code, cursor_pos: 11 }, 10_000);
    expect(answer).toMatchObject({ cursor_start: 7, cursor_end: 11 });
  });
  it("show the type and the text of a declaration", async () => {
    const answer = await kernel.request(
      "inspect",
      { code: "const u = ft", cursor_pos: 11 },
      10_000,
    );
    expect(answer).toMatchObject({ found: true });
    expect(JSON.stringify(answer["data"])).toContain("Unit<");
  });
  it("tell whether a cell is complete, and what the kernel is", async () => {
    expect(await kernel.request("is_complete", { code: "f(" }, 10_000)).toMatchObject({
      status: "incomplete",
    });
    expect(await kernel.request("is_complete", { code: "f()" }, 10_000)).toMatchObject({
      status: "complete",
    });
    expect(await kernel.request("kernel_info", {}, 10_000)).toMatchObject({
      status: "ok",
      implementation: "stillwell",
      language_info: { name: "typescript", version: "5.0.4", file_extension: ".ts" },
    });
  });
});

describe("an interrupt", () => {
  it.each([
    ["computes", "for (;;) {}"],
    ["waits", "await new Promise(() => setInterval(() => 0, 1000))"],
    [
      "shows a value",
      '({ [Symbol.for("Jupyter.display")]: () => new Promise(() => setInterval(() => 0, 1000)) })',
    ],
  ])("stops a cell that %s, and the next runs", async (_, code) => {
    const cell = run(code);
    // Again and again: one that comes before the cell runs stops nothing.
    const timer = setInterval(() => kernel.interrupt(), 400);
    const result = await cell;
    clearInterval(timer);
    expect(result).toMatchObject({ status: "failed", error: { ename: "Interrupted" } });
    expect(resultOf(await good("1 + 2"))).toBe("3");
  });
});

describe("studies", () => {
  it("find the number of the cell execution, and have a draft written after each cell", async () => {
    await good(`Reflect.set(globalThis, Symbol.for("stillwell.studies"), new Map([["pack/1",
  { record: () => ({ turn: Reflect.get(globalThis, Symbol.for("stillwell.turn")) }) }]]));`);
    const file = join(folders.work, ".stillwell", "pack%2F1.draft.json");
    const turn = (): unknown => (JSON.parse(readFileSync(file, "utf8")) as { turn: number }).turn;
    const first = Number(turn());
    await run("throw new Error('also after a failure')");
    expect(turn()).toBe(first + 1);
    expect(readdirSync(join(folders.work, ".stillwell"))).toEqual(["pack%2F1.draft.json"]);
  });
  it("do not fail a cell whose draft cannot be written", async () => {
    const result =
      await good(`(Reflect.get(globalThis, Symbol.for("stillwell.studies")) as Map<string, unknown>)
  .set("bad", { record: () => { throw new Error("half made"); } }); 7`);
    expect(resultOf(result)).toBe("7");
    expect(textsOf(result, "stderr")).toBe("The draft of study bad was not written: half made\n");
  });
});
