import type { Description } from "../../contract/findings.js";
import type { Curves } from "../../workspace/computer.js";
import type { DataFileState } from "../../workspace/fileContent.js";

/** A data file of a job: one whose bytes were sent before, by its key, or all there is to know of it. */
export type SentFile = { readonly sent: string } | DataFileState;

/** A job without the bytes of its files: those cross to the worker once, not at each keystroke. */
export interface SentJob {
  readonly uri: string;
  readonly text: string;
  readonly path: string;
  readonly files: ReadonlyMap<string, SentFile>;
  readonly sizeLimit: number;
  readonly curves: Curves;
}

/** What the server says to the worker. `stop[0]` other than 0 stops the job; null: the worker is ended to stop it. */
export type ToWorker =
  | { readonly kind: "file"; readonly key: string; readonly bytes: Uint8Array }
  | { readonly kind: "forget"; readonly key: string }
  | { readonly kind: "job"; readonly id: number; readonly job: SentJob; readonly stop: Int32Array | null };

/** What the worker answers, one answer a job. */
export type FromWorker =
  | { readonly kind: "done"; readonly id: number; readonly description: Description | null }
  | { readonly kind: "failed"; readonly id: number; readonly words: string };
