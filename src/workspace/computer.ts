import type { Description } from "../contract/findings.js";
import { type Bound, bind } from "../language/bind/bind.js";
import { parse } from "../language/parse.js";
import { thinCurves } from "../report/thinCurves.js";
import { type ColumnStore, columnStore } from "./columnStore.js";
import { describe } from "./describe.js";
import type { DataFileState } from "./fileContent.js";

/** Whether findings hold the blocks that only pictures need: all of them, or as much as the eye can tell apart. */
export type Curves = boolean | "thinned";

/** All that the findings of a description follow from. Plain data, so that it can go to a worker. */
export interface Job {
  readonly uri: string;
  readonly text: string;
  readonly path: string;
  /** the data files by their path as written */
  readonly files: ReadonlyMap<string, DataFileState>;
  readonly sizeLimit: number;
  readonly curves: Curves;
}

/** Works out findings: here, or in a worker. Null when it was told to stop. */
export interface Computer {
  compute(job: Job, signal: AbortSignal): Promise<Description | null>;
}

/** What a job is done with, wherever it is done. */
export interface JobTools {
  readonly store: ColumnStore;
  readonly stopped: () => boolean;
  readonly breathe: () => Promise<void>;
}

/** Does a job in this thread; null when `stopped` said so meanwhile. */
export async function computeJob(job: Job, tools: JobTools): Promise<Description | null> {
  const bound: Bound = bind(parse(job.uri, job.text));
  const { path, files, sizeLimit, curves } = job;
  const description = await describe(bound, { path, files, sizeLimit, curves: curves !== false, ...tools });
  if (tools.stopped()) return null;
  return curves === "thinned" ? thinCurves(description) : description;
}

/** Works in the same thread and gives way by `breathe`. */
export function inlineComputer(breathe: () => Promise<void>, store: ColumnStore = columnStore()): Computer {
  return { compute: (job, signal) => computeJob(job, { store, breathe, stopped: () => signal.aborted }) };
}

/** Bytes of all data files of a job: what decides whether it is worth a worker. */
export function sizeOfJob({ files }: Job): number {
  let size = 0;
  for (const state of files.values()) {
    if ("outcome" in state && state.outcome.kind === "bytes") size += state.outcome.bytes.length;
  }
  return size;
}
