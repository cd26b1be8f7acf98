import type { Result } from "../contract/result.js";
import type { Follow, Run } from "../study/run.js";
import type { Signal } from "./signal.js";

/**
 * How a signal follows the concentration c of the followed species where it is linear in it: S = zero + slope · c,
 * SI. A first-order law needs no more than the sign of `slope`.
 */
export interface Relation {
  readonly slope: number;
  readonly zero: number;
}

/** One way to follow a reaction: its name in the language, and its relation or why there is none. */
export interface Monitor {
  readonly name: string;
  relate(run: Run, follow: Follow, signal: Signal): Result<Relation>;
}

/** Concentration of the followed species for each reading, mol m⁻³, length n. */
export function concentrations(signal: Signal, relation: Relation): Float64Array {
  return signal.value.map((value) => (value - relation.zero) / relation.slope);
}
