import type { Fault, Span } from "../../contract/problem.js";
import type { Part } from "../shape.js";

/** Where a line may stand: directly in the file, or below a header. */
export type Owner =
  | "file"
  | "reaction"
  | "species"
  | "calibration"
  | "run"
  | "rows"
  | "data"
  | "column"
  | "follow"
  | "observed"
  | "fit"
  | "series"
  | "mechanism"
  | "step";

/**
 * How lines of one kind live together below one header: `once`; `many` (each counts for itself); keyed by a field,
 * so that a later run that starts like this one replaces it by that key; or as a `set` that is replaced as a whole.
 */
export type Repeat = { readonly repeat: "once" | "many" | "set" } | { readonly repeat: "key"; readonly field: string };

/** A usual way to get a line wrong: what stands behind the first word, and what to say of it. */
export interface Slip {
  readonly pattern: RegExp;
  readonly say: (rest: Span) => Fault;
}

/** One kind of line. The table of them is the language: parsing, ownership, `like`, suggestions and pages read it. */
export interface StatementRow {
  readonly head: string;
  readonly owners: readonly Owner[];
  /** the header this line opens, if it is one */
  readonly opens?: Owner;
  readonly repeats: Repeat;
  readonly parts: readonly Part[];
  /** slips so common that they have words of their own, tried when the line is broken */
  readonly slips?: readonly Slip[];
  /** true where the line is read, checked and kept, but nothing computes with it yet */
  readonly kept?: true;
  readonly help: string;
  readonly example: string;
}

export const once: Repeat = { repeat: "once" };
export const many: Repeat = { repeat: "many" };
export const set: Repeat = { repeat: "set" };
export const key = (field: string): Repeat => ({ repeat: "key", field });

/** Lines of a run: in a run, in a table of runs, and as a default for every run above the first one. */
export const inRuns: readonly Owner[] = ["file", "run", "rows"];
