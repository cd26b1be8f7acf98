import { type ElementRow, elements, isotopes } from "./handbook/atomicWeights.js";

/** The row of an element or of D, T; null where the symbol is none. */
export function elementOf(symbol: string): ElementRow | null {
  if (Object.hasOwn(elements, symbol)) return elements[symbol] ?? null;
  return Object.hasOwn(isotopes, symbol) ? (isotopes[symbol] ?? null) : null;
}

/** English name, small: `oxygen`. */
export function elementName(symbol: string): string {
  return elementOf(symbol)?.[0] ?? symbol;
}

/** The elements that formulas in a teaching or kinetics laboratory are mostly made of, the commoner first. */
export const commonElements: readonly string[] =
  "H C N O Cl Na S K I P Br Ca Mg Fe Cu Zn Al Mn Cr F Si Ag Ba Pb Ni Co Li B Hg Sn Ti V".split(" ");
