import type { Origin } from "../contract/problem.js";
import type { Quantity } from "../quantity/quantity.js";
import type { StudyItem } from "./fact.js";
import type { Calibration, Reaction, Species } from "./reaction.js";
import type { Run } from "./run.js";

/** Where runs come from; tables stay unexpanded: one function of `analysis/` makes runs of them when they are read. */
export type RunSource = { readonly kind: "run"; readonly run: Run } | ({ readonly kind: "table" } & RunTable);

/** A table of runs, one a row. */
export interface RunTable extends StudyItem {
  readonly path: string;
  /** the run every row starts from */
  readonly like: string;
  /** header of the column with the names */
  readonly namedBy: string | null;
  /** lines whose value stands in a column: the line's first word, its key, and the header */
  readonly values: readonly { readonly head: string; readonly key: string | null; readonly header: string }[];
  /** what every row has in common, as a run without a name */
  readonly common: Run;
}

/** A run by its name; of another file, or all that a pattern finds: these stay unexpanded here. */
export type RunReference =
  | { readonly kind: "here"; readonly name: string; readonly origin: Origin }
  | { readonly kind: "file"; readonly path: string; readonly name: string; readonly origin: Origin }
  | { readonly kind: "files"; readonly pattern: string; readonly origin: Origin };

/** What several runs say together. */
export interface Series extends StudyItem {
  readonly name: string;
  readonly title: string | null;
  readonly across: readonly RunReference[];
  readonly orders: readonly {
    readonly species: Species;
    readonly by: "initial rate" | "k" | "events";
    readonly origin: Origin;
  }[];
  readonly replicates: readonly (readonly RunReference[])[];
  readonly arrhenius: { readonly at: Quantity | null; readonly origin: Origin } | null;
  readonly saltEffect: boolean;
  readonly control: string | null;
}

/** A rate constant of a step: a value, or fitted in common or for each run. */
export type StepConstant =
  | { readonly kind: "value"; readonly value: Quantity }
  | { readonly kind: "free"; readonly scope: "in common" | "per run" };

/** Elementary steps that are computed together. */
export interface Mechanism extends StudyItem {
  readonly name: string;
  readonly title: string | null;
  readonly across: readonly RunReference[];
  readonly steps: readonly {
    readonly name: string;
    readonly reaction: Reaction;
    readonly forward: StepConstant | null;
    readonly reverse: StepConstant | null;
  }[];
}

/** What one description means. */
export interface Study {
  readonly uri: string;
  readonly reactions: readonly Reaction[];
  readonly species: readonly Species[];
  readonly calibrations: readonly Calibration[];
  readonly runs: readonly RunSource[];
  readonly series: readonly Series[];
  readonly mechanisms: readonly Mechanism[];
}
