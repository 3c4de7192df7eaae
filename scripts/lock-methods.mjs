// Brings kernel-helpers/methods.lock.json up to date. It refuses a method, model or entity whose
// source changed under an unchanged revision; `--numbers-unchanged` (or `--numbers-unchanged=id,id`)
// accepts that for a rewrite that gives the same numbers to the last digit.
import { existsSync, readFileSync, writeFileSync } from "node:fs";
import { join } from "node:path";
import { fileURLToPath } from "node:url";
import { declaredSources } from "./declared-sources.mjs";
import { lockFaults, lockOf } from "./method-lock.mjs";

const folder = fileURLToPath(new URL("../kernel-helpers", import.meta.url));
const file = join(folder, "methods.lock.json");
const flag = process.argv.find((a) => a.startsWith("--numbers-unchanged"));
const accepted = flag?.includes("=") ? new Set(flag.split("=")[1].split(",")) : null;
const isAccepted = (id) => flag !== undefined && (accepted === null || accepted.has(id));

const declared = declaredSources(folder);
const lock = existsSync(file) ? JSON.parse(readFileSync(file, "utf8")) : {};
const faults = lockFaults(declared, lock);
const refused = faults.filter(
  ({ id, code }) => code === "lowered" || (code === "changed" && !isAccepted(id)),
);
for (const { says } of refused) console.error(says);
if (refused.length > 0) process.exit(1);
writeFileSync(file, `${JSON.stringify(lockOf(declared), null, 2)}\n`);
for (const { says, code } of faults) console.log(`${code}: ${says}`);
console.log(`${declared.length} methods, models and entities locked.`);
