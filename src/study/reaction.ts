import type { Formula } from "../chemistry/formula.js";
import type { State } from "../chemistry/readSpecies.js";
import type { Origin } from "../contract/problem.js";

/** A chemical reaction as it is written; rates and rate constants belong to this way of writing it. */
export interface Reaction {
  readonly name: string | null;
  /** the equation in the writer's words */
  readonly text: string;
  /** keys of what stands on the left, in order, each once */
  readonly reactants: readonly string[];
  /** keys of what stands on the right, in order, each once */
  readonly products: readonly string[];
  /** net stoichiometric number of each species by its key: negative for what is used up, 0 for what comes out again */
  readonly numbers: ReadonlyMap<string, number>;
  /** states of aggregation, where they are written */
  readonly states: ReadonlyMap<string, State>;
  readonly reversible: boolean;
  /** whether elements and charge balance; unchecked where a species has no formula */
  readonly balance: "balanced" | "unbalanced" | "unchecked";
  /** false where the line is broken and only the species' names could be kept */
  readonly whole: boolean;
  readonly origin: Origin;
}

/** A substance, by its declared name or by the normal form of its formula. */
export interface Species {
  /** how the study calls it everywhere */
  readonly key: string;
  /** null where it goes by a name only */
  readonly formula: Formula | null;
}
