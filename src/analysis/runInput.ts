import type { Place } from "../contract/findings.js";
import type { Origin } from "../contract/problem.js";
import type { Columns } from "../data/columns.js";
import type { Run } from "../study/run.js";

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
  const own = wish.origin.start >= run.block.start && wish.origin.end <= run.block.end;
  return own ? wish.origin : run.origin;
}
