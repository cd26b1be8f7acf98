import assert from "node:assert/strict";
import { messageOf } from "../../src/contract/words.js";
import type { Columns } from "../../src/data/columns.js";
import { type DataOptions, refusalProblem } from "../../src/data/dataOptions.js";
import { readColumns } from "../../src/data/readColumns.js";

/** The UTF-8 bytes of a text, or the bytes themselves. */
export function bytesOf(file: string | Uint8Array): Uint8Array {
  return typeof file === "string" ? new TextEncoder().encode(file) : file;
}

/** The columns of a file that must be readable. */
export function columnsOf(file: string | Uint8Array, options: DataOptions = {}): Columns {
  const reading = readColumns(bytesOf(file), options);
  assert.equal(reading.kind, "columns", JSON.stringify(reading));
  if (reading.kind !== "columns") throw new Error("unreachable");
  return reading.columns;
}

/** Headers and values, as far as a person sees them: `null` for a cell without a number. */
export function tableOf(file: string | Uint8Array, options: DataOptions = {}): Record<string, (number | null)[]> {
  const entries = columnsOf(file, options).columns.map((column, index): [string, (number | null)[]] => [
    column.header === "" ? `#${index + 1}` : column.header,
    Array.from(column.values, (value) => (Number.isNaN(value) ? null : value)),
  ]);
  return Object.fromEntries(entries);
}

/** The words with which a file called `run.csv` is refused. */
export function refusalOf(file: string | Uint8Array, options: DataOptions = {}): string {
  const reading = readColumns(bytesOf(file), options);
  assert.equal(reading.kind, "refused", JSON.stringify(reading).slice(0, 500));
  if (reading.kind !== "refused") throw new Error("unreachable");
  const shown = refusalProblem(reading, "run.csv", { uri: "file:///a.raterun", start: 0, end: 4 });
  return `${shown.severity}: ${messageOf(shown)}`;
}
