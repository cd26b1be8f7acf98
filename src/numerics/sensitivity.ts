import { applyTransposed, type Factorisation, factor, factorisation, independence, solveUpper } from "./householder.js";
import type { LeastSquaresFit } from "./separableModel.js";

/**
 * Shift of each parameter in `fit.free` when the observations shift by each of `shifts` (length n, unit of y), to first
 * order: (JᵀWJ)⁻¹JᵀW·shift, by QR. Carries common sources of uncertainty through a finished fit
 * (JCGM 100:2008, 5.1). Empty lists where the fit is singular.
 */
export function sensitivities(
  fit: LeastSquaresFit,
  weights: Float64Array | null,
  shifts: readonly Float64Array[],
): number[][] {
  const f = fit.covariance === null ? null : factored(fit, weights);
  if (f === null) return shifts.map(() => []);
  const work = new Float64Array(f.rows);
  return shifts.map((shift) => {
    for (let i = 0; i < f.rows; i++) {
      const root = rootWeight(weights, i);
      const value = shift[i]! * root;
      work[i] = root === 0 || !Number.isFinite(value) ? 0 : value;
    }
    applyTransposed(f, work);
    const result = new Float64Array(f.columns.length);
    solveUpper(f, work, result);
    return Array.from(result);
  });
}

/** The same for one shift. */
export function sensitivity(fit: LeastSquaresFit, weights: Float64Array | null, shift: Float64Array): number[] {
  return sensitivities(fit, weights, [shift])[0]!;
}

function rootWeight(weights: Float64Array | null, i: number): number {
  if (weights === null) return 1;
  const w = weights[i]!;
  return w > 0 && Number.isFinite(w) ? Math.sqrt(w) : 0;
}

function factored(fit: LeastSquaresFit, weights: Float64Array | null): Factorisation | null {
  const n = fit.fitted.length;
  const columns = fit.jacobian.map((column) => {
    const weighted = new Float64Array(n);
    for (let i = 0; i < n; i++) weighted[i] = column[i]! * rootWeight(weights, i);
    return weighted;
  });
  const f = factorisation(n, columns);
  factor(f);
  for (let k = 0; k < columns.length; k++) if (!(independence(f, k) > 1e-14)) return null;
  return f;
}
