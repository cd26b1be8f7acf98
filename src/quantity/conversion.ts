import type { Unit } from "./unit.js";

/** SI value of `value` in `unit`; °C and °F convert as points. */
export function toSI(value: number, unit: Unit): number {
  return intervalToSI(value, unit) + unit.offset;
}

/** The number of `unit` in the SI value `value`; °C and °F convert as points. */
export function fromSI(value: number, unit: Unit): number {
  return intervalFromSI(value - unit.offset, unit);
}

/** SI value of a difference, an uncertainty or a slope in `unit`: the zero point plays no part. */
export function intervalToSI(value: number, unit: Unit): number {
  const whole = reciprocal(unit.factor);
  return whole === null ? value * unit.factor : value / whole;
}

/** The number of `unit` in an SI difference, uncertainty or slope. */
export function intervalFromSI(value: number, unit: Unit): number {
  const whole = reciprocal(unit.factor);
  return whole === null ? value / unit.factor : value * whole;
}

/** 10^n of a factor 10^-n and its like, where dividing by the whole number rounds once and multiplying would twice. */
function reciprocal(factor: number): number | null {
  if (factor >= 1) return null;
  const whole = Math.round(1 / factor);
  return Number.isSafeInteger(whole) && 1 / whole === factor ? whole : null;
}
