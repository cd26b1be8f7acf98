import type { LeastSquaresOptions, SeparableModel } from "./separableModel.js";
import { type Projection, project } from "./variableProjection.js";

/** A trial value of θ and the sum of squares there. */
export interface Start {
  readonly theta: Float64Array;
  readonly sumOfSquares: number;
}

/**
 * The local minima of the sum of squares over the product of the grids, best first, at most `most` of them.
 * Points where the model is not finite are passed over; an empty list means that it is finite nowhere.
 */
export function gridSearch(work: Projection, most: number, options: LeastSquaresOptions): Start[] {
  const grids = work.model.nonlinear.map((parameter) => gridWithin(parameter));
  let total = 1;
  const stride: number[] = [];
  for (const grid of grids) {
    stride.push(total);
    total *= grid.length;
  }
  const at = (index: number): Float64Array =>
    Float64Array.from(grids, (grid, m) => grid[Math.floor(index / stride[m]!) % grid.length]!);
  if (total === 1) return [{ theta: at(0), sumOfSquares: Number.NaN }];
  const sums = new Float64Array(total);
  for (let index = 0; index < total; index++) {
    if (index % 64 === 63 && options.stopped?.()) return [];
    sums[index] = project(work, at(index), null);
  }
  const minima: number[] = [];
  for (let index = 0; index < total; index++) {
    if (!Number.isFinite(sums[index]!)) continue;
    let least = true;
    for (let m = 0; m < grids.length && least; m++) {
      const place = Math.floor(index / stride[m]!) % grids[m]!.length;
      if (place > 0 && sums[index - stride[m]!]! < sums[index]!) least = false;
      if (place < grids[m]!.length - 1 && sums[index + stride[m]!]! < sums[index]!) least = false;
    }
    if (least) minima.push(index);
  }
  minima.sort((a, b) => sums[a]! - sums[b]!);
  return minima.slice(0, most).map((index) => ({ theta: at(index), sumOfSquares: sums[index]! }));
}

/** The finite trial values inside the bounds; the nearest bound where none is. Never empty. */
export function gridWithin(parameter: SeparableModel["nonlinear"][number]): number[] {
  const { low, high, grid } = parameter;
  const trials = grid.filter(Number.isFinite);
  const inside = trials.filter((value) => value >= low && value <= high);
  if (inside.length > 0) return inside;
  const first = trials[0] ?? (Number.isFinite(low) ? low : Number.isFinite(high) ? high : 0);
  return [Math.min(Math.max(first, low), high)];
}

/** About `count` of the n indices, evenly spread, first and last included. */
export function evenlySpread(n: number, count: number): Int32Array {
  return Int32Array.from({ length: count }, (_, i) => Math.round((i * (n - 1)) / (count - 1)));
}
