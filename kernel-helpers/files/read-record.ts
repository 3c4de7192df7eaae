import { parseRecord, type StudyRecord } from "../study/index.js";
import { readJsonFile } from "./read-json-file.js";

/** A record from disk, checked before any use. */
export const readRecord = (file: string): StudyRecord =>
  parseRecord(readJsonFile(file, "record"), file);
