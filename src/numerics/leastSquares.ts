/** Weighted separable nonlinear least squares: the types, the fit, and what is computed from a finished fit. */
export { type ProfileInterval, type ProfileOptions, profileInterval } from "./profileInterval.js";
export { sensitivities, sensitivity } from "./sensitivity.js";
export { fitLeastSquares } from "./separableFit.js";
export type {
  LeastSquaresFit,
  LeastSquaresOptions,
  LinearParameter,
  NonlinearParameter,
  SeparableModel,
  StopReason,
} from "./separableModel.js";
