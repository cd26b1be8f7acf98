import { type Descent, descend } from "./descent.js";
import { evenlySpread, gridSearch, gridWithin } from "./gridSearch.js";
import { independence, inverseOfSquare, scaledCondition } from "./householder.js";
import type { LeastSquaresFit, LeastSquaresOptions, SeparableModel, StopReason } from "./separableModel.js";
import { type Projection, project, projection, standsAt } from "./variableProjection.js";

/** A column of the Jacobian of which less than this share is its own is not determined by the observations. */
const undetermined = 1e-12;
/** From this many observations on, a thinned-out sample of `sample` of them looks for the start. */
const many = 400;
const sample = 100;

/**
 * Weighted separable nonlinear least squares: minimises Σ w_i (y_i − Σ_j β_j φ_j(i; θ))² over the free β within their
 * bounds and θ within its bounds. `weights` are 1/u² (null: all 1). Observations with a non-finite y or a weight that is
 * not above 0 and finite are left out. No start value is asked for: it comes from the grids.
 * A failure is a stop reason, never an exception; no field ever holds NaN or ∞.
 * Sources: see `project` (variable projection), `trustStep` (Levenberg–Marquardt), `descend` (end of the iteration).
 */
export function fitLeastSquares(
  y: Float64Array,
  weights: Float64Array | null,
  model: SeparableModel,
  options: LeastSquaresOptions = {},
): LeastSquaresFit {
  const work = projection(y, weights, model);
  const estimated = model.nonlinear.map(({ low, high }) => low < high);
  const best = search(work, weights, estimated, options);
  return describe(work, best, estimated);
}

/** The best stationary point found from every start and damping that is worth trying. */
function search(
  work: Projection,
  weights: Float64Array | null,
  estimated: readonly boolean[],
  options: LeastSquaresOptions,
): Descent {
  const { model } = work;
  if (!estimated.includes(true)) {
    const theta = Float64Array.from(model.nonlinear, ({ low }) => low);
    const sumOfSquares = project(work, theta, null);
    return { theta, sumOfSquares, offset: 0, end: "converged", iterations: 0 };
  }
  const searched = model.nonlinear.every(({ grid }, m) => !estimated[m] || grid.length > 1);
  let starts = searched ? thinnedStarts(work, weights, estimated, options) : [];
  if (starts.length === 0) starts = gridSearch(work, 3, options).map((start) => start.theta);
  let best: Descent | null = null;
  let iterations = 0;
  for (const start of starts) {
    // a single given start may lie in the wrong valley for one damping: all are tried; after a search
    // only on failure, or where the first step may have been too long and ended on a bound
    for (const damping of searched ? [1, 0.01, 100] : [100, 1, 0.1, 0.01]) {
      const found = descend(work, start, estimated, damping, options);
      iterations += found.iterations;
      if (best === null || better(found, best)) best = found;
      if (found.end === "stopped" || (searched && found.end === "converged" && !onBound(model, found.theta))) break;
    }
    if (best?.end === "stopped") break;
  }
  if (best === null) {
    const theta = Float64Array.from(model.nonlinear, (parameter) => gridWithin(parameter)[0]!);
    const end = options.stopped?.() ? "stopped" : "limit";
    return { theta, sumOfSquares: Number.POSITIVE_INFINITY, offset: Number.POSITIVE_INFINITY, end, iterations };
  }
  return { ...best, iterations };
}

/** True where a nonlinear parameter that is estimated sits on a bound. */
function onBound(model: SeparableModel, theta: Float64Array): boolean {
  return model.nonlinear.some(({ low, high }, m) => low < high && (theta[m]! <= low || theta[m]! >= high));
}

/** A stopped descent wins, so that it is reported; then the lower sum; at (nearly) equal sums the converged one. */
function better(a: Descent, b: Descent): boolean {
  if (a.end === "stopped") return true;
  const margin = 1e-9 * Math.min(a.sumOfSquares, b.sumOfSquares);
  if (a.sumOfSquares < b.sumOfSquares - margin) return true;
  if (a.sumOfSquares > b.sumOfSquares + margin) return false;
  if (a.end !== b.end) return a.end === "converged";
  return a.offset < b.offset;
}

/**
 * Starts from a fit to an evenly thinned sample: one, or more where several minima are nearly as good. With very many
 * observations each is then refined on samples ten times as large, because a step on all of them costs more than that.
 */
function thinnedStarts(
  work: Projection,
  weights: Float64Array | null,
  estimated: readonly boolean[],
  options: LeastSquaresOptions,
): Float64Array[] {
  if (work.n < many || work.used < many) return [];
  const rough = { ...options, tolerance: 1e-3 };
  const thin = thinned(work, weights, sample);
  if (thin === null) return [];
  const ends = gridSearch(thin, 3, options)
    .map((start) => descend(thin, start.theta, estimated, 1, rough))
    .filter((end) => end.end === "converged")
    .sort((a, b) => a.sumOfSquares - b.sumOfSquares);
  let starts: Float64Array[] = [];
  for (const end of ends) {
    const distinct = starts.every((other) =>
      other.some((value, m) => Math.abs(value - end.theta[m]!) > 1e-3 * Math.abs(value)),
    );
    if (distinct && end.sumOfSquares <= 1.5 * ends[0]!.sumOfSquares) starts.push(end.theta);
  }
  for (let count = 10 * sample; 10 * count <= work.n; count *= 10) {
    const finer = thinned(work, weights, count);
    if (finer !== null) starts = starts.map((start) => descend(finer, start, estimated, 1, rough).theta);
  }
  return starts;
}

/** The problem on `count` evenly spread observations; null where the model cannot be thinned or too few take part. */
function thinned(work: Projection, weights: Float64Array | null, count: number): Projection | null {
  const { model, root, y, n } = work;
  if (model.thinned === undefined) return null;
  const indices = evenlySpread(n, count);
  const thinY = Float64Array.from(indices, (i) => y[i]!);
  const thinWeights =
    root === null ? null : Float64Array.from(indices, (i) => (root[i] === 0 ? 0 : (weights?.[i] ?? 1)));
  const thin = projection(thinY, thinWeights, model.thinned(indices));
  return thin.used < 2 * (model.linear.length + model.nonlinear.length) + 2 ? null : thin;
}

/** Turns the point found into the result, with the covariance from the QR of the full Jacobian there. */
function describe(work: Projection, found: Descent, estimated: readonly boolean[]): LeastSquaresFit {
  const { model, n } = work;
  const q = model.linear.length;
  const bound: ("low" | "high" | null)[] = new Array<"low" | "high" | null>(q + model.nonlinear.length).fill(null);
  const columns = estimated.map((free, m) => {
    if (!free) return false;
    const { low, high } = model.nonlinear[m]!;
    if (found.theta[m]! <= low) bound[q + m] = "low";
    else if (found.theta[m]! >= high) bound[q + m] = "high";
    return bound[q + m] === null;
  });
  const stands = standsAt(work, found.theta, columns);
  const finite = stands || Number.isFinite(project(work, found.theta, columns));
  const free: number[] = [];
  for (let j = 0; j < q; j++) {
    if (model.linear[j]!.fixed !== null) continue;
    const side = work.side[j]!;
    if (side === "free") free.push(j);
    else bound[j] = side;
  }
  for (let m = 0; m < columns.length; m++) if (columns[m]) free.push(q + m);

  const count = work.linearCount + work.nonlinearCount;
  const freedom = work.used - free.length;
  let singular = !finite || work.deficient || freedom < 0;
  for (let k = 0; k < count && !singular; k++) singular = !(independence(work.qr, k) > undetermined);
  for (let k = 0; k < work.nonlinearCount && !singular; k++)
    singular = without(work, work.linearCount + k, k, found, freedom);
  const covariance = singular ? null : inverseOfSquare(work.qr, count);
  const condition = singular ? null : scaledCondition(work.qr, count);
  if (covariance === null) singular = true;

  const fitted = new Float64Array(n);
  const residuals = new Float64Array(n);
  if (finite) fill(work, fitted, residuals);
  const jacobian: Float64Array[] = finite ? free.map((index) => jacobianColumn(work, index)) : [];
  let stop: StopReason = found.end;
  if (stop !== "stopped") {
    if (singular) stop = "singular";
    else if (stop === "converged" && onBound(model, found.theta)) stop = "bound";
  }
  return {
    stop,
    values: [...(finite ? work.beta : new Float64Array(q)), ...found.theta],
    names: [...model.linear.map(({ name }) => name), ...model.nonlinear.map(({ name }) => name)],
    free,
    bound,
    covariance,
    residuals,
    fitted,
    chiSquare: finite ? work.sumOfSquares : 0,
    degreesOfFreedom: freedom,
    iterations: found.iterations,
    offset: Number.isFinite(found.offset) ? found.offset : Number.MAX_VALUE,
    condition,
    jacobian,
  };
}

/**
 * True where a nonlinear parameter acts on the fit by no more than rounding, or by less than a millionth of the scatter,
 * when it is moved over its whole scale: the observations then say nothing about it.
 */
function without(work: Projection, column: number, k: number, found: Descent, freedom: number): boolean {
  const m = work.nonlinearFree[k]!;
  let scale = Math.abs(found.theta[m]!);
  for (const value of work.model.nonlinear[m]!.grid)
    if (Number.isFinite(value)) scale = Math.max(scale, Math.abs(value));
  const effect = Math.abs(work.qr.diagonal[column]!) * scale;
  if (scale === 0) return false;
  return !(effect > 1e-13 * work.size && effect > 1e-6 * Math.sqrt(work.sumOfSquares / Math.max(1, freedom)));
}

function fill(work: Projection, fitted: Float64Array, residuals: Float64Array): void {
  const { n, basis, beta, y } = work;
  for (let j = 0; j < basis.length; j++) {
    const b = beta[j]!;
    if (b === 0) continue;
    const phi = basis[j]!;
    for (let i = 0; i < n; i++) fitted[i]! += b * phi[i]!;
  }
  for (let i = 0; i < n; i++) {
    if (!Number.isFinite(fitted[i]!)) fitted[i] = 0;
    residuals[i] = Number.isFinite(work.observed[i]!) ? y[i]! - fitted[i]! : 0;
  }
}

/** ∂fit/∂parameter, in the arrays of the projection, which ends here. */
function jacobianColumn(work: Projection, index: number): Float64Array {
  const q = work.basis.length;
  if (index < q) return finiteOnly(work.basis[index]!);
  const sources = work.derivative[index - q]!;
  const column = sources[0] ?? new Float64Array(work.n);
  for (let j = 0; j < q; j++) {
    const b = work.beta[j]!;
    const from = sources[j]!;
    if (j === 0) for (let i = 0; i < column.length; i++) column[i] = b === 0 ? 0 : b * from[i]!;
    else if (b !== 0) for (let i = 0; i < column.length; i++) column[i]! += b * from[i]!;
  }
  return finiteOnly(column);
}

/** Rows left out of the fit may hold anything; NaN and ∞ do not leave. */
function finiteOnly(column: Float64Array): Float64Array {
  for (let i = 0; i < column.length; i++) if (!Number.isFinite(column[i]!)) column[i] = 0;
  return column;
}
