import { type Fault, fault, replacement } from "../contract/problem.js";
import type { Fraction } from "../quantity/fraction.js";
import type { Balance, Imbalance } from "./balance.js";
import { elementName } from "./element.js";
import type { Equation, Term } from "./equation.js";

/**
 * The fault of an equation that does not balance, null where it does or cannot be checked. The mend replaces the whole
 * equation and keeps the writer's species, states and arrow. `text` is the one the equation was read from.
 */
export function balanceFault(equation: Equation, result: Balance, text: string): Fault | null {
  if (result.kind === "balanced" || result.kind === "unchecked") return null;
  const facts = inWords(result.differences);
  if (result.kind === "none") return fault("no-balance", { facts }, equation.span);
  if (result.kind === "many") return fault("many-balances", { facts }, equation.span);
  const mended = rewritten(equation, result.coefficients, text);
  return fault("unbalanced", { facts }, equation.span, [replacement(equation.span, mended)]);
}

/** The equation's text with other coefficients, in the order of its terms. */
function rewritten(equation: Equation, coefficients: readonly bigint[], text: string): string {
  const write = ({ span, speciesSpan }: Term, place: number): string => {
    const coefficient = coefficients[place] ?? 1n;
    const species = text.slice(speciesSpan.start, span.end);
    return coefficient === 1n ? species : `${coefficient} ${species}`;
  };
  const left = equation.left.map((term, place) => write(term, place));
  const right = equation.right.map((term, place) => write(term, equation.left.length + place));
  const arrow = text.slice(equation.arrowSpan.start, equation.arrowSpan.end);
  return `${left.join(" + ")} ${arrow} ${right.join(" + ")}`;
}

/** "Oxygen does not balance: 2 on the left, 3 on the right. Nor does hydrogen: 2 and 4." */
function inWords(differences: readonly Imbalance[]): string {
  return differences
    .map((difference, index) => {
      const left = sum(difference, difference.left);
      const right = sum(difference, difference.right);
      const name = difference.of === "charge" ? "charge" : elementName(difference.of);
      if (index > 0) return `Nor does ${name}: ${left} and ${right}.`;
      return `${name.charAt(0).toUpperCase()}${name.slice(1)} does not balance: ${left} on the left, ${right} on the right.`;
    })
    .join(" ");
}

/** Charges show their sign. */
function sum({ of }: Imbalance, { num, den }: Fraction): string {
  const size = `${num < 0n ? -num : num}${den === 1n ? "" : `/${den}`}`;
  if (num < 0n) return `-${size}`;
  return of === "charge" && num > 0n ? `+${size}` : size;
}
