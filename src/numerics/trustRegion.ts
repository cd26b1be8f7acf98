import {
  applyTransposed,
  dot,
  type Factorisation,
  factor,
  factorisation,
  norm,
  solveLowerTransposed,
  solveUpper,
} from "./householder.js";

/** Work space for steps in up to `size` parameters; made once per fit. */
export interface TrustRegion {
  readonly size: number;
  readonly stacked: Factorisation;
  readonly right: Float64Array;
  /** the step last computed */
  readonly step: Float64Array;
  readonly scratch: Float64Array;
}

export function trustRegion(size: number): TrustRegion {
  const columns = Array.from({ length: size }, () => new Float64Array(2 * size));
  return {
    size,
    stacked: factorisation(2 * size, columns),
    right: new Float64Array(2 * size),
    step: new Float64Array(size),
    scratch: new Float64Array(size),
  };
}

/**
 * Levenberg–Marquardt step within a trust region: minimises ‖z − M s‖ over ‖D s‖ ≤ radius (to a tenth), writes s to
 * `region.step` and returns the decrease of the sum of squares that it promises.
 * `matrix` holds the `count` columns of M (`size` rows), `z` the `size` right-hand sides, `scaling` the diagonal of D.
 * Source: J. J. Moré, The Levenberg–Marquardt algorithm: implementation and theory, in: G. A. Watson (ed.), Numerical Analysis, Springer, Berlin
 * (1978) 105–116; each trial parameter by QR of M stacked on √λ D.
 */
export function trustStep(
  region: TrustRegion,
  matrix: readonly Float64Array[],
  z: Float64Array,
  count: number,
  scaling: Float64Array,
  radius: number,
): number {
  const { size, step, scratch } = region;
  let lambda = 0;
  let regular = solveDamped(region, matrix, z, count, scaling, 0);
  let length = regular ? scaledLength(step, scaling, count) : Number.POSITIVE_INFINITY;
  if (!(length <= 1.1 * radius)) {
    let lower = 0;
    if (regular) lower = (length - radius) / length / decay(region, scaling, count, length);
    let upper = 0;
    for (let j = 0; j < count; j++) {
      const g = dot(matrix[j]!, z, 0, size) / scaling[j]!;
      upper += g * g;
    }
    upper = Math.sqrt(upper) / radius;
    if (upper === 0) {
      step.fill(0);
      return 0;
    }
    lambda = Math.max(lower, regular ? 0 : 0.001 * upper);
    if (!(lambda > 0)) lambda = 0.001 * upper;
    for (let trial = 0; trial < 12; trial++) {
      lambda = Math.min(Math.max(lambda, lower), upper);
      if (lambda === 0) lambda = 0.001 * upper;
      regular = solveDamped(region, matrix, z, count, scaling, lambda);
      length = scaledLength(step, scaling, count);
      const excess = length - radius;
      if (!regular || Math.abs(excess) <= 0.1 * radius) break;
      if (excess > 0) lower = Math.max(lower, lambda);
      else upper = Math.min(upper, lambda);
      lambda = Math.max(lower, lambda + excess / radius / decay(region, scaling, count, length));
    }
  }
  // ‖z‖² − ‖z − M s‖² = 2 zᵀM s − ‖M s‖²
  scratch.fill(0);
  for (let j = 0; j < count; j++) {
    const s = step[j]!;
    const column = matrix[j]!;
    for (let i = 0; i < size; i++) scratch[i]! += s * column[i]!;
  }
  return 2 * dot(scratch, z, 0, size) - dot(scratch, scratch, 0, size);
}

function scaledLength(step: Float64Array, scaling: Float64Array, count: number): number {
  let sum = 0;
  for (let j = 0; j < count; j++) {
    const part = step[j]! * scaling[j]!;
    sum += part * part;
  }
  return Math.sqrt(sum);
}

/** step ← argmin ‖M s − z‖² + λ‖D s‖²; false where the system is singular (the step is then 0). */
function solveDamped(
  region: TrustRegion,
  matrix: readonly Float64Array[],
  z: Float64Array,
  count: number,
  scaling: Float64Array,
  lambda: number,
): boolean {
  const { size, stacked, right, step } = region;
  const root = Math.sqrt(lambda);
  right.fill(0);
  for (let i = 0; i < size; i++) right[i] = z[i]!;
  for (let j = 0; j < count; j++) {
    const column = stacked.columns[j]!;
    column.fill(0);
    for (let i = 0; i < size; i++) column[i] = matrix[j]![i]!;
    column[size + j] = root * scaling[j]!;
  }
  factor(stacked, count);
  let greatest = 0;
  for (let j = 0; j < count; j++) greatest = Math.max(greatest, Math.abs(stacked.diagonal[j]!) / scaling[j]!);
  for (let j = 0; j < count; j++) {
    if (!(Math.abs(stacked.diagonal[j]!) / scaling[j]! > 1e-15 * greatest)) {
      step.fill(0);
      return false;
    }
  }
  applyTransposed(stacked, right, count);
  solveUpper(stacked, right, step, count);
  return true;
}

/** −d ln‖D s‖ / dλ from the factorisation that gave the step. */
function decay(region: TrustRegion, scaling: Float64Array, count: number, length: number): number {
  const { stacked, step, scratch } = region;
  for (let j = 0; j < count; j++) scratch[j] = (scaling[j]! * scaling[j]! * step[j]!) / length;
  solveLowerTransposed(stacked, scratch, scratch, count);
  const size = norm(scratch, 0, count);
  return size * size;
}
