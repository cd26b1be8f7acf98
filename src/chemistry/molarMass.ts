import { decimal, type Fraction, fraction, plus, times, toNumber, zero } from "../quantity/fraction.js";
import type { Quantity, Source } from "../quantity/quantity.js";
import { readUnit } from "../quantity/readUnit.js";
import { isFault } from "../quantity/shifted.js";
import type { Unit } from "../quantity/unit.js";
import { noUnit } from "../quantity/unitOf.js";
import { elementName, elementOf } from "./element.js";
import type { Formula } from "./formula.js";

/**
 * Molar mass, kg/mol (shown in g/mol): the sum of abridged standard atomic weights 2021, rounded once; the mass of
 * electrons of ions is left out. One common source per element: the printed uncertainty is a tolerance, so u = a/√3 (A.
 * Possolo et al., Pure Appl. Chem. 90 (2018) 395-424, from memory), the same for all atoms of an element. Null where an
 * element has no standard atomic weight, or nothing has a mass.
 */
export function molarMass(formula: Formula): Quantity | null {
  let total: Fraction = zero;
  const sources: Source[] = [];
  for (const [symbol, count] of formula.parts) {
    const [, weight, uncertainty] = elementOf(symbol) ?? ["", null, null];
    if (weight === null || uncertainty === null) return null;
    total = plus(total, times(decimal(weight), fraction(BigInt(count), 1000n)));
    const u = (Number(uncertainty) * count) / Math.sqrt(3) / 1000;
    sources.push({ name: `atomic weight of ${elementName(symbol)}`, kind: "common", u });
  }
  if (sources.length === 0) return null;
  return { value: toNumber(total), unit: gramPerMole(), sources };
}

function gramPerMole(): Unit {
  const read = readUnit("g/mol");
  return isFault(read) ? noUnit : read.unit;
}
