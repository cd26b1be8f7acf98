import type { Place } from "../contract/findings.js";
import type { Origin } from "../contract/problem.js";
import type { Columns } from "../data/columns.js";
import type { Follow, Run } from "../study/run.js";
import { isWithin } from "./findColumns.js";

/** What the analysis of a run works with. */
export interface RunInput {
  /** the run's data file; null where it cannot be read, which is said elsewhere */
  readonly columns: Columns | null;
  readonly place: (origin: Origin) => Place;
  /** whether the blocks that only pictures need are wanted */
  readonly curves: boolean;
  readonly stopped: () => boolean;
}

/** The line of a wish, or the run's own line where the wish is inherited from another run. */
export function lineIn(run: Run, wish: { readonly origin: Origin }): Origin {
  return isWithin(run, wish.origin) ? wish.origin : run.origin;
}

/** Whether a wish is of this signal: the one whose column it names, else the first that is followed. */
export function isOf(run: Run, follow: Follow, { using }: { readonly using: string | null }): boolean {
  return using === null ? run.follow[0] === follow : follow.column === using;
}
