import type { Slope } from "./slope.js";

/** Readings averaged over neighbours: bin i holds readings i · size to (i + 1) · size, the last one what is left. */
export interface Bins {
  readonly time: Float64Array;
  readonly value: Float64Array;
  /** readings in a bin */
  readonly size: number;
  /** readings in all */
  readonly length: number;
}

/** At most `most` bins of equal numbers of neighbouring readings; the readings themselves where there are no more. */
export function binned(time: Float64Array, value: Float64Array, most: number): Bins {
  const { length } = time;
  const size = Math.ceil(length / most);
  if (size <= 1) return { time, value, size: 1, length };
  const count = Math.ceil(length / size);
  const mean = (of: Float64Array): Float64Array =>
    Float64Array.from({ length: count }, (_, bin) => {
      const inside = of.subarray(bin * size, Math.min(length, (bin + 1) * size));
      return inside.reduce((sum, x) => sum + x, 0) / inside.length;
    });
  return { time: mean(time), value: mean(value), size, length };
}

/** The slope of bins as one of the readings: each bin shares its weight among its readings. */
export function unbinned(slope: Slope, { size, length }: Bins): Slope {
  if (size === 1) return slope;
  const shared = (weights: Float64Array, from: number): Float64Array => {
    const first = from * size;
    const end = Math.min(length, (from + weights.length) * size);
    return Float64Array.from({ length: end - first }, (_, i) => {
      const bin = Math.floor(i / size);
      const inBin = Math.min(length, (from + bin + 1) * size) - (from + bin) * size;
      return (weights[bin] ?? 0) / inBin;
    });
  };
  const { weights, from, scatterWeights, scatterFrom } = slope;
  return {
    ...slope,
    weights: shared(weights, from),
    from: from * size,
    scatterWeights: shared(scatterWeights, scatterFrom),
    scatterFrom: scatterFrom * size,
  };
}
