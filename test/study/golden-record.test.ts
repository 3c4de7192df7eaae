import { readFileSync, writeFileSync } from "node:fs";
import { describe, expect, it } from "vitest";
import { parseRecord, replay } from "../../kernel-helpers/study/index.js";
import { buildExample } from "./build-example.js";
import { registry } from "./example.js";

const file = new URL("../golden/record-schema-1.json", import.meta.url);
const now = () =>
  buildExample("golden").s.record({
    at: "2026-01-01T00:00:00.000Z",
    versions: { stillwell: "golden" },
  });
// `UPDATE_GOLDEN=1 npm test` writes it anew: only for a schema that has not been published yet.
if (process.env["UPDATE_GOLDEN"] === "1")
  writeFileSync(file, `${JSON.stringify(now(), null, 1)}\n`);
const golden = JSON.parse(readFileSync(file, "utf8")) as unknown;

describe("the golden record of schema 1", () => {
  it("can still be read, and replays to the values it holds", () => {
    const record = parseRecord(golden, "golden");
    const { moved, failed } = replay(record.body, registry);
    expect({ moved, failed }).toEqual({ moved: [], failed: [] });
  });
  it("is what the same study records today, to the last hash digit", () => {
    expect(JSON.parse(JSON.stringify(now()))).toEqual(golden);
  });
});
