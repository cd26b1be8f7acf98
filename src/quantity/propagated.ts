import type { Quantity } from "./quantity.js";
import type { Unit } from "./unit.js";

/** An input of a result, and by how much (SI) the result changes for a change of the input by one (SI). */
export interface Influence {
  readonly of: Quantity;
  readonly slope: number;
}

/**
 * A computed quantity with the sources of its inputs, each carried to first order (JCGM 100:2008, 5.1.2): u = |slope|·u
 * of the input, under its own name and kind. The inputs are independent of each other; one that enters twice is given
 * once, with the sum of its slopes. `value` is SI, shown in `unit`.
 */
export function propagated(value: number, unit: Unit, influences: readonly Influence[]): Quantity {
  const sources = influences.flatMap(({ of, slope }) =>
    of.sources.map((source) => ({ ...source, u: Math.abs(slope) * source.u })),
  );
  return { value, unit, sources };
}

/** The product of `above` over that of `below`, shown in `unit`; null where something below is zero. */
export function quotientOf(above: readonly Quantity[], below: readonly Quantity[], unit: Unit): Quantity | null {
  if (below.some(({ value }) => value === 0)) return null;
  const rest = (left: readonly Quantity[]): number => left.reduce((all, { value }) => all * value, 1);
  const divisor = rest(below);
  const value = rest(above) / divisor;
  const influences = [
    ...above.map((of, index) => ({ of, slope: rest(above.toSpliced(index, 1)) / divisor })),
    ...below.map((of) => ({ of, slope: -value / of.value })),
  ];
  return propagated(value, unit, influences);
}
