import type { SeparableModel } from "../../src/numerics/leastSquares.js";

/** One term of a model: its value at x and, written to `slopes`, its derivatives by the nonlinear parameters. */
type Term = (x: number, theta: Float64Array, slopes: Float64Array) => number;

/** A model y = Σ β_j φ_j(x; θ) by the certified parameters: which of them are β (in order) and which θ. */
export interface NistModel {
  /** index into the certified parameters of each linear parameter; −1: a term that has the coefficient 1 */
  readonly linear: readonly number[];
  readonly nonlinear: readonly number[];
  readonly terms: readonly Term[];
  /** the same curve in other parameters: parameter i of the twin is `sign[i]` times parameter `order[i]` */
  readonly twin?: { readonly order: readonly number[]; readonly sign: readonly number[] };
}

const one: Term = () => 1;

/** e^(−b x) with b = θ[m] */
const decay =
  (m: number): Term =>
  (x, theta, slopes) => {
    const e = Math.exp(-theta[m]! * x);
    slopes[m] = -x * e;
    return e;
  };

/** e^(−((x − c)/w)²) with c = θ[m], w = θ[m + 1] */
const peak =
  (m: number): Term =>
  (x, theta, slopes) => {
    const width = theta[m + 1]!;
    const z = (x - theta[m]!) / width;
    const e = Math.exp(-z * z);
    slopes[m] = (e * 2 * z) / width;
    slopes[m + 1] = (e * 2 * z * z) / width;
    return e;
  };

const wave =
  (m: number, shape: "cos" | "sin"): Term =>
  (x, theta, slopes) => {
    const angle = (2 * Math.PI * x) / theta[m]!;
    const cos = Math.cos(angle);
    const sin = Math.sin(angle);
    slopes[m] = ((shape === "cos" ? sin : -cos) * angle) / theta[m]!;
    return shape === "cos" ? cos : sin;
  };

const season =
  (shape: "cos" | "sin"): Term =>
  (x) =>
    shape === "cos" ? Math.cos((2 * Math.PI * x) / 12) : Math.sin((2 * Math.PI * x) / 12);

/** x^n / (1 + b5 x + b6 x² + b7 x³) */
const rational =
  (power: number): Term =>
  (x, theta, slopes) => {
    const below = 1 + x * (theta[0]! + x * (theta[1]! + x * theta[2]!));
    const value = x ** power / below;
    for (let m = 0; m < 3; m++) slopes[m] = (-value * x ** (m + 1)) / below;
    return value;
  };

const cubicOverCubic: NistModel = {
  linear: [0, 1, 2, 3],
  nonlinear: [4, 5, 6],
  terms: [0, 1, 2, 3].map(rational),
};

const growth: NistModel = {
  linear: [0],
  nonlinear: [1],
  terms: [
    (x, theta, slopes) => {
      slopes[0] = x * Math.exp(-theta[0]! * x);
      return -Math.expm1(-theta[0]! * x);
    },
  ],
};

const expOverLine: NistModel = {
  linear: [-1],
  nonlinear: [0, 1, 2],
  terms: [
    (x, theta, slopes) => {
      const below = theta[1]! + theta[2]! * x;
      const value = Math.exp(-theta[0]! * x) / below;
      slopes[0] = -x * value;
      slopes[1] = -value / below;
      slopes[2] = (-value * x) / below;
      return value;
    },
  ],
};

const twoPeaks: NistModel = { linear: [0, 2, 5], nonlinear: [1, 3, 4, 6, 7], terms: [decay(0), peak(1), peak(3)] };

/** The models of the sets in nistStrd.json, by name (formulas there), with exact derivatives. */
export const nistModels: Readonly<Record<string, NistModel>> = {
  Bennett5: {
    linear: [0],
    nonlinear: [1, 2],
    terms: [
      (x, theta, slopes) => {
        const sum = theta[0]! + x;
        const value = sum ** (-1 / theta[1]!);
        slopes[0] = -value / (theta[1]! * sum);
        slopes[1] = (value * Math.log(sum)) / (theta[1]! * theta[1]!);
        return value;
      },
    ],
  },
  BoxBOD: growth,
  Chwirut1: expOverLine,
  Chwirut2: expOverLine,
  DanWood: {
    linear: [0],
    nonlinear: [1],
    terms: [
      (x, theta, slopes) => {
        const value = x ** theta[0]!;
        slopes[0] = value * Math.log(x);
        return value;
      },
    ],
  },
  ENSO: {
    linear: [0, 1, 2, 4, 5, 7, 8],
    nonlinear: [3, 6],
    terms: [one, season("cos"), season("sin"), wave(0, "cos"), wave(0, "sin"), wave(1, "cos"), wave(1, "sin")],
  },
  Eckerle4: {
    // a negative width and a negative area give the same peak
    twin: { order: [0, 1, 2], sign: [-1, -1, 1] },
    linear: [0],
    nonlinear: [1, 2],
    terms: [
      (x, theta, slopes) => {
        const z = (x - theta[1]!) / theta[0]!;
        const value = Math.exp((-z * z) / 2) / theta[0]!;
        slopes[0] = (value * (z * z - 1)) / theta[0]!;
        slopes[1] = (value * z) / theta[0]!;
        return value;
      },
    ],
  },
  Gauss2: twoPeaks,
  Gauss3: twoPeaks,
  Hahn1: cubicOverCubic,
  Lanczos3: { linear: [0, 2, 4], nonlinear: [1, 3, 5], terms: [decay(0), decay(1), decay(2)] },
  MGH09: {
    linear: [0],
    nonlinear: [1, 2, 3],
    terms: [
      (x, theta, slopes) => {
        const above = x * x + theta[0]! * x;
        const below = x * x + theta[1]! * x + theta[2]!;
        slopes[0] = x / below;
        slopes[1] = (-above * x) / (below * below);
        slopes[2] = -above / (below * below);
        return above / below;
      },
    ],
  },
  MGH10: {
    linear: [0],
    nonlinear: [1, 2],
    terms: [
      (x, theta, slopes) => {
        const sum = x + theta[1]!;
        const value = Math.exp(theta[0]! / sum);
        slopes[0] = value / sum;
        slopes[1] = (-value * theta[0]!) / (sum * sum);
        return value;
      },
    ],
  },
  MGH17: {
    // the two exponentials can change places
    twin: { order: [0, 2, 1, 4, 3], sign: [1, 1, 1, 1, 1] },
    linear: [0, 1, 2],
    nonlinear: [3, 4],
    terms: [one, decay(0), decay(1)],
  },
  Misra1a: growth,
  Misra1b: {
    linear: [0],
    nonlinear: [1],
    terms: [
      (x, theta, slopes) => {
        const u = 1 + (theta[0]! * x) / 2;
        slopes[0] = x / (u * u * u);
        return 1 - 1 / (u * u);
      },
    ],
  },
  Rat43: {
    linear: [0],
    nonlinear: [1, 2, 3],
    terms: [
      (x, theta, slopes) => {
        const e = Math.exp(theta[0]! - theta[1]! * x);
        const b = theta[2]!;
        const value = (1 + e) ** (-1 / b);
        slopes[0] = (-value * e) / (b * (1 + e));
        slopes[1] = (value * e * x) / (b * (1 + e));
        slopes[2] = (value * Math.log1p(e)) / (b * b);
        return value;
      },
    ],
  },
  Thurber: cubicOverCubic,
};

const unbounded = { low: Number.NEGATIVE_INFINITY, high: Number.POSITIVE_INFINITY };

/** The model with its linear parameters eliminated; the nonlinear ones start from the given grids. */
export function separable(
  model: NistModel,
  x: readonly number[],
  grids: readonly (readonly number[])[],
): SeparableModel {
  return {
    linear: model.linear.map((index) => ({ name: `b${index + 1}`, fixed: index < 0 ? 1 : null, ...unbounded })),
    nonlinear: model.nonlinear.map((index, m) => ({ name: `b${index + 1}`, grid: grids[m]!, ...unbounded })),
    evaluate(theta, basis, derivative) {
      const slopes = new Float64Array(theta.length);
      for (let j = 0; j < model.terms.length; j++) {
        for (let i = 0; i < x.length; i++) {
          slopes.fill(0);
          basis[j]![i] = model.terms[j]!(x[i]!, theta, slopes);
          if (derivative !== null) for (let m = 0; m < slopes.length; m++) derivative[m]![j]![i] = slopes[m]!;
        }
      }
    },
  };
}

/** The same model with every parameter treated as nonlinear, in the order of the certified values. */
export function allNonlinear(model: NistModel, x: readonly number[], start: readonly number[]): SeparableModel {
  const order = [...model.linear.filter((index) => index >= 0), ...model.nonlinear];
  return {
    linear: [{ name: "fit", fixed: 1, ...unbounded }],
    nonlinear: start.map((value, index) => ({ name: `b${index + 1}`, grid: [value], ...unbounded })),
    evaluate(all, basis, derivative) {
      const theta = Float64Array.from(model.nonlinear, (index) => all[index]!);
      const slopes = new Float64Array(theta.length);
      const fit = basis[0]!;
      fit.fill(0);
      if (derivative !== null) for (const index of order) derivative[index]![0]!.fill(0);
      for (let j = 0; j < model.terms.length; j++) {
        const index = model.linear[j]!;
        const beta = index < 0 ? 1 : all[index]!;
        for (let i = 0; i < x.length; i++) {
          slopes.fill(0);
          const value = model.terms[j]!(x[i]!, theta, slopes);
          fit[i]! += beta * value;
          if (derivative === null) continue;
          if (index >= 0) derivative[index]![0]![i]! += value;
          for (let m = 0; m < slopes.length; m++) derivative[model.nonlinear[m]!]![0]![i]! += beta * slopes[m]!;
        }
      }
    },
  };
}
