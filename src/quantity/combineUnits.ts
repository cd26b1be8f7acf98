import type { Unit } from "./unit.js";
import { noUnit, unitOf } from "./unitOf.js";

/**
 * The product of units raised to powers, as for rates and rate constants: `mol/L` and `s^-1` make `mol L^-1 s^-1`.
 * Positive exponents stand first, then the negative ones, each in order of appearance; exponents keep three decimals.
 * °C inside a product counts as a difference. A factor beyond the range of numbers gives the plain number.
 */
export function combineUnits(parts: readonly { readonly unit: Unit; readonly exponent: number }[]): Unit {
  const all = parts.flatMap(({ unit, exponent }) =>
    unit.parts.map((part) => ({ symbol: part.symbol, exponent: part.exponent * exponent })),
  );
  const merged = unitOf(all)?.parts ?? [];
  const ordered = [...merged.filter((part) => part.exponent > 0), ...merged.filter((part) => part.exponent < 0)];
  return unitOf(ordered) ?? noUnit;
}
