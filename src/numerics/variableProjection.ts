import { boundedSides, type Side } from "./boundedLinear.js";
import {
  applyReflector,
  applyTransposed,
  columnNorm,
  type Factorisation,
  factorisation,
  makeReflector,
  solveUpper,
} from "./householder.js";
import type { SeparableModel } from "./separableModel.js";

/** A linear column counts as dependent on those before it below this share of its length. */
const dependent = 1e-14;

/**
 * Work space and last state of the projection; made once per fit, so that nothing is allocated while iterating.
 * The observations with a non-finite y or a weight that is not above 0 and finite take no part (√w = 0).
 */
export interface Projection {
  readonly model: SeparableModel;
  /** observations */
  readonly n: number;
  /** observations that take part */
  readonly used: number;
  /** as given */
  readonly observed: Float64Array;
  /** the same with 0 where it is not finite */
  readonly y: Float64Array;
  /** √w, length n; null where all are 1 */
  readonly root: Float64Array | null;
  /** ‖√w y‖ */
  readonly size: number;
  readonly basis: readonly Float64Array[];
  readonly derivative: readonly (readonly Float64Array[])[];
  /** columns of the weighted Jacobian, then their QR: free linear ones, then the nonlinear ones */
  readonly qr: Factorisation;
  /** weighted observations, then Qᵀ times them */
  readonly right: Float64Array;
  /** value of each linear parameter */
  readonly beta: Float64Array;
  /** the coefficients of the columns present, before bounds are looked at */
  readonly solution: Float64Array;
  /** where each linear parameter ended */
  readonly side: Side[];
  /** linear parameters that have a column, in order: `linearCount` of them */
  readonly linearFree: Int32Array;
  linearCount: number;
  /** nonlinear parameters that have a column: `nonlinearCount` of them */
  readonly nonlinearFree: Int32Array;
  nonlinearCount: number;
  /** R of the projected Jacobian −∂r/∂θ (Kaufman), one column per entry of `nonlinearFree` */
  readonly reduced: readonly Float64Array[];
  /** Qᵀr belonging to `reduced` */
  readonly projected: Float64Array;
  /** Σ w r² */
  sumOfSquares: number;
  /** the part of it that no step in θ can take away */
  remainder: number;
  /** θ of the last projection with a Jacobian, else NaN */
  readonly theta: Float64Array;
  /** true where a linear column is (nearly) a combination of those before it; its coefficient is then 0 */
  deficient: boolean;
}

export function projection(y: Float64Array, weights: Float64Array | null, model: SeparableModel): Projection {
  const n = y.length;
  const q = model.linear.length;
  const p = model.nonlinear.length;
  let plain = true;
  let used = 0;
  let size = 0;
  for (let i = 0; i < n; i++) {
    const w = weights === null ? 1 : weights[i]!;
    if (w > 0 && Number.isFinite(w) && Number.isFinite(y[i]!)) {
      used++;
      size += w * y[i]! * y[i]!;
    } else {
      plain = false;
    }
  }
  const clean = plain ? y : y.map((value) => (Number.isFinite(value) ? value : 0));
  let root: Float64Array | null = null;
  if (weights !== null || !plain) {
    root = new Float64Array(n);
    for (let i = 0; i < n; i++) {
      const w = weights === null ? 1 : weights[i]!;
      root[i] = w > 0 && Number.isFinite(w) && Number.isFinite(y[i]!) ? Math.sqrt(w) : 0;
    }
  }
  const arrays = (count: number, length: number) => Array.from({ length: count }, () => new Float64Array(length));
  return {
    model,
    n,
    used,
    observed: y,
    y: clean,
    root,
    size: Math.sqrt(size),
    basis: arrays(q, n),
    derivative: Array.from({ length: p }, () => arrays(q, n)),
    qr: factorisation(n, arrays(q + p, Math.max(n, q + p))),
    right: new Float64Array(Math.max(n, q + p)),
    beta: new Float64Array(q),
    solution: new Float64Array(q),
    side: new Array<Side>(q).fill("free"),
    linearFree: new Int32Array(q),
    linearCount: 0,
    nonlinearFree: new Int32Array(p),
    nonlinearCount: 0,
    reduced: arrays(p, p),
    projected: new Float64Array(p),
    sumOfSquares: 0,
    remainder: 0,
    theta: new Float64Array(p).fill(Number.NaN),
    deficient: false,
  };
}

/**
 * Eliminates the linear parameters at θ and returns Σ w r² (+∞ where the model is not finite there). With `estimated`
 * (which nonlinear parameters have a column) the projected Jacobian is made too: the QR of [Φ | Σ β_j ∂φ_j/∂θ_m]
 * gives β, Kaufman's Jacobian of the projected problem, and R of the full Jacobian at once.
 * Sources: G. H. Golub and V. Pereyra, SIAM J. Numer. Anal. 10 (1973) 413–432; L. Kaufman, BIT 15 (1975) 49–57.
 */
export function project(work: Projection, theta: Float64Array, estimated: readonly boolean[] | null): number {
  const { model, qr, n } = work;
  if (estimated === null) work.theta.fill(Number.NaN);
  else work.theta.set(theta);
  model.evaluate(theta, work.basis, estimated === null ? null : work.derivative);
  for (let j = 0; j < model.linear.length; j++) {
    const { fixed } = model.linear[j]!;
    work.side[j] = "free";
    work.beta[j] = fixed ?? 0;
  }
  work.deficient = false;
  if (!eliminate(work)) return refuse(work);
  const count = work.linearCount;
  if (estimated === null) {
    work.nonlinearCount = 0;
    work.remainder = tail(work.right, Math.min(count, n), n);
    work.sumOfSquares = work.remainder;
    return Number.isFinite(work.sumOfSquares) ? work.sumOfSquares : refuse(work);
  }
  let kept = 0;
  for (let m = 0; m < model.nonlinear.length; m++) {
    if (!estimated[m]) continue;
    const column = qr.columns[count + kept]!;
    gather(work, work.derivative[m]!, column);
    for (let k = 0; k < count; k++) applyReflector(qr, k, column);
    work.nonlinearFree[kept++] = m;
  }
  work.nonlinearCount = kept;
  for (let k = 0; k < kept; k++) {
    makeReflector(qr, count + k);
    for (let j = k + 1; j < kept; j++) applyReflector(qr, count + k, qr.columns[count + j]!);
    applyReflector(qr, count + k, work.right);
  }
  let sum = 0;
  let idle = 0;
  for (let k = 0; k < kept; k++) {
    const column = work.reduced[k]!;
    const source = qr.columns[count + k]!;
    column.fill(0);
    for (let i = 0; i < k; i++) column[i] = source[count + i]!;
    column[k] = qr.diagonal[count + k]!;
    // a last column of zeros takes nothing from the residual: its part stays in the remainder
    const reaches = k < kept - 1 || column[k] !== 0;
    const part = work.right[count + k]!;
    const z = reaches ? part : 0;
    if (!reaches) idle = part * part;
    work.projected[k] = z;
    sum += z * z;
    if (!Number.isFinite(column[k]!)) return refuse(work);
  }
  work.remainder = tail(work.right, Math.min(count + kept, n), n) + idle;
  work.sumOfSquares = work.remainder + sum;
  return Number.isFinite(work.sumOfSquares) ? work.sumOfSquares : refuse(work);
}

/** True where the last projection was made at this θ with just these columns, so that its QR still stands. */
export function standsAt(work: Projection, theta: Float64Array, estimated: readonly boolean[]): boolean {
  if (!Number.isFinite(work.sumOfSquares)) return false;
  let kept = 0;
  for (let m = 0; m < estimated.length; m++) {
    if (work.theta[m] !== theta[m]) return false;
    if (estimated[m] && (kept >= work.nonlinearCount || work.nonlinearFree[kept++] !== m)) return false;
  }
  return kept === work.nonlinearCount;
}

function refuse(work: Projection): number {
  work.sumOfSquares = Number.POSITIVE_INFINITY;
  return work.sumOfSquares;
}

function tail(a: Float64Array, from: number, to: number): number {
  let s0 = 0;
  let s1 = 0;
  let i = from;
  for (; i < to - 1; i += 2) {
    s0 += a[i]! * a[i]!;
    s1 += a[i + 1]! * a[i + 1]!;
  }
  if (i < to) s0 += a[i]! * a[i]!;
  return s0 + s1;
}

/** column ← √w Σ_j β_j source_j */
function gather(work: Projection, source: readonly Float64Array[], column: Float64Array): void {
  const { n, root, beta } = work;
  let started = false;
  for (let j = 0; j < source.length; j++) {
    const b = beta[j]!;
    if (b === 0) continue;
    const from = source[j]!;
    if (started) for (let i = 0; i < n; i++) column[i]! += b * from[i]!;
    else for (let i = 0; i < n; i++) column[i] = b * from[i]!;
    started = true;
  }
  if (!started) column.fill(0);
  if (root !== null) weigh(column, root, n);
}

/** Multiplies by √w; where √w is 0 the product is 0 whatever stood there. */
function weigh(column: Float64Array, root: Float64Array, n: number): void {
  for (let i = 0; i < n; i++) column[i] = root[i] === 0 ? 0 : column[i]! * root[i]!;
}

/** QR of the free basis columns, β, bounds; false where something is not finite. */
function eliminate(work: Projection): boolean {
  const { model, qr, n, right, beta, side, linearFree } = work;
  for (let round = 0; round < 2; round++) {
    right.set(work.y);
    let count = 0;
    for (let j = 0; j < model.linear.length; j++) {
      const phi = work.basis[j]!;
      if (model.linear[j]!.fixed === null && side[j] === "free") {
        linearFree[count] = j;
        qr.columns[count++]!.set(phi);
      } else {
        const b = beta[j]!;
        if (b !== 0) for (let i = 0; i < n; i++) right[i]! -= b * phi[i]!;
      }
    }
    if (work.root !== null) {
      weigh(right, work.root, n);
      for (let k = 0; k < count; k++) weigh(qr.columns[k]!, work.root, n);
    }
    count = factorIndependent(work, count);
    if (count < 0) return false;
    work.linearCount = count;
    applyTransposed(qr, right, count);
    if (!settle(work, round === 0)) continue;
    return true;
  }
  return true;
}

/** Factors the first columns, leaving out those that depend on earlier ones; −1 where a value is not finite. */
function factorIndependent(work: Projection, candidates: number): number {
  const { qr, linearFree } = work;
  let kept = 0;
  for (let k = 0; k < candidates; k++) {
    const column = qr.columns[k]!;
    for (let i = 0; i < kept; i++) applyReflector(qr, i, column);
    if (kept !== k) qr.columns[kept]!.set(column);
    if (kept >= work.n) {
      work.deficient = true;
      continue;
    }
    makeReflector(qr, kept);
    const diagonal = Math.abs(qr.diagonal[kept]!);
    if (!Number.isFinite(diagonal)) return -1;
    if (diagonal <= dependent * columnNorm(qr, kept)) {
      work.deficient = true;
      continue;
    }
    linearFree[kept++] = linearFree[k]!;
  }
  return kept;
}

/** Solves for β; where `mayBind` and a bound is broken, puts the parameters on their faces and returns false. */
function settle(work: Projection, mayBind: boolean): boolean {
  const { qr, right, beta, side, linearFree, linearCount: count, model } = work;
  if (count === 0) return true;
  solveUpper(qr, right, work.solution, count);
  let inside = true;
  for (let k = 0; k < count; k++) {
    const j = linearFree[k]!;
    const { low, high } = model.linear[j]!;
    beta[j] = work.solution[k]!;
    if (beta[j]! < low || beta[j]! > high) inside = false;
  }
  if (inside) return true;
  if (!mayBind) {
    for (let k = 0; k < count; k++) {
      const j = linearFree[k]!;
      beta[j] = Math.min(Math.max(beta[j]!, model.linear[j]!.low), model.linear[j]!.high);
    }
    return true;
  }
  const low = Array.from({ length: count }, (_, k) => model.linear[linearFree[k]!]!.low);
  const high = Array.from({ length: count }, (_, k) => model.linear[linearFree[k]!]!.high);
  const sides = boundedSides(qr, right, count, low, high);
  for (let k = 0; k < count; k++) {
    const j = linearFree[k]!;
    side[j] = sides?.[k] ?? "free";
    beta[j] = side[j] === "low" ? low[k]! : side[j] === "high" ? high[k]! : 0;
  }
  return false;
}
