import { molarMass } from "../chemistry/molarMass.js";
import type { Quantity } from "../quantity/quantity.js";
import type { Species } from "../study/reaction.js";

/** Molar mass of a species, kg/mol: the stated one, else that of its formula; null where neither is known. */
export function molarMassOf({ molarMass: stated, formula }: Species): Quantity | null {
  if (stated !== null) return stated.value;
  return formula === null ? null : molarMass(formula);
}
