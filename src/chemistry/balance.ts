import {
  type Fraction,
  fraction,
  greatestCommonDivisor,
  negative,
  over,
  plus,
  times,
  zero,
} from "../quantity/fraction.js";
import type { Equation, Term } from "./equation.js";
import type { Formula } from "./formula.js";
import { nullSpace } from "./nullSpace.js";
import { hasPositiveSum } from "./positiveSum.js";

/** What differs: the symbol of an element or "charge", and the sum over each side. */
export interface Imbalance {
  readonly of: string;
  readonly left: Fraction;
  readonly right: Fraction;
}

export type Balance =
  /** species without a formula: nothing can be said */
  | { readonly kind: "unchecked"; readonly species: readonly string[] }
  | { readonly kind: "balanced" }
  /** one set of smallest whole coefficients balances it: terms of the left, then of the right */
  | {
      readonly kind: "unbalanced";
      readonly differences: readonly Imbalance[];
      readonly coefficients: readonly bigint[];
    }
  /** no positive coefficients do */
  | { readonly kind: "none"; readonly differences: readonly Imbalance[] }
  /** several sets do, which are not multiples of each other */
  | { readonly kind: "many"; readonly differences: readonly Imbalance[] };

/**
 * Whether an equation balances in every element and in charge, by exact rational arithmetic, and if not, which
 * coefficients would do. `formulaOf` gives the formula of a species by its key, null where it has none.
 */
export function balance(equation: Equation, formulaOf: (key: string) => Formula | null): Balance {
  const terms = [...equation.left, ...equation.right];
  const formulas = terms.map((term) => term.formula ?? formulaOf(term.species));
  const bare = terms.filter((_, index) => formulas[index] === null).map(({ species }) => species);
  if (bare.length > 0) return { kind: "unchecked", species: [...new Set(bare)] };
  const known = formulas.filter((formula): formula is Formula => formula !== null);
  const conserved = [...new Set(known.flatMap(({ parts }) => [...parts.keys()])), "charge"];
  const rows = conserved.map((of) => known.map((formula) => count(formula, of)));
  const differences = conserved.flatMap((of, index) => difference(of, rows[index] ?? [], terms, equation.left.length));
  if (differences.length === 0) return { kind: "balanced" };
  const signed = rows.map((row) => row.map((value, place) => (place < equation.left.length ? value : negative(value))));
  const solutions = nullSpace(signed, terms.length);
  if (solutions.length === 1) {
    const coefficients = smallestWhole(solutions[0] ?? []);
    return coefficients === null ? { kind: "none", differences } : { kind: "unbalanced", differences, coefficients };
  }
  const kind = solutions.length === 0 || hasPositiveSum(solutions) === false ? "none" : "many";
  return { kind, differences };
}

function count(formula: Formula, of: string): Fraction {
  return fraction(BigInt(of === "charge" ? formula.charge : (formula.parts.get(of) ?? 0)));
}

function difference(of: string, row: readonly Fraction[], terms: readonly Term[], leftCount: number): Imbalance[] {
  const sides: [Fraction, Fraction] = [zero, zero];
  terms.forEach(({ coefficient: { num, den } }, index) => {
    const share = times(row[index] ?? zero, fraction(BigInt(num), BigInt(den)));
    const side = index < leftCount ? 0 : 1;
    sides[side] = plus(sides[side], share);
  });
  const [left, right] = sides;
  return left.num === right.num && left.den === right.den ? [] : [{ of, left, right }];
}

/** The vector in smallest whole numbers, all positive; null where signs are mixed or a species drops out. */
function smallestWhole(vector: readonly Fraction[]): bigint[] | null {
  const first = vector[0] ?? zero;
  if (first.num === 0n) return null;
  const ratios = vector.map((value) => over(value, first));
  if (ratios.some(({ num }) => num <= 0n)) return null;
  const multiple = ratios.reduce((all, { den }) => (all * den) / greatestCommonDivisor(all, den), 1n);
  const whole = ratios.map(({ num, den }) => (num * multiple) / den);
  const common = whole.reduce((all, value) => greatestCommonDivisor(all, value), 0n);
  return whole.map((value) => value / common);
}
