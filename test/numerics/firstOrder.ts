import { expm1 } from "../../src/numerics/elementary.js";
import type { SeparableModel } from "../../src/numerics/leastSquares.js";

export const free = { fixed: null, low: Number.NEGATIVE_INFINITY, high: Number.POSITIVE_INFINITY };

export interface FirstOrderOptions {
  readonly start?: { fixed: number | null; low: number; high: number };
  readonly infinity?: { fixed: number | null; low: number; high: number };
  readonly low?: number;
  readonly high?: number;
  readonly points?: number;
}

/** start·e^(−kt) + infinity·(1 − e^(−kt)); the grid of k spans what times 0 … max(t) can show. */
export function firstOrder(t: ArrayLike<number>, options: FirstOrderOptions = {}): SeparableModel {
  let longest = 0;
  for (let i = 0; i < t.length; i++) longest = Math.max(longest, Math.abs(t[i]!));
  const points = options.points ?? 14;
  const grid = Array.from({ length: points }, (_, i) => (0.02 * 10 ** ((4 * i) / (points - 1))) / longest);
  return overTimes(t, options, grid);
}

function overTimes(t: ArrayLike<number>, options: FirstOrderOptions, grid: number[]): SeparableModel {
  return {
    linear: [
      { name: "start", ...(options.start ?? free) },
      { name: "infinity", ...(options.infinity ?? free) },
    ],
    nonlinear: [{ name: "k", low: options.low ?? 0, high: options.high ?? Number.POSITIVE_INFINITY, grid }],
    evaluate(theta, basis, derivative) {
      const k = theta[0]!;
      for (let i = 0; i < t.length; i++) {
        const lost = expm1(-k * t[i]!);
        basis[0]![i] = 1 + lost;
        basis[1]![i] = -lost;
        if (derivative === null) continue;
        const slope = t[i]! * (1 + lost);
        derivative[0]![0]![i] = -slope;
        derivative[0]![1]![i] = slope;
      }
    },
    thinned: (indices) =>
      overTimes(
        Float64Array.from(indices, (i) => t[i]!),
        options,
        grid,
      ),
  };
}

/** Decimal digits in which two numbers agree. */
export function digits(value: number, reference: number): number {
  return value === reference ? 16 : -Math.log10(Math.abs(value - reference) / Math.abs(reference));
}
