import type { ReadOutcome } from "../contract/reader.js";
import type { Resolution } from "../data/resolve.js";

/** A data file as it was read. `key` names this very reading: another reading of the same file has another. */
export interface FileContent {
  readonly key: string;
  readonly outcome: ReadOutcome;
}

/** A file, or why its path leads nowhere, which is decided before anything is read. */
export type DataFileState = FileContent | { readonly refusal: Exclude<Resolution, { kind: "uri" }> };
