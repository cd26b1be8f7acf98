import type { Origin } from "../contract/problem.js";
import type { Reaction, Species } from "./reaction.js";
import type { Run } from "./run.js";

/**
 * Where runs come from. Tables of runs and runs of other files stay as they are written here: one function of
 * `analysis/` makes runs of them when their contents are there.
 */
export type RunSource =
  | { readonly kind: "run"; readonly run: Run }
  | { readonly kind: "table"; readonly path: string; readonly like: string; readonly origin: Origin }
  | { readonly kind: "files"; readonly pattern: string; readonly origin: Origin };

/** What one description means. */
export interface Study {
  readonly uri: string;
  readonly reactions: readonly Reaction[];
  readonly species: readonly Species[];
  readonly runs: readonly RunSource[];
}
