// A test of the checks: each coefficient that a method computes with is moved by 1 %, one at a time, and
// some check value of the method must notice. Works on compiled copies; nothing of the tree is changed.
import {
  cpSync,
  mkdtempSync,
  readFileSync,
  readdirSync,
  rmSync,
  symlinkSync,
  writeFileSync,
} from "node:fs";
import { join } from "node:path";
import { fileURLToPath, pathToFileURL } from "node:url";
import ts from "typescript";

const root = fileURLToPath(new URL("..", import.meta.url));
const stage = mkdtempSync(join(root, "out-coefficients-"));
// Parts of a declaration that are words or data of the checks, not the computation.
const NOT_COMPUTED = new Set([
  "checks",
  "inputs",
  "within",
  "source",
  "output",
  "revision",
  "tex",
  "title",
  "direction",
  "cautions",
]);
// Structural numbers: a square, a half, a sign. A coefficient that is one of them is tested by the limits.
const STRUCTURAL = new Set([0, 1, 2, 3, 4, 0.5, 10]);

// Numbers of the numerics: starting guesses, limits of loops and of regimes, tails of series. A result must not
// depend on them to the tolerance of a check.
const NUMERICAL = {
  "lift-velocity": [150, 1.75, 1.5],
  "rod-laminar-velocity": [0.02, 5, 7, 8, 9],
  "clift-grace-weber-1978": [0.01],
  "colebrook-white-1939": [60, 1e-6, 1e-15],
};

const files = (dir) =>
  readdirSync(dir, { withFileTypes: true }).flatMap((e) =>
    e.isDirectory() ? files(join(dir, e.name)) : e.name.endsWith(".js") ? [join(dir, e.name)] : [],
  );
const methodsIn = (module) =>
  Object.values(module).filter((x) => typeof x === "function" && x.role === "method");

const holds = (method) =>
  method.checks.every(({ rows }) =>
    rows.every(({ given, printed, in: unit, within }) => {
      const wanted = Number(printed) * (unit?.scale ?? 1) + (unit?.offset ?? 0);
      const digits = /\.(\d+)/.exec(printed)?.[1].length ?? 0;
      const power = Number(/e(-?\d+)/i.exec(printed)?.[1] ?? 0);
      const tolerance =
        within === undefined
          ? 0.5 * 10 ** (power - digits) * (unit?.scale ?? 1)
          : within * Math.abs(wanted);
      return Math.abs(method(given) - wanted) <= tolerance * (1 + 1e-9);
    }),
  );

/** Positions of the coefficients in a compiled file. */
function coefficients(text) {
  const found = [];
  const visit = (node) => {
    if (ts.isPropertyAssignment(node) && NOT_COMPUTED.has(node.name.getText(file))) return;
    if (ts.isNumericLiteral(node) && !STRUCTURAL.has(Number(node.text)))
      found.push({ at: node.getStart(file), end: node.end, value: Number(node.text) });
    ts.forEachChild(node, visit);
  };
  const file = ts.createSourceFile("x.js", text, ts.ScriptTarget.Latest);
  visit(file);
  return found;
}

let moved = 0;
const unnoticed = [];
try {
  cpSync(join(root, "kernel-helpers", "dist"), join(stage, "dist"), { recursive: true });
  symlinkSync(join(root, "node_modules"), join(stage, "node_modules"));
  writeFileSync(join(stage, "package.json"), '{"type":"module"}');
  for (const path of files(join(stage, "dist", "physics"))) {
    const text = readFileSync(path, "utf8");
    if (!/\bmethod\(\{/.test(text)) continue;
    for (const [i, c] of coefficients(text).entries()) {
      const copy = path.replace(/\.js$/, `.moved-${i}.js`);
      writeFileSync(copy, `${text.slice(0, c.at)}${c.value * 1.01}${text.slice(c.end)}`);
      const methods = methodsIn(await import(pathToFileURL(copy).href)).filter((m) =>
        path.endsWith(`${m.id}.js`),
      );
      if (methods.length === 0 || NUMERICAL[methods[0].id]?.includes(c.value)) continue;
      moved += 1;
      let isNoticed;
      try {
        isNoticed = !methods.every(holds);
      } catch {
        isNoticed = true;
      }
      if (!isNoticed)
        unnoticed.push(
          `${methods[0].id}: ${c.value} (${text.slice(Math.max(0, c.at - 30), c.end + 10).replace(/\s+/g, " ")})`,
        );
    }
  }
} finally {
  rmSync(stage, { recursive: true, force: true });
}
console.log(`${moved} coefficients moved by 1 %, ${unnoticed.length} unnoticed by any check value`);
for (const u of unnoticed) console.log(`  ${u}`);
process.exitCode = unnoticed.length === 0 ? 0 : 1;
