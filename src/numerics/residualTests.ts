import { normalTail } from "./distributions.js";

export interface RunsTest {
  readonly runs: number;
  readonly positive: number;
  readonly negative: number;
  /** mean number of runs where signs follow each other at random */
  readonly expected: number;
  /** (runs − expected) / standard deviation; negative: too few runs, neighbours are alike */
  readonly z: number;
  /** two-sided probability of a number of runs at least this unlikely: twice the smaller tail, at most 1 */
  readonly p: number;
  /** true: from the exact distribution; false: normal approximation with continuity correction */
  readonly exact: boolean;
}

/** Up to this many signs the exact distribution is summed. */
const exactUpTo = 60;

/**
 * Runs test on the signs of residuals in their order; zeros are left out. Null where all signs are alike.
 * Source: A. Wald and J. Wolfowitz, Ann. Math. Stat. 11 (1940) 147–162.
 */
export function runsTest(residuals: ArrayLike<number>): RunsTest | null {
  let positive = 0;
  let negative = 0;
  let runs = 0;
  let last = 0;
  for (let i = 0; i < residuals.length; i++) {
    const sign = Math.sign(residuals[i]!);
    if (sign === 0 || Number.isNaN(sign)) continue;
    if (sign > 0) positive++;
    else negative++;
    if (sign !== last) runs++;
    last = sign;
  }
  if (positive === 0 || negative === 0) return null;
  const n = positive + negative;
  const pairs = 2 * positive * negative;
  const expected = pairs / n + 1;
  const deviation = Math.sqrt((pairs * (pairs - n)) / (n * n * (n - 1)));
  // one sign each: always two runs
  const z = deviation > 0 ? (runs - expected) / deviation : 0;
  const exact = n <= exactUpTo;
  let p = 1;
  if (exact) p = exactTwoSided(positive, negative, runs);
  else p = Math.min(1, 2 * normalTail(Math.max(0, Math.abs(runs - expected) - 0.5) / deviation));
  return { runs, positive, negative, expected, z, p, exact };
}

function exactTwoSided(a: number, b: number, runs: number): number {
  const all = binomial(a + b, a);
  let atMost = 0;
  let atLeast = 0;
  for (let r = 2; r <= a + b; r++) {
    const half = Math.floor(r / 2);
    const ways =
      r % 2 === 0
        ? 2 * binomial(a - 1, half - 1) * binomial(b - 1, half - 1)
        : binomial(a - 1, half) * binomial(b - 1, half - 1) + binomial(a - 1, half - 1) * binomial(b - 1, half);
    if (r <= runs) atMost += ways / all;
    if (r >= runs) atLeast += ways / all;
  }
  return Math.min(1, 2 * Math.min(atMost, atLeast));
}

function binomial(n: number, k: number): number {
  if (k < 0 || k > n) return 0;
  let result = 1;
  for (let i = 1; i <= k; i++) result = (result * (n - k + i)) / i;
  return result;
}

/**
 * Durbin–Watson statistic Σ(r_i − r_{i−1})² / Σ r_i² of residuals in their order (standardised ones where weights differ):
 * near 2 for independent errors, towards 0 where neighbours are alike. Null for fewer than two residuals or all 0.
 * Source: J. Durbin and G. S. Watson, Biometrika 37 (1950) 409–428.
 */
export function durbinWatson(residuals: ArrayLike<number>): number | null {
  let differences = 0;
  for (let i = 1; i < residuals.length; i++) {
    const step = residuals[i]! - residuals[i - 1]!;
    differences += step * step;
  }
  return ratio(differences, residuals);
}

/** Correlation of each residual with the next, Σ r_i r_{i+1} / Σ r_i² (mean taken as 0). Null as for `durbinWatson`. */
export function lagOneCorrelation(residuals: ArrayLike<number>): number | null {
  let products = 0;
  for (let i = 1; i < residuals.length; i++) products += residuals[i]! * residuals[i - 1]!;
  return ratio(products, residuals);
}

function ratio(above: number, residuals: ArrayLike<number>): number | null {
  let squares = 0;
  for (let i = 0; i < residuals.length; i++) squares += residuals[i]! * residuals[i]!;
  const value = above / squares;
  return residuals.length >= 2 && squares > 0 && Number.isFinite(value) ? value : null;
}
