import { type Mend, replacement } from "../contract/problem.js";
import { balance } from "./balance.js";
import type { Formula } from "./formula.js";
import { readEquation } from "./readEquation.js";

/**
 * `H20` for `H2O`: the mend that writes the letter O for the digits 0 of one species of an equation that does not
 * balance, where just one such change makes it balance as it is written; else null. Spans count from the start of `text`.
 */
export function oxygenForZero(
  text: string,
  isDeclared: (name: string) => boolean,
  formulaOf: (species: string) => Formula | null,
): Mend | null {
  const mends = [...text.matchAll(/[A-Za-z)\]][^\s+]*0[^\s+]*/g)]
    .map(({ index, 0: species }) => replacement({ start: index, end: index + species.length }, withO(species)))
    .filter(({ edits: [edit] }) => {
      if (edit === undefined) return false;
      const { equation } = readEquation(text.slice(0, edit.start) + edit.text + text.slice(edit.end), isDeclared);
      return equation !== null && balance(equation, formulaOf).kind === "balanced";
    });
  return mends.length === 1 ? (mends[0] ?? null) : null;
}

function withO(species: string): string {
  return species.replaceAll("0", "O");
}
