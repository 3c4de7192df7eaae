import { describe, expect, it } from "vitest";
import { rules } from "./rules.js";
import { sourceFile } from "./source-file.js";

const broken = (path: string, text: string): string[] =>
  Object.entries(rules)
    .filter(([, rule]) => rule(sourceFile(path, text)).length > 0)
    .map(([claim]) => claim);

const DOWN = "a file imports from a lower layer or its own room";
const DISK = "only files, queue and the layers from 9 up touch disk or network";
const OWNER = "a package is imported in one room only";
const DEMAND = "heavy packages load on demand";
const LIST = "a registry is a literal list";
const NAMES = "names are kebab-case and say what is there";
const AWAIT = "nothing awaits at top level";

describe("a rule finds what breaks it", () => {
  it.each([
    [DOWN, "physics/bed/a.ts", 'import { x } from "../../study/index.js";'],
    [DOWN, "physics/bed/a.ts", 'import type { X } from "../../models/index.js";'],
    [DOWN, "units/a.ts", 'import { findRoot } from "../numerics/index.js";'],
    [DOWN, "well/a.ts", 'export * from "../materials/index.js";'],
    [DOWN, "method/a.ts", 'type X = import("../study/index.js").X;'],
    [DOWN, "study/a.ts", 'const f = () => import("../render/index.js");'],
    [DOWN, "study/a.ts", 'import { x } from "../index.js";'],
    [DOWN, "study/a.ts", 'import { x } from "stillwell";'],
    [DOWN, "study/a.ts", 'import { x } from "../../scripts/x.js";'],
    [DOWN, "elsewhere/a.ts", ""],
    ["the root index only re-exports", "index.ts", "export const x = 1;"],
    ["the root index only re-exports", "index.ts", 'import "./units/index.js";'],
    [LIST, "models/registry.ts", "export const models = make(a, b);"],
    [LIST, "models/registry.ts", "export const models = [make(a)];"],
    [LIST, "models/registry.ts", "export const models = [] as X; export let more = filled();"],
    [OWNER, "document/a.ts", 'import nunjucks from "nunjucks";'],
    [OWNER, "cli/a.ts", 'const f = () => import("puppeteer");'],
    [OWNER, "desk/a.ts", 'import * as zmq from "zeromq";'],
    [OWNER, "cli/a.ts", 'const x = require("tslab/dist/executor");'],
    [DISK, "study/a.ts", 'import { readFileSync } from "node:fs";'],
    [DISK, "document/a.ts", 'import { readFile } from "fs/promises";'],
    [DISK, "method/a.ts", 'import { request } from "node:https";'],
    [DEMAND, "render/a.ts", 'import * as vega from "vega";'],
    [DEMAND, "render/a.ts", 'import { launch } from "puppeteer";'],
    [AWAIT, "render/a.ts", "const x = await f();"],
    [AWAIT, "render/a.ts", "for await (const x of y) f(x);"],
    ["no file is longer than 400 lines", "units/a.ts", "let x = 1;\n".repeat(401)],
    [NAMES, "units/unitParts.ts", ""],
    [NAMES, "units/unit_parts.ts", ""],
    [NAMES, "units/utils.ts", ""],
    [NAMES, "units/common/a.ts", ""],
    [NAMES, "units/format-helpers.ts", ""],
  ])("%s: %s", (claim, path, text) => {
    expect(broken(path, text)).toEqual([claim]);
  });

  it.each([
    ["physics/bed/a.ts", 'import { x } from "../../method/index.js"; import "../drag/a.js";'],
    ["index.ts", 'export * from "./units/index.js"; export type { X } from "./cli/x.js";'],
    ["models/registry.ts", "export const models = [a, b.c, ...d] as const;"],
    ["models/all-registry.ts", "export const all: readonly X[] = [...([A, B] as unknown as X[])];"],
    ["files/a.ts", 'import { readFileSync } from "node:fs";'],
    ["render/a.ts", 'import { readFileSync } from "node:fs"; import type { View } from "vega";'],
    ["render/a.ts", 'const f = async () => await import("vega");'],
    ["units/a.ts", "let x = 1;\n".repeat(400)],
    ["units/mixed-number.ts", ""],
  ])("and leaves alone what does not: %s", (path, text) => {
    expect(broken(path, text)).toEqual([]);
  });
});
