import { tQuantile } from "../numerics/distributions.js";
import { profileInterval } from "../numerics/leastSquares.js";
import type { FirstOrderFit } from "./fitFirstOrder.js";
import { type Estimate, rootOfSquares } from "./parameter.js";
import { standardUncertainty } from "./stoichiometry.js";

/** Estimates of start, infinity and k′, SI, and what their random part rests on. */
export interface Estimates {
  readonly start: Estimate;
  readonly infinity: Estimate;
  readonly kPrime: Estimate;
  /** factor of (JᵀWJ)⁻¹: 1 where the random uncertainty is stated, else the residual variance; null: not known */
  readonly variance: number | null;
  /** quantile of the 95 % interval */
  readonly quantile: number | null;
}

/**
 * The parameters of a fit with their uncertainty. Random part: from the covariance, scaled by the residual variance
 * where no random uncertainty is stated; its interval by t (Bates and Watts 1988, chapter 2), or by the profile where
 * the infinity is free. Common part: what the common causes move, added after the fit.
 */
export function estimatesOf(result: FirstOrderFit, stopped: () => boolean): Estimates {
  const { fit, used } = result;
  const absolute = used.weights !== null;
  const scatter = fit.degreesOfFreedom > 0 ? fit.chiSquare / fit.degreesOfFreedom : null;
  const variance = absolute ? 1 : scatter;
  const quantile = tQuantile(0.975, absolute ? Number.POSITIVE_INFINITY : fit.degreesOfFreedom);
  const estimate = (index: 0 | 1 | 2): Estimate => estimateOf(result, index, variance, quantile, stopped);
  return { start: estimate(0), infinity: estimate(1), kPrime: estimate(2), variance, quantile };
}

function estimateOf(
  { fit, model, start, infinity, used, observed, common }: FirstOrderFit,
  index: 0 | 1 | 2,
  variance: number | null,
  quantile: number | null,
  stopped: () => boolean,
): Estimate {
  const value = fit.values[index] ?? 0;
  const end = [start, infinity, null][index] ?? null;
  if (end?.kind === "fixed") {
    const u = standardUncertainty(end.value);
    return { value, uRandom: null, uCommon: u, randomInterval: null, by: null, fixed: true, bound: null };
  }
  const place = fit.free.indexOf(index);
  const diagonal = fit.covariance?.[place]?.[place];
  const uRandom = diagonal === undefined || variance === null ? null : Math.sqrt(diagonal * variance);
  const uCommon = common.size === 0 ? null : rootOfSquares([...common.values()].map((shift) => shift[index]));
  const base = { value, uRandom, uCommon, fixed: false, bound: fit.bound[index] ?? null };
  if (uRandom === null || quantile === null) return { ...base, randomInterval: null, by: null };
  if (infinity.kind !== "free") {
    const half = quantile * uRandom;
    return { ...base, randomInterval: [value - half, value + half], by: "t" };
  }
  const scale = used.weights === null ? "scaled" : "absolute";
  const options = { tSquared: quantile * quantile, scale, stopped } as const;
  const { low, high } = profileInterval(observed.value, observed.weights, model, fit, index, options);
  return { ...base, randomInterval: low === null || high === null ? null : [low, high], by: "profile" };
}
