import type { Polling } from "../contract/polling.js";
import { type LocalOptions, localFit } from "./localRegression.js";

export interface BandwidthOptions extends Polling {
  readonly degree?: 1 | 2 | 3;
  readonly kernel?: "tricube" | "equal";
  /** observations left out on each side of the one predicted; about n^(1/4), at least 1, unless said */
  readonly blockHalfLength?: number;
}

export interface BandwidthChoice {
  /** nearest observations a local fit should use */
  readonly neighbours: number;
  /** mean squared error of prediction there, unit of y squared */
  readonly score: number;
  readonly blockHalfLength: number;
  /** every trial, ascending */
  readonly trials: readonly { readonly neighbours: number; readonly score: number }[];
}

/** Observations predicted at most, evenly spread. */
const predictedAtMost = 200;

/**
 * Number of neighbours for a local fit, by cross-validation that leaves out the whole block around each predicted
 * observation; leaving out single observations under-smooths where neighbouring errors are alike
 * (C.-K. Chu and J. S. Marron, Ann. Stat. 19 (1991) 1906–1918; P. Burman, E. Chow and D. Nolan, Biometrika 81 (1994) 351–358).
 * Observations so near an end that their block reaches it are not predicted, unless fewer than five would remain.
 * `x` ascending, all finite. Null where no trial can predict, or when asked to stop.
 */
export function chooseBandwidth(
  x: Float64Array,
  y: Float64Array,
  options: BandwidthOptions = {},
): BandwidthChoice | null {
  const n = x.length;
  const degree = options.degree ?? 2;
  const block = options.blockHalfLength ?? Math.max(1, Math.round(Math.sqrt(Math.sqrt(n))) - 1);
  const targets = predicted(n, block);
  const trials: { neighbours: number; score: number }[] = [];
  const errors: Float64Array[] = [];
  for (const neighbours of ladder(degree + 2 * block + 3, n)) {
    const local: LocalOptions = { bandwidth: { neighbours }, degree, kernel: options.kernel ?? "tricube" };
    const squares = new Float64Array(targets.length);
    let sum = 0;
    let count = 0;
    for (const i of targets) {
      if (options.stopped?.()) return null;
      const fit = localFit(x, y, x[i]!, local, i - block, i + block + 1);
      if (fit === null) break;
      const error = y[i]! - fit.value;
      squares[count] = error * error;
      sum += error * error;
      count++;
    }
    // only trials that predict every target can be compared
    if (count < targets.length || count === 0 || !Number.isFinite(sum)) continue;
    trials.push({ neighbours, score: sum / count });
    errors.push(squares);
  }
  const chosen = widestAsGood(trials, errors);
  return chosen === null ? null : { ...chosen, blockHalfLength: block, trials };
}

/**
 * The widest trial that predicts no worse than the best one by more than a standard error of their paired difference: the
 * score is flat about its minimum, and where chance decides, a narrower width only adds scatter.
 */
function widestAsGood(
  trials: readonly { readonly neighbours: number; readonly score: number }[],
  errors: readonly Float64Array[],
): { readonly neighbours: number; readonly score: number } | null {
  let best = -1;
  trials.forEach((trial, index) => {
    if (best < 0 || trial.score < trials[best]!.score) best = index;
  });
  if (best < 0) return null;
  let chosen = best;
  for (let index = best + 1; index < trials.length; index++) {
    const n = errors[index]!.length;
    const difference = errors[index]!.map((square, i) => square - errors[best]![i]!);
    const mean = difference.reduce((sum, d) => sum + d, 0) / n;
    const spread = difference.reduce((sum, d) => sum + (d - mean) * (d - mean), 0);
    if (mean > Math.sqrt(spread / (n * Math.max(1, n - 1)))) break;
    chosen = index;
  }
  return trials[chosen]!;
}

function predicted(n: number, block: number): number[] {
  const margin = n - 2 * block >= 5 ? block : 0;
  const count = Math.min(n - 2 * margin, predictedAtMost);
  const span = n - 1 - 2 * margin;
  return Array.from({ length: Math.max(0, count) }, (_, i) =>
    count === 1 ? margin : margin + Math.round((i * span) / (count - 1)),
  );
}

/** Trial numbers of neighbours, each about a quarter above the one before, up to n. */
function ladder(least: number, n: number): number[] {
  const steps: number[] = [];
  for (let k = least; k < n; k = Math.max(k + 1, Math.round(1.25 * k))) steps.push(k);
  steps.push(n);
  return steps;
}
