import type { ReadOutcome } from "../contract/reader.js";

/** A data file as it was read. `key` names this very reading: another reading of the same file has another. */
export interface FileContent {
  readonly key: string;
  readonly outcome: ReadOutcome;
}

/** Why a path of a data line leads nowhere; decided before anything is read. */
export type PathRefusal =
  | { readonly kind: "empty" | "absolute" | "unsaved" | "leaves" }
  | { readonly kind: "backslash"; readonly mended: string };

export type DataFileState = FileContent | { readonly refusal: PathRefusal };
