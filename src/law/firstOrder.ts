import { exp, expm1, log } from "../numerics/elementary.js";
import type { LinearParameter, SeparableModel } from "../numerics/separableModel.js";

/**
 * First order in one species: dc/dt = −k′c with k′ = |ν| k, so that a signal linear in the extent goes from `start` at
 * time zero to `infinity` as S = start e^(−k′t) + infinity (1 − e^(−k′t)). Needs no calibration: only k′ is inside the
 * exponential (IUPAC Gold Book, "rate constant, k" and "order of reaction").
 *
 * `time` in s, length n; with `measured` one observation more, the last, is the reading at infinity. The one nonlinear parameter is k′ in s⁻¹, from where a millionth reacts in the longest time to where the reaction is over
 * before the first interval is.
 */
export function firstOrderModel(
  time: Float64Array,
  start: LinearParameter,
  infinity: LinearParameter,
  measured = false,
): SeparableModel {
  const n = time.length;
  const { shortest, longest } = spacing(time);
  return {
    linear: [start, infinity],
    nonlinear: [{ name: "kPrime", low: 1e-6 / longest, high: 40 / shortest, grid: rateGrid(shortest, longest) }],
    evaluate(theta, basis, derivative) {
      const rate = theta[0] ?? 0;
      const [left, gone] = basis as [Float64Array, Float64Array];
      for (let i = 0; i < n; i++) {
        const decay = expm1(-rate * (time[i] ?? 0));
        left[i] = 1 + decay;
        gone[i] = -decay;
      }
      if (measured) gone[n] = 1;
      const slopes = derivative?.[0];
      if (slopes === undefined) return;
      const [leftSlope, goneSlope] = slopes as [Float64Array, Float64Array];
      for (let i = 0; i < n; i++) {
        const slope = (time[i] ?? 0) * (left[i] ?? 0);
        leftSlope[i] = -slope;
        goneSlope[i] = slope;
      }
    },
    thinned: (indices) =>
      firstOrderModel(
        Float64Array.from(indices, (i) => time[i] ?? 0),
        start,
        infinity,
      ),
  };
}

/** Signal at time `t` (s), and its derivatives by start, infinity and k′. */
export function firstOrderAt(t: number, start: number, infinity: number, kPrime: number): [number, number[]] {
  const left = exp(-kPrime * t);
  const gone = -expm1(-kPrime * t);
  return [start * left + infinity * gone, [left, gone, (infinity - start) * t * left]];
}

/** ln 2 / k′, s. */
export function halfLife(kPrime: number): number {
  return log(2) / kPrime;
}

function spacing(time: Float64Array): { shortest: number; longest: number } {
  let shortest = Number.POSITIVE_INFINITY;
  let longest = 0;
  let before = 0;
  for (const t of time) {
    if (t > before) shortest = Math.min(shortest, t - before);
    before = t;
    longest = Math.max(longest, Math.abs(t));
  }
  if (longest === 0) return { shortest: 1, longest: 1 };
  return { shortest: Math.min(shortest, longest), longest };
}

/** Trial values from where 0.1 % reacts in the longest time to where all does in the shortest, four a decade. */
function rateGrid(shortest: number, longest: number): number[] {
  const low = 1e-3 / longest;
  const high = 10 / shortest;
  const count = Math.max(8, Math.ceil((4 * log(high / low)) / log(10)));
  return Array.from({ length: count + 1 }, (_, i) => low * exp((log(high / low) * i) / count));
}
