import type { Span } from "../contract/problem.js";
import type { Formula } from "./formula.js";
import type { State } from "./readSpecies.js";

/** A positive rational in lowest terms. */
export interface Coefficient {
  readonly num: number;
  readonly den: number;
}

/** One term of a side, with its place in the equation's text. */
export interface Term {
  readonly coefficient: Coefficient;
  /** declared name or normal form of the formula, without the state */
  readonly species: string;
  readonly formula: Formula | null;
  readonly state: State | null;
  /** coefficient, species and state */
  readonly span: Span;
  /** the species without coefficient and state */
  readonly speciesSpan: Span;
}

export type Arrow = "->" | "<=>";

export interface Equation {
  readonly left: readonly Term[];
  readonly right: readonly Term[];
  readonly arrow: Arrow;
  readonly arrowSpan: Span;
  readonly span: Span;
}

/**
 * Net stoichiometric numbers by species, products positive, without unit; 0 for what stands on both sides alike (a
 * catalyst written out).
 */
export function stoichiometricNumbers(equation: Equation): Map<string, number> {
  const sums = new Map<string, Coefficient>();
  const addAll = (terms: readonly Term[], sign: number): void => {
    for (const { species, coefficient } of terms) {
      const { num, den } = sums.get(species) ?? { num: 0, den: 1 };
      sums.set(species, { num: num * coefficient.den + sign * coefficient.num * den, den: den * coefficient.den });
    }
  };
  addAll(equation.left, -1);
  addAll(equation.right, 1);
  return new Map([...sums].map(([species, { num, den }]) => [species, num / den + 0]));
}

/** The equation in the one ASCII form, states kept: `2 H2O2(aq) -> 2 H2O(l) + O2(g)`. */
export function equationText({ left, right, arrow }: Equation): string {
  return `${sideText(left)} ${arrow} ${sideText(right)}`;
}

function sideText(terms: readonly Term[]): string {
  return terms
    .map(({ coefficient: { num, den }, species, state }) => {
      const count = den === 1 ? (num === 1 ? "" : `${num} `) : `${num}/${den} `;
      return count + species + (state === null ? "" : `(${state})`);
    })
    .join(" + ");
}
