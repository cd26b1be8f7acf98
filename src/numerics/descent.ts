import { norm } from "./householder.js";
import type { LeastSquaresOptions } from "./separableModel.js";
import { type TrustRegion, trustRegion, trustStep } from "./trustRegion.js";
import { type Projection, project } from "./variableProjection.js";

/** Where one descent ended. */
export interface Descent {
  readonly theta: Float64Array;
  /** Σ w r² there; +∞ where the model was not finite at the start */
  readonly sumOfSquares: number;
  /** relative offset there */
  readonly offset: number;
  readonly end: "converged" | "limit" | "stopped";
  readonly iterations: number;
}

/** The state of a descent that has to be kept while a trial is evaluated, for the case that it is rejected. */
interface Point {
  readonly theta: Float64Array;
  readonly reduced: Float64Array[];
  readonly projected: Float64Array;
  sumOfSquares: number;
  remainder: number;
}

function point(p: number): Point {
  return {
    theta: new Float64Array(p),
    reduced: Array.from({ length: p }, () => new Float64Array(p)),
    projected: new Float64Array(p),
    sumOfSquares: 0,
    remainder: 0,
  };
}

function keep(here: Point, work: Projection, theta: Float64Array): void {
  here.theta.set(theta);
  for (let k = 0; k < here.reduced.length; k++) here.reduced[k]!.set(work.reduced[k]!);
  here.projected.set(work.projected);
  here.sumOfSquares = work.sumOfSquares;
  here.remainder = work.remainder;
}

/** What a step from a point is computed with: only the parameters that may move there. */
interface Moving {
  readonly columns: Float64Array[];
  /** index into θ of each column */
  readonly index: Int32Array;
  readonly scaling: Float64Array;
  count: number;
}

/**
 * Levenberg–Marquardt on the projected problem from one start, within the bounds of θ. Ends when the relative offset
 * (the length of the step still to go, in standard errors; Bates and Watts 1981, Technometrics 23, 179–183) falls to
 * the tolerance or, where rounding of the sum of squares forbids that, when it no longer falls. One nonlinear parameter
 * alone uses the secant of its (exact) gradient instead of the Gauss–Newton curvature once that is known.
 */
export function descend(
  work: Projection,
  start: Float64Array,
  estimated: readonly boolean[],
  damping: number,
  options: LeastSquaresOptions,
): Descent {
  const { model } = work;
  const maximum = options.maximumIterations ?? 500;
  const tolerance = options.tolerance ?? 1e-10;
  const map: number[] = [];
  for (let m = 0; m < estimated.length; m++) if (estimated[m]) map.push(m);
  const p = map.length;
  const region = trustRegion(p);
  const here = point(p === work.reduced.length ? p : work.reduced.length);
  const trial = start.slice();
  const scaling = new Float64Array(p);
  const moving: Moving = { columns: [], index: new Int32Array(p), scaling: new Float64Array(p), count: 0 };
  const best = { theta: start.slice(), sumOfSquares: Number.POSITIVE_INFINITY, offset: Number.POSITIVE_INFINITY };

  if (!Number.isFinite(project(work, trial, estimated))) {
    return { ...best, end: "limit", iterations: 0 };
  }
  keep(here, work, trial);
  let radius = 0;
  let curvature = 1;
  let stale = 0;
  let iterations = 0;
  const finish = (end: Descent["end"]): Descent => ({ ...best, end, iterations });

  for (;;) {
    chooseMoving(here, model.nonlinear, map, moving);
    updateScaling(here, map, scaling, moving);
    const offset = relativeOffset(here, work, moving, region, p);
    const rounding =
      5e-15 * Math.sqrt(work.used) * here.sumOfSquares + 1e-15 * work.size * Math.sqrt(here.sumOfSquares);
    const floor = 4e-32 * work.size * work.size * work.used;
    stale = offset > 0.95 * best.offset ? stale + 1 : 0;
    // below the rounding of the sum of squares the offset decides which point is better
    if (offset < best.offset || here.sumOfSquares < best.sumOfSquares - rounding) {
      best.theta.set(here.theta);
      best.sumOfSquares = here.sumOfSquares;
      best.offset = offset;
    }
    if (offset <= tolerance || here.sumOfSquares <= floor) return finish("converged");
    if (iterations >= maximum) return finish("limit");
    if (options.stopped?.()) return finish("stopped");
    iterations++;

    if (radius === 0) radius = firstRadius(here, map, scaling, damping);
    let predicted = trustStep(region, moving.columns, here.projected, moving.count, moving.scaling, radius);
    if (p === 1 && moving.count === 1 && curvature !== 1) secantStep(region, here, scaling, curvature, radius);
    let moved = false;
    trial.set(here.theta);
    for (let k = 0; k < moving.count; k++) {
      const m = moving.index[k]!;
      const { low, high } = model.nonlinear[m]!;
      const to = Math.min(Math.max(here.theta[m]! + region.step[k]!, low), high);
      region.step[k] = to - here.theta[m]!;
      trial[m] = to;
      if (to !== here.theta[m]) moved = true;
    }
    if (!moved) return finish(stationary(offset));
    predicted = promised(here, moving, region, p === 1 ? curvature : 1);

    const before = here.sumOfSquares;
    const gradientBefore = p === 1 ? here.reduced[0]![0]! * here.projected[0]! : 0;
    const after = project(work, trial, estimated);
    const length = stepLength(region, moving);
    let accepted: boolean;
    if (Math.abs(predicted) <= rounding) {
      if (stale >= 4) return finish(stationary(best.offset));
      accepted = after <= before + 100 * rounding;
      if (!accepted) radius = 0.25 * length;
    } else {
      const ratio = (before - after) / predicted;
      accepted = ratio > 1e-4;
      if (!(ratio > 0.25)) radius = (Number.isFinite(ratio) && ratio > 0 ? 0.5 : 0.2) * Math.min(radius, length);
      else if (ratio > 0.75) radius = Math.max(radius, 2 * length);
    }
    if (accepted) {
      if (p === 1) curvature = secant(work, trial, here, gradientBefore, length, map[0]!, curvature);
      keep(here, work, trial);
    } else {
      curvature = 1;
      if (radius <= 1e-16 * scaledSize(here, map, scaling)) return finish(stationary(offset));
    }
  }
}

/** Where no step makes the sum of squares fall any more, only a small offset is a minimum. */
function stationary(offset: number): "converged" | "limit" {
  return offset <= 1e-5 ? "converged" : "limit";
}

/** Leaves out the parameters on a bound that the descent direction would push further out. */
function chooseMoving(
  here: Point,
  nonlinear: readonly { readonly low: number; readonly high: number }[],
  map: readonly number[],
  moving: Moving,
): void {
  moving.count = 0;
  moving.columns.length = 0;
  for (let k = 0; k < map.length; k++) {
    const m = map[k]!;
    const value = here.theta[m]!;
    const { low, high } = nonlinear[m]!;
    if (value <= low || value >= high) {
      let direction = 0;
      const column = here.reduced[k]!;
      for (let i = 0; i < map.length; i++) direction += column[i]! * here.projected[i]!;
      if ((value <= low && direction <= 0) || (value >= high && direction >= 0)) continue;
    }
    moving.columns.push(here.reduced[k]!);
    moving.index[moving.count] = m;
    moving.count++;
  }
}

/** Moré's scaling: the greatest column norm seen so far. */
function updateScaling(here: Point, map: readonly number[], scaling: Float64Array, moving: Moving): void {
  for (let k = 0; k < map.length; k++) {
    const length = norm(here.reduced[k]!, 0, map.length);
    if (length > scaling[k]!) scaling[k] = length;
  }
  for (let c = 0; c < moving.count; c++) {
    const value = scaling[map.indexOf(moving.index[c]!)]!;
    moving.scaling[c] = value > 0 ? value : 1;
  }
}

function scaledSize(here: Point, map: readonly number[], scaling: Float64Array): number {
  let sum = 0;
  for (let k = 0; k < map.length; k++) {
    const part = scaling[k]! * here.theta[map[k]!]!;
    sum += part * part;
  }
  return Math.sqrt(sum);
}

function firstRadius(here: Point, map: readonly number[], scaling: Float64Array, damping: number): number {
  const size = scaledSize(here, map, scaling);
  return size > 0 ? damping * size : damping;
}

function stepLength(region: TrustRegion, moving: Moving): number {
  let sum = 0;
  for (let k = 0; k < moving.count; k++) {
    const part = region.step[k]! * moving.scaling[k]!;
    sum += part * part;
  }
  return Math.sqrt(sum);
}

function relativeOffset(here: Point, work: Projection, moving: Moving, region: TrustRegion, p: number): number {
  if (moving.count === 0) return 0;
  let reachable = 0;
  if (moving.count === p) for (let k = 0; k < p; k++) reachable += here.projected[k]! * here.projected[k]!;
  else {
    reachable = trustStep(
      region,
      moving.columns,
      here.projected,
      moving.count,
      moving.scaling,
      Number.POSITIVE_INFINITY,
    );
  }
  if (reachable <= 0) return 0;
  const freedom = Math.max(1, work.used - work.linearCount - moving.count);
  const noise = Math.max(here.sumOfSquares - reachable, here.remainder) / freedom;
  return noise > 0 ? Math.sqrt(reachable / moving.count / noise) : Number.MAX_VALUE;
}

/** Decrease of the sum of squares that the quadratic model promises for the step; `curvature` only for one parameter. */
function promised(here: Point, moving: Moving, region: TrustRegion, curvature: number): number {
  let linear = 0;
  let square = 0;
  for (let i = 0; i < here.projected.length; i++) {
    let row = 0;
    for (let k = 0; k < moving.count; k++) row += region.step[k]! * moving.columns[k]![i]!;
    linear += row * here.projected[i]!;
    square += row * row;
  }
  return 2 * linear - curvature * square;
}

/** Replaces the step in the one parameter by the one of the secant curvature, within the trust region. */
function secantStep(region: TrustRegion, here: Point, scaling: Float64Array, curvature: number, radius: number): void {
  const slope = here.reduced[0]![0]!;
  const limit = radius / (scaling[0]! > 0 ? scaling[0]! : 1);
  const step = here.projected[0]! / slope / curvature;
  region.step[0] = Math.max(-limit, Math.min(limit, step));
}

/**
 * Ratio of the curvature that the gradients at the two ends of the step show to that of Gauss–Newton at the new end; the
 * old ratio where the step is too short for the difference to mean anything, 1 where it is out of all proportion.
 */
function secant(
  work: Projection,
  trial: Float64Array,
  here: Point,
  gradientBefore: number,
  length: number,
  m: number,
  old: number,
): number {
  if (length < 1e-6 * Math.sqrt(work.sumOfSquares)) return old;
  const slope = work.reduced[0]![0]!;
  const gradient = slope * work.projected[0]!;
  const ratio = -(gradient - gradientBefore) / (trial[m]! - here.theta[m]!) / (slope * slope);
  // far from the minimum a secant may point anywhere: there it may correct Gauss–Newton, not replace it
  const near = length * length * work.used < 0.1 * work.sumOfSquares;
  const most = near ? 50 : 4;
  return ratio * most > 1 && ratio < most ? ratio : 1;
}
