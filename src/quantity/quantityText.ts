import { fromSI, intervalFromSI } from "./conversion.js";
import { formatNumber } from "./formatNumber.js";
import { type Notation, numberText } from "./notation.js";
import { combined, type Quantity } from "./quantity.js";
import type { Unit } from "./unit.js";
import { unitText } from "./unitText.js";
import { wholeNumberText } from "./wholeNumberText.js";

export { printedUnit } from "./unitText.js";

/**
 * A quantity in its own unit as a person reads it: two significant digits of its combined uncertainty, `0.1000(20) mol
 * L^-1`; six digits where none is stated. Reads back to the digits shown.
 */
export function quantityText({ value, unit, sources }: Quantity, notation: Notation = "ascii"): string {
  const u = combined(sources);
  return withUnit(formatNumber(fromSI(value, unit), u === null ? null : intervalFromSI(u, unit)), unit, notation);
}

/**
 * A quantity in its own unit with every digit it has, `0.100(2) mol L^-1`: `readQuantity` gives the same value,
 * combined uncertainty and unit back, to the last bit where a number in that unit has it, as any that was read does,
 * else to the bit beside it. Several sources become one.
 */
export function wholeQuantityText({ value, unit, sources }: Quantity, notation: Notation = "ascii"): string {
  const [first] = sources;
  const u = sources.length === 1 && first !== undefined ? first.u : combined(sources);
  return withUnit(wholeNumberText(value, u, unit), unit, notation);
}

/** In per cent, `98 +/- 2 %` would have two meanings: brackets stand around it. */
function withUnit(number: string, unit: Unit, notation: Notation): string {
  const text = numberText(number, notation);
  if (unit.text === "" || number === "not computed") return text;
  const bracketed = unit.text.startsWith("%") && number.includes("+/-");
  return `${bracketed ? `(${text})` : text} ${unitText(unit, notation)}`;
}
