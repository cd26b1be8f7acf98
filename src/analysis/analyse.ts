import type { Run as RunFinding } from "../contract/findings.js";
import type { Columns } from "../data/columns.js";
import type { DataFile } from "../study/run.js";
import type { Study } from "../study/study.js";
import { analyseRun } from "./analyseRun.js";
import type { Note, Notes } from "./notes.js";
import type { RunInput } from "./runInput.js";
import { runsOf } from "./runsOf.js";

/** Names the way numbers are computed: it changes when the same input may give another number. */
export const method = "1";

/** A data file and how it is to be read: two runs may read one file in two ways. */
export function fileKey({ path, delimiter, decimalComma, skip, encoding }: DataFile): string {
  return JSON.stringify([path, delimiter, decimalComma, skip, encoding]);
}

/** What the analysis of a description works with. */
export interface AnalysisInput extends Omit<RunInput, "columns"> {
  /** the data files that could be read, by `fileKey` */
  readonly files: ReadonlyMap<string, Columns>;
  /** called between runs: gives way to whatever waits */
  readonly breathe: () => Promise<void>;
}

/**
 * Findings of every run of a study, in the order of the text, and what the readings showed to be wrong. Ends early,
 * with the runs done so far, once `stopped` says so.
 */
export async function analyse(
  study: Study,
  input: AnalysisInput,
): Promise<{ runs: RunFinding[]; notes: readonly Note[] }> {
  const notes: Notes = { all: [] };
  const runs: RunFinding[] = [];
  for (const run of runsOf(study)) {
    if (input.stopped()) break;
    const columns = run.data === null ? null : (input.files.get(fileKey(run.data)) ?? null);
    runs.push(analyseRun(run, { ...input, columns }, notes));
    await input.breathe();
  }
  return { runs, notes: notes.all };
}
