import { applyTransposed, type Factorisation, factor, factorisation, independence, solveUpper } from "./householder.js";

/** Where a coefficient ended: between its bounds or on one of them. */
export type Side = "free" | "low" | "high";

/**
 * Least squares with bounds on a few coefficients, from a finished QR: minimises ‖R x − z‖ under low ≤ x ≤ high.
 * Every choice of faces is tried (3^m for m bounded coefficients, m small); the best feasible face minimiser is the
 * minimum, because the problem is convex. Returns the side of each coefficient; null where no face is feasible.
 */
export function boundedSides(
  f: Factorisation,
  z: Float64Array,
  count: number,
  low: readonly number[],
  high: readonly number[],
): Side[] | null {
  const sides: Side[] = new Array<Side>(count).fill("free");
  let best: Side[] | null = null;
  let least = Number.POSITIVE_INFINITY;

  const visit = (j: number): void => {
    if (j === count) {
      const sum = faceMinimum(f, z, count, low, high, sides);
      if (sum < least) {
        least = sum;
        best = sides.slice();
      }
      return;
    }
    sides[j] = "free";
    visit(j + 1);
    if (Number.isFinite(low[j])) {
      sides[j] = "low";
      visit(j + 1);
    }
    if (Number.isFinite(high[j])) {
      sides[j] = "high";
      visit(j + 1);
    }
    sides[j] = "free";
  };
  visit(0);
  return best;
}

/** ‖R x − z‖² at the minimum on one face; +∞ where that minimum lies outside the bounds or is not determined. */
function faceMinimum(
  f: Factorisation,
  z: Float64Array,
  count: number,
  low: readonly number[],
  high: readonly number[],
  sides: readonly Side[],
): number {
  const rest = z.slice(0, count);
  const kept: Float64Array[] = [];
  const keptIndex: number[] = [];
  for (let j = 0; j < count; j++) {
    const column = new Float64Array(count);
    for (let i = 0; i < j; i++) column[i] = f.columns[j]![i]!;
    column[j] = f.diagonal[j]!;
    if (sides[j] === "free") {
      kept.push(column);
      keptIndex.push(j);
    } else {
      const value = sides[j] === "low" ? low[j]! : high[j]!;
      for (let i = 0; i <= j; i++) rest[i]! -= value * column[i]!;
    }
  }
  const small = factorisation(count, kept);
  factor(small);
  applyTransposed(small, rest);
  for (let k = 0; k < kept.length; k++) if (independence(small, k) < 1e-14) return Number.POSITIVE_INFINITY;
  const x = new Float64Array(count);
  solveUpper(small, rest, x);
  for (let k = 0; k < kept.length; k++) {
    const j = keptIndex[k]!;
    if (!(x[k]! >= low[j]! && x[k]! <= high[j]!)) return Number.POSITIVE_INFINITY;
  }
  let sum = 0;
  for (let i = kept.length; i < count; i++) sum += rest[i]! * rest[i]!;
  return sum;
}
