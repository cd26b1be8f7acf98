import type { Polling } from "../contract/polling.js";

/** A parameter that multiplies one basis function; free unless `fixed`, and then within [low, high] (±∞ allowed). */
export interface LinearParameter {
  readonly name: string;
  /** its value where it is not estimated, else null */
  readonly fixed: number | null;
  readonly low: number;
  readonly high: number;
}

/** A parameter inside the basis functions. `low === high` keeps it at that value. */
export interface NonlinearParameter {
  readonly name: string;
  readonly low: number;
  readonly high: number;
  /** trial values, ascending, at least one; the search starts from the best of them, so no start value is asked for */
  readonly grid: readonly number[];
}

/** y_i ≈ Σ_j linear_j · φ_j(i; θ) with θ the nonlinear parameters. */
export interface SeparableModel {
  readonly linear: readonly LinearParameter[];
  readonly nonlinear: readonly NonlinearParameter[];
  /** Fills `basis[j]` (length n) with φ_j and, unless null, `derivative[m][j]` with ∂φ_j/∂θ_m. */
  evaluate(
    theta: Float64Array,
    basis: readonly Float64Array[],
    derivative: readonly (readonly Float64Array[])[] | null,
  ): void;
  /**
   * The same model over the named observations only (indices ascending). Where it is given, many observations are
   * thinned out for the search of a start; the fit itself always uses all of them.
   */
  thinned?(indices: Int32Array): SeparableModel;
}

export interface LeastSquaresOptions extends Polling {
  /** per start; 500 unless said */
  readonly maximumIterations?: number;
  /** relative offset (Bates and Watts) at which the iteration ends; 1e-10 unless said */
  readonly tolerance?: number;
}

/**
 * How a fit ended: `converged`; `bound`: a minimum with a nonlinear parameter on its bound; `limit`: no stationary point
 * within the iterations allowed; `singular`: the observations do not determine every free parameter; `stopped`: asked to.
 */
export type StopReason = "converged" | "limit" | "singular" | "bound" | "stopped";

/** Parameters stand in one order everywhere: the linear ones, then the nonlinear ones. */
export interface LeastSquaresFit {
  readonly stop: StopReason;
  readonly values: number[];
  readonly names: string[];
  /** indices into `values` of those estimated: neither fixed nor sitting on a bound */
  readonly free: number[];
  readonly bound: ("low" | "high" | null)[];
  /** (JᵀWJ)⁻¹ over `free`, not scaled by the residual variance; null where singular */
  readonly covariance: number[][] | null;
  /** y − fit, unweighted, length n; 0 where the observation is not a finite number */
  readonly residuals: Float64Array;
  /** length n */
  readonly fitted: Float64Array;
  /** Σ w r² */
  readonly chiSquare: number;
  /** observations with a weight above 0, less the parameters in `free`; may be 0 or, where singular, negative */
  readonly degreesOfFreedom: number;
  readonly iterations: number;
  /** relative offset at the end (0: stationary to the last bit) */
  readonly offset: number;
  /** condition number of the weighted Jacobian with columns of length 1; null where singular */
  readonly condition: number | null;
  /** one column per parameter in `free`, each of length n: ∂fit/∂parameter, unweighted */
  readonly jacobian: Float64Array[];
}
