/** Numbers along an axis, and how they are written. */
export interface Ticks {
  /** places on the axis, ascending, in the axis's own unit */
  readonly values: readonly number[];
  /** what stands at each; true minus signs, all with the same decimals */
  readonly labels: readonly string[];
  /** power of ten taken out of the labels into the unit; 0 where none is */
  readonly power: number;
}

/**
 * Round numbers (1, 2 or 5 times a power of ten apart) within `low` to `high`, about `wanted` of them. A power of ten
 * goes to the unit where the greatest number is below 1e-2 or from 1e5 on.
 */
export function niceTicks(low: number, high: number, wanted: number): Ticks {
  const span = high - low;
  if (!(span > 0) || !Number.isFinite(span)) return { values: [], labels: [], power: 0 };
  const rough = span / Math.max(1, wanted);
  const exponent = exponentOf(rough);
  const leading = scaled(rough, -exponent);
  // The nearest of 1, 2, 5 and 10 as ratios go: the borders lie near the geometric means.
  const factor = leading < 1.5 ? 1 : leading < 3.2 ? 2 : leading < 7.1 ? 5 : 10;
  const [stepDigit, stepExponent] = factor === 10 ? [1, exponent + 1] : [factor, exponent];
  // Whole multiples of the step are divided, not multiplied, where the step is a fraction: 3 / 10 is 0.3, 3 * 0.1 not.
  const at = (count: number): number => scaled(count * stepDigit, stepExponent);
  const first = Math.ceil(low / at(1) - 1e-9);
  const last = Math.floor(high / at(1) + 1e-9);
  // One number alone makes no scale.
  if (last - first < 1 && wanted < 64) return niceTicks(low, high, 2 * wanted);
  const counts = Array.from({ length: Math.max(0, last - first + 1) }, (_, index) => first + index);
  const greatest = Math.max(Math.abs(low), Math.abs(high));
  const size = exponentOf(greatest);
  const power = size < -2 || size >= 5 ? size : 0;
  const decimals = Math.max(0, power - stepExponent);
  return {
    values: counts.map(at),
    labels: counts.map((count) => {
      const text = scaled(count * stepDigit, stepExponent - power).toFixed(Math.min(decimals, 20));
      return text.replace("-", "\u2212");
    }),
    power,
  };
}

/** Exponent of the leading decimal digit. */
function exponentOf(value: number): number {
  return value === 0 ? 0 : Number(value.toExponential(15).split("e")[1]);
}

/** A power of ten as its decimal text reads. */
function tenTo(exponent: number): number {
  return Number(`1e${exponent}`);
}

function scaled(whole: number, exponent: number): number {
  return exponent < 0 ? whole / tenTo(-exponent) : whole * tenTo(exponent);
}
