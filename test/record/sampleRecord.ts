import { readFileSync } from "node:fs";
import type { Description } from "../../src/contract/findings.js";
import { readRecord } from "../../src/record/readRecord.js";
import type { RunRecord } from "../../src/record/recordShape.js";
import { recordNow } from "../../src/workspace/verify.js";
import { describeText } from "../support/describeText.js";

/** Changes of a sample before it is worked out: of its text, of its data files. */
export interface SampleChange {
  readonly text?: (text: string) => string;
  readonly data?: (csv: string) => string;
}

/** The findings of a sample, worked out the one way through the house. */
export async function sampleFindings(name: string, { text, data }: SampleChange = {}): Promise<Description> {
  const written = readFileSync(`samples/${name}.raterun`, "utf8");
  const paths = [...written.matchAll(/^ +data +"([^"]+)"/gm)].map(([, path]) => path ?? "");
  const files = paths.map((path) => {
    const csv = readFileSync(`samples/${path}`, "utf8");
    return [path, data === undefined ? csv : data(csv)];
  });
  const description = await describeText(text === undefined ? written : text(written), Object.fromEntries(files));
  return { ...description, path: `samples/${name}.raterun` };
}

/** The text of a sample's record as it would be written now. */
export async function sampleRecord(name: string, change: SampleChange = {}): Promise<string> {
  return recordNow(await sampleFindings(name, change));
}

/** A record text as data. */
export function readBack(text: string): RunRecord {
  const read = readRecord(text, "file:///a.raterecord");
  if (!read.ok) throw new Error(`the record cannot be read: ${read.problem.code}`);
  return read.value;
}
