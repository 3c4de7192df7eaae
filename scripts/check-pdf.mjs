// What poppler's tools see in the sample package: text, tags, fonts, outline, page n of N, both paper sizes.
import { spawnSync } from "node:child_process";
import { mkdtempSync, rmSync, cpSync } from "node:fs";
import { tmpdir } from "node:os";
import { join } from "node:path";
import { fileURLToPath } from "node:url";

const root = fileURLToPath(new URL("..", import.meta.url));
const folder = mkdtempSync(join(tmpdir(), "stillwell-pdf-"));
let failed = 0;
let passed = 0;
const run = (command, ...args) => {
  const r = spawnSync(command, args, { cwd: root, encoding: "utf8", maxBuffer: 1 << 28 });
  if (r.status !== 0) throw new Error(`${command} ${args.join(" ")}: ${r.stderr}`);
  return r.stdout;
};
const must = (isTrue, what) => {
  console.log(`  ${isTrue ? "yes" : "NO "} ${what}`);
  if (isTrue) passed += 1;
  else failed += 1;
};
const stillwell = join(root, "kernel-helpers", "bin", "stillwell.mjs");
try {
  for (const [paper, size] of [
    ["A4", "595.92 x 842.88"],
    ["Letter", "612 x 792"],
  ]) {
    console.log(paper);
    run(
      process.execPath,
      stillwell,
      "package",
      "notebooks/first-look.ipynb",
      "--out",
      folder,
      "--paper",
      paper,
    );
    const pdf = join(folder, "first-look", "package.pdf");
    const info = run("pdfinfo", pdf);
    const [w, h] = /Page size:\s+([\d.]+) x ([\d.]+)/.exec(info).slice(1).map(Number);
    const [ww, wh] = size.split(" x ").map(Number);
    must(Math.abs(w - ww) < 2 && Math.abs(h - wh) < 2, `pages are ${paper}: ${w} x ${h} pt`);
    must(/Tagged:\s+yes/.test(info), "it is tagged");
    const pages = Number(/Pages:\s+(\d+)/.exec(info)[1]);
    const text = run("pdftotext", "-layout", pdf, "-");
    const sheets = text.split("\f").slice(0, pages);
    must(
      sheets.every((t, i) => t.replace(/\s+/g, " ").includes(`Page ${i + 1} of ${pages}`)),
      `each of ${pages} pages says page n of N`,
    );
    must(
      sheets.every((t) => t.includes("LR4-CALC-001")),
      "each page carries the package number",
    );
    must(
      !/NaN|undefined|\[object|\\frac|\\mathrm/.test(text),
      "no NaN, undefined or raw TeX in the text",
    );
    const structure = run("pdfinfo", "-struct", pdf);
    for (const tag of ["H1", "H2", "Table", "TH", "Figure", "Link"])
      must(new RegExp(`\\b${tag}\\b`).test(structure), `has ${tag} tags`);
    const fonts = run("pdffonts", pdf).split("\n").slice(2).filter(Boolean);
    must(
      fonts.length > 0 && fonts.every((f) => /\byes yes\b|\byes\s+(yes|no)\b/.test(f)),
      `all ${fonts.length} fonts are embedded`,
    );
    cpSync(pdf, join(folder, `${paper}.pdf`));
  }
} finally {
  rmSync(folder, { recursive: true, force: true });
}
console.log(`${passed} passed, ${failed} failed`);
process.exitCode = failed === 0 ? 0 : 1;
