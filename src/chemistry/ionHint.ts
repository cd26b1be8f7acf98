import type { Notation } from "../quantity/notation.js";
import { chargeText, printedFormula } from "./formula.js";
import { ionsOf } from "./handbook/dissociation.js";
import { anions, cations, otherIons } from "./handbook/ions.js";

/**
 * What a common strong acid, base or salt gives in water, as the hint beside it says: `gives 2 Na⁺ and S₂O₃²⁻`, of the
 * normal form of its formula; null where the handbook does not know it as one.
 */
export function ionHint(formula: string, notation: Notation): string | null {
  const ions = ionsOf(formula);
  if (ions === null) return null;
  const written = ions.map(({ key, count }) => {
    const ion = notation === "unicode" ? printedFormula(key) : key;
    return count === 1 ? ion : `${count} ${ion}`;
  });
  return `gives ${written.join(" and ")}`;
}

const named = [...cations, ...anions, ...otherIons];

/** English name of a common ion by its normal form, `SO4^2-`: sulfate; null where the handbook does not list it. */
export function ionName(key: string): string | null {
  return named.find(({ body, charge }) => body + chargeText(charge) === key)?.name ?? null;
}
