import { bench, describe } from "vitest";
import { standardRegistry } from "../../kernel-helpers/models/index.js";
import { parseRecord, replay } from "../../kernel-helpers/study/index.js";
import { syntheticStudy } from "./synthetic-study.js";

const record = syntheticStudy(500);
const text = JSON.stringify(record);

describe("a study of 500 steps", () => {
  bench("record it", () => void syntheticStudy(500));
  bench("read it from JSON, checked", () => void parseRecord(JSON.parse(text), "bench"));
  bench("replay it", () => void replay(record.body, standardRegistry));
});
