import type { Formula } from "../chemistry/formula.js";
import type { State } from "../chemistry/readSpecies.js";
import type { Origin } from "../contract/problem.js";
import type { Quantity } from "../quantity/quantity.js";
import type { Fact } from "./fact.js";

/** A chemical reaction as it is written; rates and rate constants belong to this way of writing it. */
export interface Reaction {
  readonly name: string | null;
  /** the equation in its one ASCII form */
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
  /** keeps up with the others at once */
  readonly fast: boolean;
  /** for the equation as it is written, J/mol */
  readonly enthalpy: Fact<Quantity> | null;
  readonly origin: Origin;
}

/** A substance, by its declared name or by the normal form of its formula. */
export interface Species {
  /** how the study calls it everywhere */
  readonly key: string;
  /** null where it goes by a name only */
  readonly formula: Formula | null;
  /** stated, kg/mol; null: follows from the formula where there is one */
  readonly molarMass: Fact<Quantity> | null;
  /** stated charge, in elementary charges */
  readonly charge: number | null;
  readonly pKa: number | null;
  /** molar absorptivity, m² mol⁻¹, at a wavelength, m */
  readonly absorptivities: readonly { readonly value: Quantity; readonly wavelength: Quantity }[];
}

/** How readings follow the concentration of a species. */
export interface Calibration {
  readonly name: string;
  readonly species: Species;
  readonly standards: readonly { readonly concentration: Quantity; readonly readings: readonly Quantity[] }[];
  readonly quadratic: boolean;
  readonly slope: Fact<Quantity> | null;
  readonly intercept: Fact<Quantity> | null;
  readonly origin: Origin;
}
