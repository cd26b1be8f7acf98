import { analyse, fileKey } from "../analysis/analyse.js";
import { dataOrigin, isWithin } from "../analysis/findColumns.js";
import type { Note } from "../analysis/notes.js";
import type { Description } from "../contract/findings.js";
import type { Problem } from "../contract/problem.js";
import type { Columns } from "../data/columns.js";
import { contentHash } from "../data/contentHash.js";
import { refusalProblem } from "../data/dataOptions.js";
import { outcomeProblem } from "../data/outcomeProblem.js";
import { resolutionProblem } from "../data/resolutionProblem.js";
import type { Resolution } from "../data/resolve.js";
import type { Bound } from "../language/bind/bind.js";
import { placeOf } from "../language/lineIndex.js";
import { meaningOf } from "../language/meaning.js";
import type { DataFile, Run } from "../study/run.js";
import type { ColumnStore } from "./columnStore.js";
import { diagnosticsOf, withProblems } from "./diagnostics.js";
import type { DataFileState, FileContent } from "./fileContent.js";

/** What a description is worked out with. */
export interface DescribeInput {
  /** how the description is called in the findings */
  readonly path: string;
  /** the data files by their path as written */
  readonly files: ReadonlyMap<string, DataFileState>;
  readonly store: ColumnStore;
  /** greatest size of a data file, bytes, for the message */
  readonly sizeLimit: number;
  readonly curves: boolean;
  readonly stopped: () => boolean;
  /** called between pieces of work: gives way to whatever waits */
  readonly breathe: () => Promise<void>;
}

/** The findings of one description: the same wherever it runs. */
export async function describe(bound: Bound, input: DescribeInput): Promise<Description> {
  const { study, parsed } = bound;
  const read = await readFiles(bound, input);
  const place = (origin: { start: number; end: number }) => placeOf(parsed.index, origin);
  const { files } = read;
  const { stopped, breathe, curves } = input;
  const analysed = await analyse(study, { files, place, curves, stopped, breathe });
  const diagnostics = diagnosticsOf(bound, [...read.notes, ...analysed.notes]);
  return {
    path: input.path,
    meaning: contentHash(new TextEncoder().encode(meaningOf(study))),
    diagnostics,
    data: read.data,
    runs: analysed.runs.map((run) => withProblems(run, diagnostics)),
    series: [],
    mechanisms: [],
  };
}

interface ReadFiles {
  readonly files: Map<string, Columns>;
  readonly data: Description["data"];
  readonly notes: Note[];
}

/** Reads each data file once, and says for each run that uses it why it cannot be. */
async function readFiles(bound: Bound, input: DescribeInput): Promise<ReadFiles> {
  const result: ReadFiles = { files: new Map(), data: [], notes: [] };
  for (const source of bound.study.runs) {
    if (source.kind !== "run" || source.run.data === null) continue;
    if (input.stopped()) break;
    readFile(source.run, source.run.data, input, result);
    await input.breathe();
  }
  return result;
}

function readFile(run: Run, file: DataFile, input: DescribeInput, result: ReadFiles): void {
  const state = input.files.get(file.path);
  if (state === undefined) return;
  const found = "refusal" in state ? pathProblem(run, file, state.refusal) : contentOf(run, file, state, input, result);
  if (found !== null) result.notes.push({ problem: found, item: run.id });
}

/** Why a path leads nowhere; the mend is for the run's own line only. */
function pathProblem(run: Run, file: DataFile, refusal: Exclude<Resolution, { kind: "uri" }>): Problem {
  if (isWithin(run, file.origin)) return resolutionProblem(refusal, file.path, file.pathOrigin);
  const { mend: _, ...found } = resolutionProblem(refusal, file.path, dataOrigin(run, null));
  return found;
}

/** Puts the columns of a file into the result, or says why there are none. */
function contentOf(
  run: Run,
  file: DataFile,
  { key, outcome }: FileContent,
  input: DescribeInput,
  result: ReadFiles,
): Problem | null {
  const origin = dataOrigin(run, null);
  if (outcome.kind !== "bytes") return outcomeProblem(outcome, file.path, input.sizeLimit, origin);
  const { sha256, reading } = input.store.read(outcome.bytes, key, file, input.stopped);
  if (reading.kind === "stopped") return null;
  const columns = reading.kind === "columns" ? reading.columns : null;
  if (!result.data.some(({ path }) => path === file.path)) {
    const headers = columns?.columns.map(({ header }) => header) ?? [];
    result.data.push({ path: file.path, sha256, rows: columns?.rows ?? 0, columns: headers });
  }
  if (columns !== null) result.files.set(fileKey(file), columns);
  return reading.kind === "refused" ? refusalProblem(reading, file.path, origin) : null;
}
