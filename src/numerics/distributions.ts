import betainc from "@stdlib/math-base-special-betainc";
import erfc from "@stdlib/math-base-special-erfc";
import erfcinv from "@stdlib/math-base-special-erfcinv";
import gammainc from "@stdlib/math-base-special-gammainc";
import normal from "@stdlib/stats-base-dists-normal-cdf";
import quantile from "@stdlib/stats-base-dists-t-quantile";

/** Quantile of Student's t; p in (0, 1), df > 0 (+∞: the normal one). Null outside. */
export function tQuantile(p: number, df: number): number | null {
  if (!(p > 0 && p < 1 && df > 0)) return null;
  if (p === 0.5) return 0;
  return finite(df === Number.POSITIVE_INFINITY ? normalQuantile(p) : quantile(p, df));
}

/** Quantile of the standard normal; p in (0, 1). Null outside. */
export function normalQuantile(p: number): number | null {
  if (!(p > 0 && p < 1)) return null;
  return finite(-Math.SQRT2 * erfcinv(2 * p));
}

/** Probability that a standard normal is at most x. */
export function normalCdf(x: number): number {
  return normal(x, 0, 1);
}

/** Probability that a standard normal is above x, without cancellation. */
export function normalTail(x: number): number {
  return 0.5 * erfc(x / Math.SQRT2);
}

/** Probability that Student's t with df > 0 degrees of freedom is at most t. Null for other df. */
export function tCdf(t: number, df: number): number | null {
  if (!(df > 0) || Number.isNaN(t)) return null;
  if (df === Number.POSITIVE_INFINITY) return normalCdf(t);
  const tail = 0.5 * betainc(df / (df + t * t), df / 2, 0.5, true, false);
  return finite(t > 0 ? 1 - tail : tail);
}

/** Probability that F with d1 and d2 degrees of freedom (both > 0, finite) is at most x. Null outside. */
export function fCdf(x: number, d1: number, d2: number): number | null {
  return fProbability(x, d1, d2, false);
}

/** Probability that F is above x, without cancellation. Null as for `fCdf`. */
export function fTail(x: number, d1: number, d2: number): number | null {
  return fProbability(x, d1, d2, true);
}

function fProbability(x: number, d1: number, d2: number, upper: boolean): number | null {
  if (!(d1 > 0 && d2 > 0) || Number.isNaN(x)) return null;
  if (x <= 0) return upper ? 1 : 0;
  const share = (d1 * x) / (d1 * x + d2);
  return finite(betainc(share, d1 / 2, d2 / 2, true, upper));
}

/** Probability that χ² with df > 0 degrees of freedom is at most x. Null for other df. */
export function chiSquareCdf(x: number, df: number): number | null {
  return chiSquareProbability(x, df, false);
}

/** Probability that χ² is above x, without cancellation. Null for other df. */
export function chiSquareTail(x: number, df: number): number | null {
  return chiSquareProbability(x, df, true);
}

function chiSquareProbability(x: number, df: number, upper: boolean): number | null {
  if (!(df > 0) || Number.isNaN(x)) return null;
  if (x <= 0) return upper ? 1 : 0;
  return finite(gammainc(x / 2, df / 2, true, upper));
}

function finite(value: number | null): number | null {
  return value !== null && Number.isFinite(value) ? value : null;
}
