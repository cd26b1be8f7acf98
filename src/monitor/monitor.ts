import type { Problem } from "../contract/problem.js";
import type { Follow, Run } from "../study/run.js";
import type { Signal } from "./signal.js";

/**
 * How a signal follows the concentration c of the followed species where it is linear in it: S = zero + slope · c, SI. A
 * first-order law needs no more than the sign of `slope`. Of a gas c is the amount given off over the volume of the
 * mixture.
 */
export interface Relation {
  readonly slope: number;
  readonly zero: number;
  /** relative shift of the slope when a common cause is off by one standard uncertainty, by cause */
  readonly causes: ReadonlyMap<string, number>;
}

/** What a monitor makes of a signal; without a relation the problems say why. */
export interface Related {
  readonly relation: Relation | null;
  readonly problems: readonly Problem[];
}

/** One way to follow a reaction: its name in the language, and its relation or why there is none. */
export interface Monitor {
  readonly name: string;
  relate(run: Run, follow: Follow, signal: Signal): Related;
}

/** No relation, and why. */
export function unrelated(...problems: Problem[]): Related {
  return { relation: null, problems };
}

/** Concentration of the followed species for each reading, mol m⁻³, length n. */
export function concentrations(signal: Signal, relation: Relation): Float64Array {
  return signal.value.map((value) => (value - relation.zero) / relation.slope);
}
