import {
  applyReflector,
  type Factorisation,
  factor,
  factorisation,
  independence,
  norm,
  solveLowerTransposed,
} from "./householder.js";

/** How far a local fit looks: a fixed half-width in the unit of x, or the distance of its k-th nearest observation. */
export type Bandwidth = { readonly halfWidth: number } | { readonly neighbours: number };

export interface LocalOptions {
  readonly bandwidth: Bandwidth;
  /** degree of the local polynomial; 2 unless said */
  readonly degree?: 1 | 2 | 3;
  /** `tricube` (unless said): (1 − |d/h|³)³ at distance d; `equal`: 1 within h */
  readonly kernel?: "tricube" | "equal";
}

/** A local polynomial at x0. The coefficients belong to observations `from`, `from` + 1, …: slope = Σ c_i y_i. */
export interface LocalFit {
  /** unit of y */
  readonly value: number;
  /** unit of y over unit of x */
  readonly slope: number;
  readonly from: number;
  readonly valueCoefficients: Float64Array;
  readonly slopeCoefficients: Float64Array;
  /** √Σc²: standard deviation of the value for unit independent noise in y */
  readonly valueNoise: number;
  /** the same for the slope */
  readonly slopeNoise: number;
  /** half-width used, unit of x */
  readonly halfWidth: number;
  /** observations with a weight above 0 */
  readonly used: number;
}

/**
 * Local polynomial regression at x0 (W. S. Cleveland, J. Am. Stat. Assoc. 74 (1979) 829–836); with equal weights and even
 * spacing, at the middle of a window, it is the filter of Savitzky and Golay (Anal. Chem. 36 (1964) 1627–1639).
 * `x` ascending (equal values allowed), `y` of the same length, all finite. Null where fewer than degree + 1 different x
 * have weight, where the bandwidth is not above 0, or where a number is not finite.
 */
export function localSlope(x: Float64Array, y: Float64Array, x0: number, options: LocalOptions): LocalFit | null {
  return localFit(x, y, x0, options, 0, 0);
}

/** The same with observations `skipFrom` ≤ i < `skipTo` given no weight; the half-width stays that of all of them. */
export function localFit(
  x: Float64Array,
  y: Float64Array,
  x0: number,
  options: LocalOptions,
  skipFrom: number,
  skipTo: number,
): LocalFit | null {
  const degree = options.degree ?? 2;
  const halfWidth =
    "halfWidth" in options.bandwidth
      ? options.bandwidth.halfWidth
      : neighbourDistance(x, x0, options.bandwidth.neighbours);
  if (!(halfWidth > 0) || !Number.isFinite(halfWidth) || !Number.isFinite(x0)) return null;
  const reach = halfWidth * (1 + 1e-12);
  const from = firstAtLeast(x, x0 - reach);
  let to = from;
  while (to < x.length && x[to]! - x0 <= reach) to++;
  const n = to - from;
  const root = new Float64Array(n);
  let used = 0;
  let distinct = 0;
  let last = Number.NaN;
  for (let i = 0; i < n; i++) {
    if (from + i >= skipFrom && from + i < skipTo) continue;
    const weight = kernelWeight(Math.abs(x[from + i]! - x0) / halfWidth, options.kernel ?? "tricube");
    if (weight === 0) continue;
    root[i] = Math.sqrt(weight);
    used++;
    if (x[from + i] !== last) distinct++;
    last = x[from + i]!;
  }
  if (distinct < degree + 1) return null;
  const columns = Array.from({ length: degree + 1 }, () => new Float64Array(n));
  for (let i = 0; i < n; i++) {
    const u = (x[from + i]! - x0) / halfWidth;
    let power = root[i]!;
    for (let k = 0; k <= degree; k++) {
      columns[k]![i] = power;
      power *= u;
    }
  }
  const f = factorisation(n, columns);
  factor(f);
  for (let k = 0; k <= degree; k++) if (!(independence(f, k) > 1e-10)) return null;
  const valueCoefficients = coefficientsOf(f, 0, root, 1);
  const slopeCoefficients = coefficientsOf(f, 1, root, 1 / halfWidth);
  let value = 0;
  let slope = 0;
  for (let i = 0; i < n; i++) {
    if (root[i] === 0) continue;
    value += valueCoefficients[i]! * y[from + i]!;
    slope += slopeCoefficients[i]! * y[from + i]!;
  }
  if (!Number.isFinite(value) || !Number.isFinite(slope)) return null;
  return {
    value,
    slope,
    from,
    valueCoefficients,
    slopeCoefficients,
    valueNoise: norm(valueCoefficients, 0, n),
    slopeNoise: norm(slopeCoefficients, 0, n),
    halfWidth,
    used,
  };
}

function kernelWeight(distance: number, kernel: "tricube" | "equal"): number {
  if (kernel === "equal") return 1;
  if (distance >= 1) return 0;
  const rest = 1 - distance * distance * distance;
  return rest * rest * rest;
}

/** Row k of (AᵀWA)⁻¹AᵀW, times `factorOfUnit`: √w · Q R⁻ᵀ e_k. */
function coefficientsOf(f: Factorisation, k: number, root: Float64Array, factorOfUnit: number): Float64Array {
  const p = f.columns.length;
  const row = new Float64Array(f.rows);
  row[k] = factorOfUnit;
  solveLowerTransposed(f, row, row, p);
  for (let j = p - 1; j >= 0; j--) applyReflector(f, j, row);
  for (let i = 0; i < row.length; i++) row[i]! *= root[i]!;
  return row;
}

/** Index of the first x that is not below `value`; x ascending. */
function firstAtLeast(x: Float64Array, value: number): number {
  let low = 0;
  let high = x.length;
  while (low < high) {
    const middle = (low + high) >>> 1;
    if (x[middle]! < value) low = middle + 1;
    else high = middle;
  }
  return low;
}

/** Distance of the k-th nearest observation (the farthest one where there are fewer); 0 where there is none. */
function neighbourDistance(x: Float64Array, x0: number, neighbours: number): number {
  let right = firstAtLeast(x, x0);
  let left = right - 1;
  let distance = 0;
  for (let k = 0; k < neighbours; k++) {
    const below = left >= 0 ? x0 - x[left]! : Number.POSITIVE_INFINITY;
    const above = right < x.length ? x[right]! - x0 : Number.POSITIVE_INFINITY;
    const nearest = Math.min(below, above);
    if (nearest === Number.POSITIVE_INFINITY) break;
    distance = nearest;
    if (below <= above) left--;
    else right++;
  }
  return distance;
}
