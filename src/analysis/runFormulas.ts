import type { Formula } from "../chemistry/formula.js";
import { readSpecies } from "../chemistry/readSpecies.js";
import { isFault } from "../quantity/shifted.js";
import type { Reaction } from "../study/reaction.js";
import type { Run } from "../study/run.js";

/**
 * The formula of each species of a run by its key; null for what goes by a name only. A declared name that is met in the
 * equation alone has none here, for a run holds its formula only where it is taken or followed.
 */
export function formulasOf(run: Run): Map<string, Formula | null> {
  const formulas = new Map<string, Formula | null>();
  for (const { species } of [...run.taken, ...run.follow]) formulas.set(species.key, species.formula);
  const { reaction } = run;
  if (reaction === null) return formulas;
  for (const key of [...reaction.reactants, ...reaction.products]) {
    if (!formulas.has(key)) formulas.set(key, formulaOfKey(key, reaction));
  }
  return formulas;
}

/**
 * Whether an element is known not to balance in the run's equation, so that no amount may be reckoned from it. False where
 * a formula is not known: then nothing can be told.
 */
export function isUnbalanced(run: Run): boolean {
  const formulas = formulasOf(run);
  const sums = new Map<string, number>();
  for (const [key, number] of run.reaction?.numbers ?? []) {
    const formula = formulas.get(key) ?? null;
    if (formula === null && key !== "e^-") return false;
    for (const [symbol, count] of formula?.parts ?? []) sums.set(symbol, (sums.get(symbol) ?? 0) + number * count);
  }
  // Coefficients may be fractions; what is left of rounding is far below an atom.
  return [...sums.values()].some((sum) => Math.abs(sum) > 1e-6);
}

/**
 * The formula that a key of the equation is. A lone symbol without a state, `K`, may be a declared name: it is an
 * element only where the other side of the equation has that element too.
 */
function formulaOfKey(key: string, reaction: Reaction): Formula | null {
  const formula = wholeFormula(key);
  if (formula === null || formula.text === "e^-") return null;
  if (!/^[A-Z][a-z]?$/.test(key) || reaction.states.has(key)) return formula;
  const others = reaction.products.includes(key) ? reaction.reactants : reaction.products;
  return others.some((other) => wholeFormula(other)?.parts.has(key)) ? formula : null;
}

function wholeFormula(text: string): Formula | null {
  const reading = readSpecies(text);
  return isFault(reading) || reading.end !== text.length ? null : reading.formula;
}
