/**
 * Householder QR of a dense matrix held as an array of columns, in place.
 * Source: Golub and Van Loan, Matrix Computations, 5.1–5.2 (the reflector keeps the sign that avoids cancellation).
 *
 * After the factorisation column k holds, in rows 0 … k−1, the entries of R above the diagonal and, in rows k … n−1, the
 * vector v of reflector k; the diagonal of R stands in `diagonal`, and `scale[k]` = 2/(vᵀv) (0: no reflection was needed).
 */
export interface Factorisation {
  /** rows of the matrix */
  readonly rows: number;
  /** columns, each at least `rows` long */
  readonly columns: readonly Float64Array[];
  /** diagonal of R, one per column */
  readonly diagonal: Float64Array;
  /** 2/(vᵀv) of each reflector, one per column */
  readonly scale: Float64Array;
}

/** Σ a_i b_i for from ≤ i < to, in four partial sums (fixed order, so the last bit is always the same). */
export function dot(a: Float64Array, b: Float64Array, from: number, to: number): number {
  let s0 = 0;
  let s1 = 0;
  let s2 = 0;
  let s3 = 0;
  let i = from;
  for (const last = to - 3; i < last; i += 4) {
    s0 += a[i]! * b[i]!;
    s1 += a[i + 1]! * b[i + 1]!;
    s2 += a[i + 2]! * b[i + 2]!;
    s3 += a[i + 3]! * b[i + 3]!;
  }
  for (; i < to; i++) s0 += a[i]! * b[i]!;
  return s0 + s1 + (s2 + s3);
}

/** Euclidean norm of rows from ≤ i < to; rescales only where the squares would leave the range of a double. */
export function norm(a: Float64Array, from: number, to: number): number {
  const square = dot(a, a, from, to);
  if (square > 1e-280 && square < 1e300) return Math.sqrt(square);
  let greatest = 0;
  for (let i = from; i < to; i++) greatest = Math.max(greatest, Math.abs(a[i]!));
  if (greatest === 0 || !Number.isFinite(greatest)) return greatest;
  let sum = 0;
  for (let i = from; i < to; i++) {
    const part = a[i]! / greatest;
    sum += part * part;
  }
  return greatest * Math.sqrt(sum);
}

/** b ← H_k b for reflector k. */
export function applyReflector(f: Factorisation, k: number, b: Float64Array): void {
  const scale = f.scale[k]!;
  if (scale === 0) return;
  const v = f.columns[k]!;
  const n = f.rows;
  const s = dot(v, b, k, n) * scale;
  for (let i = k; i < n; i++) b[i]! -= s * v[i]!;
}

/** A column shorter than this counts as 0: the square of its length is no longer a double. */
const negligible = 1e-150;

/** Makes reflector k from rows k … n−1 of column k, to which reflectors 0 … k−1 were already applied. */
export function makeReflector(f: Factorisation, k: number): void {
  const v = f.columns[k]!;
  const length = norm(v, k, f.rows);
  if (length < negligible) {
    f.diagonal[k] = 0;
    f.scale[k] = 0;
    return;
  }
  const head = v[k]!;
  const diagonal = head > 0 ? -length : length;
  const first = head - diagonal;
  v[k] = first;
  f.diagonal[k] = diagonal;
  f.scale[k] = 1 / length / Math.abs(first);
}

/** An empty factorisation over the given columns (they are overwritten by `factor`). */
export function factorisation(rows: number, columns: readonly Float64Array[]): Factorisation {
  const count = columns.length;
  return { rows, columns, diagonal: new Float64Array(count), scale: new Float64Array(count) };
}

/** Factors the first `count` columns in place. */
export function factor(f: Factorisation, count: number = f.columns.length): void {
  for (let k = 0; k < count; k++) {
    makeReflector(f, k);
    for (let j = k + 1; j < count; j++) applyReflector(f, k, f.columns[j]!);
  }
}

/** b ← Qᵀ b with the first `count` reflectors. */
export function applyTransposed(f: Factorisation, b: Float64Array, count: number = f.columns.length): void {
  for (let k = 0; k < count; k++) applyReflector(f, k, b);
}

/** Norm of column j as it was before the factorisation (reflections keep it), from R alone. */
export function columnNorm(f: Factorisation, j: number): number {
  const column = f.columns[j]!;
  const above = norm(column, 0, j);
  const d = Math.abs(f.diagonal[j]!);
  return Math.sqrt(above * above + d * d);
}

/** Share of column j that the columns before it do not explain: |R_jj| / ‖column j‖, 0 for a column of zeros. */
export function independence(f: Factorisation, j: number): number {
  const whole = columnNorm(f, j);
  return whole === 0 ? 0 : Math.abs(f.diagonal[j]!) / whole;
}

/** Numerical rank without pivoting: how many columns keep a share above `tolerance` of their own. */
export function rank(f: Factorisation, tolerance = 1e-12, count: number = f.columns.length): number {
  let found = 0;
  for (let j = 0; j < count; j++) if (independence(f, j) > tolerance) found++;
  return found;
}

/** Solves R x = b for the first `count` columns; x may be b. The diagonal must hold no zero. */
export function solveUpper(f: Factorisation, b: Float64Array, x: Float64Array, count: number = f.columns.length): void {
  for (let i = 0; i < count; i++) x[i] = b[i]!;
  for (let j = count - 1; j >= 0; j--) {
    const value = x[j]! / f.diagonal[j]!;
    x[j] = value;
    const column = f.columns[j]!;
    for (let i = 0; i < j; i++) x[i]! -= value * column[i]!;
  }
}

/** Solves Rᵀ x = b for the first `count` columns; x may be b. The diagonal must hold no zero. */
export function solveLowerTransposed(
  f: Factorisation,
  b: Float64Array,
  x: Float64Array,
  count: number = f.columns.length,
): void {
  for (let j = 0; j < count; j++) x[j] = (b[j]! - dot(f.columns[j]!, x, 0, j)) / f.diagonal[j]!;
}

/** (RᵀR)⁻¹ as rows; null where R is singular or an entry leaves the range of a double. */
export function inverseOfSquare(f: Factorisation, count: number = f.columns.length): number[][] | null {
  const inverse: Float64Array[] = [];
  for (let j = 0; j < count; j++) {
    if (f.diagonal[j] === 0) return null;
    const x = new Float64Array(count);
    x[j] = 1;
    solveUpper(f, x, x, count);
    inverse.push(x);
  }
  const result: number[][] = [];
  for (let i = 0; i < count; i++) {
    const row: number[] = [];
    for (let j = 0; j < count; j++) {
      let sum = 0;
      for (let k = Math.max(i, j); k < count; k++) sum += inverse[k]![i]! * inverse[k]![j]!;
      if (!Number.isFinite(sum)) return null;
      row.push(sum);
    }
    result.push(row);
  }
  return result;
}

/**
 * Condition number (2-norm) of the matrix with its columns scaled to length 1, from R by one-sided Jacobi rotations
 * (Golub and Van Loan, 8.6.3); null where it is singular to working precision.
 */
export function scaledCondition(f: Factorisation, count: number = f.columns.length): number | null {
  if (count === 0) return 1;
  const a: Float64Array[] = [];
  for (let j = 0; j < count; j++) {
    const length = columnNorm(f, j);
    if (length === 0 || !Number.isFinite(length)) return null;
    const column = new Float64Array(count);
    for (let i = 0; i < j; i++) column[i] = f.columns[j]![i]! / length;
    column[j] = f.diagonal[j]! / length;
    a.push(column);
  }
  for (let sweep = 0, rotated = true; rotated && sweep < 60; sweep++) {
    rotated = false;
    for (let i = 0; i < count - 1; i++) {
      for (let j = i + 1; j < count; j++) rotated = rotate(a[i]!, a[j]!, count) || rotated;
    }
  }
  let least = Number.POSITIVE_INFINITY;
  let greatest = 0;
  for (const column of a) {
    const value = norm(column, 0, count);
    least = Math.min(least, value);
    greatest = Math.max(greatest, value);
  }
  const condition = greatest / least;
  return Number.isFinite(condition) && condition < 1e16 ? condition : null;
}

/** Rotates two columns until they are orthogonal; false where they already are. */
function rotate(u: Float64Array, v: Float64Array, n: number): boolean {
  const uu = dot(u, u, 0, n);
  const vv = dot(v, v, 0, n);
  const uv = dot(u, v, 0, n);
  if (uv === 0 || Math.abs(uv) <= 1e-15 * Math.sqrt(uu * vv)) return false;
  const zeta = (vv - uu) / (2 * uv);
  const t = (zeta < 0 ? -1 : 1) / (Math.abs(zeta) + Math.sqrt(1 + zeta * zeta));
  const c = 1 / Math.sqrt(1 + t * t);
  const s = c * t;
  for (let i = 0; i < n; i++) {
    const x = u[i]!;
    const y = v[i]!;
    u[i] = c * x - s * y;
    v[i] = s * x + c * y;
  }
  return true;
}
