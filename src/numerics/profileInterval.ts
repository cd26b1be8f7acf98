import { fitLeastSquares } from "./separableFit.js";
import type { LeastSquaresFit, LeastSquaresOptions, SeparableModel } from "./separableModel.js";

export interface ProfileOptions extends LeastSquaresOptions {
  /** square of the t quantile (or of the normal one) that the interval is for */
  readonly tSquared: number;
  /** `scaled`: s² = chiSquare / degrees of freedom; `absolute`: the weights are 1/u², s² = 1 */
  readonly scale: "scaled" | "absolute";
}

export interface ProfileInterval {
  /** null where the profile does not close within the parameter's bounds */
  readonly low: number | null;
  readonly high: number | null;
  /** true where a lower sum of squares than that of `fit` was met: `fit` was not the minimum */
  readonly lowerMinimum: boolean;
}

/**
 * Profile t-interval of parameter `index` (into `fit.values`): the values v at which S(v) − S_min = s² t², S(v) being
 * minimised over all other parameters. Source: D. M. Bates and D. G. Watts, Nonlinear Regression Analysis and Its
 * Applications (1988), chapter 6. A parameter on a bound gets the one end away from it. Both ends are null for a
 * parameter that is fixed, for a fit that did not converge, and for `scaled` without degrees of freedom.
 */
export function profileInterval(
  y: Float64Array,
  weights: Float64Array | null,
  model: SeparableModel,
  fit: LeastSquaresFit,
  index: number,
  options: ProfileOptions,
): ProfileInterval {
  const none: ProfileInterval = { low: null, high: null, lowerMinimum: false };
  const { low, high } = boundsOf(model, index);
  const estimate = fit.values[index]!;
  const place = fit.free.indexOf(index);
  const onBound = fit.bound[index] ?? null;
  if (fit.stop !== "converged" && fit.stop !== "bound") return none;
  if (place < 0 && onBound === null) return none;
  if (options.scale === "scaled" && !(fit.degreesOfFreedom > 0)) return none;
  const variance = options.scale === "absolute" ? 1 : fit.chiSquare / fit.degreesOfFreedom;
  if (!(variance > 0) || !(options.tSquared > 0)) return none;

  const target = Math.sqrt(options.tSquared);
  let warm = fit.values;
  let lowerMinimum = false;
  const rounding = 1e-9 * fit.chiSquare;
  const tau = (value: number): number => {
    const inner = fitLeastSquares(y, weights, withFixed(model, index, value, warm, fit), options);
    if (inner.stop === "stopped" || inner.stop === "limit") return Number.NaN;
    const rise = inner.chiSquare - fit.chiSquare;
    if (rise < -rounding) lowerMinimum = true;
    warm = inner.values;
    return Math.sqrt(Math.max(0, rise) / variance);
  };
  const u = place >= 0 && fit.covariance !== null ? Math.sqrt(variance * fit.covariance[place]![place]!) : 0;
  const first = u > 0 ? u * target : 1e-3 * (Math.abs(estimate) || 1);
  const end = (side: -1 | 1): number | null => {
    if (onBound === (side < 0 ? "low" : "high")) return null;
    warm = fit.values;
    return crossing(tau, target, estimate, side, first, side < 0 ? low : high);
  };
  const found = { low: end(-1), high: end(1) };
  return { ...found, lowerMinimum };
}

/** The value beyond `from` (to the side of `side`) where τ reaches the target, within the limit; null where it does not. */
function crossing(
  tau: (value: number) => number,
  target: number,
  from: number,
  side: -1 | 1,
  first: number,
  limit: number,
): number | null {
  let inner = from;
  let innerTau = -target;
  let outer = from;
  let outerTau = -target;
  let reach = first;
  for (let trial = 0; ; trial++) {
    if (trial > 60 || outer === limit) return null;
    outer = side < 0 ? Math.max(from - reach, limit) : Math.min(from + reach, limit);
    outerTau = tau(outer) - target;
    if (!Number.isFinite(outer) || Number.isNaN(outerTau)) return null;
    if (outerTau >= 0) break;
    inner = outer;
    innerTau = outerTau;
    // τ is nearly a straight line: aim a little past the crossing, at most ten times as far
    const slope = (outerTau + target) / reach;
    reach = slope > 0 ? Math.min(Math.max((1.05 * target) / slope, 1.2 * reach), 10 * reach) : 10 * reach;
  }
  return illinois(tau, target, inner, innerTau, outer, outerTau);
}

/** Root of τ − target between two ends of different sign (regula falsi, Illinois variant), to 1e-10 of the distance. */
function illinois(
  tau: (value: number) => number,
  target: number,
  from: number,
  fromValue: number,
  to: number,
  toValue: number,
): number | null {
  let a = from;
  let fa = fromValue;
  let b = to;
  let fb = toValue;
  for (let trial = 0; trial < 100; trial++) {
    if (Math.abs(fb) <= 1e-9 * target) return b;
    const c = b - (fb * (b - a)) / (fb - fa);
    if (c === b || c === a || Math.abs(b - a) <= 1e-12 * Math.abs(b)) return c;
    const fc = tau(c) - target;
    if (Number.isNaN(fc)) return null;
    if (fc > 0 !== fb > 0) {
      a = b;
      fa = fb;
    } else {
      fa /= 2;
    }
    b = c;
    fb = fc;
  }
  return b;
}

function boundsOf(model: SeparableModel, index: number): { low: number; high: number } {
  const q = model.linear.length;
  const { low, high } = index < q ? model.linear[index]! : model.nonlinear[index - q]!;
  return { low, high };
}

/** The model with one parameter kept at a value, the search for the others starting near where they last were. */
function withFixed(
  model: SeparableModel,
  index: number,
  value: number,
  warm: readonly number[],
  fit: LeastSquaresFit,
): SeparableModel {
  const q = model.linear.length;
  return {
    linear: model.linear.map((parameter, j) => (j === index ? { ...parameter, fixed: value } : parameter)),
    nonlinear: model.nonlinear.map((parameter, m) => {
      if (q + m === index) return { ...parameter, low: value, high: value, grid: [value] };
      const near = [warm[q + m]!, fit.values[q + m]!].sort((a, b) => a - b);
      return { ...parameter, grid: near[0] === near[1] ? [near[0]!, ...parameter.grid.slice(0, 1)] : near };
    }),
    evaluate: model.evaluate.bind(model),
  };
}
