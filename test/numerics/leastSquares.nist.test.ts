import assert from "node:assert/strict";
import { fitLeastSquares, type LeastSquaresFit, type SeparableModel } from "../../src/numerics/leastSquares.js";
import { digits } from "./firstOrder.js";
import nistLinear from "./nistLinear.json" with { type: "json" };
import { allNonlinear, type NistModel, nistModels, separable } from "./nistModels.js";
import nistStrd from "./nistStrd.json" with { type: "json" };

/** Fewest digits in which parameters and standard deviations agree with the certified ones. */
function agreement(
  fit: LeastSquaresFit,
  certified: { values: number[]; standardDeviations: number[] },
  position: readonly number[],
): [values: number, deviations: number] {
  const scale = Math.sqrt(fit.chiSquare / fit.degreesOfFreedom);
  let [values, deviations] = [16, 16];
  for (let i = 0; i < certified.values.length; i++) {
    const index = position[i]!;
    const place = fit.free.indexOf(index);
    assert.ok(place >= 0 && fit.covariance !== null);
    values = Math.min(values, digits(fit.values[index]!, certified.values[i]!));
    deviations = Math.min(
      deviations,
      digits(scale * Math.sqrt(fit.covariance[place]![place]!), certified.standardDeviations[i]!),
    );
  }
  return [values, deviations];
}

function check(model: NistModel, set: (typeof nistStrd.sets)[number], form: SeparableModel, position: number[]): void {
  const fit = fitLeastSquares(Float64Array.from(set.y), null, form);
  assert.equal(fit.stop, "converged");
  // the certificate of Rat43 prints 9; its residual standard deviation is that of 15 − 4
  assert.equal(fit.degreesOfFreedom, set.name === "Rat43" ? 11 : set.degreesOfFreedom);
  assert.ok(digits(fit.chiSquare, set.residualSumOfSquares) >= 10);
  let [values, deviations] = agreement(fit, set, position);
  if (values < 8 && model.twin !== undefined) {
    const { order, sign } = model.twin;
    const twin = {
      values: order.map((from, i) => sign[i]! * set.values[from]!),
      standardDeviations: order.map((from) => set.standardDeviations[from]!),
    };
    [values, deviations] = agreement(fit, twin, position);
  }
  // the certified figures carry 11 digits
  assert.ok(values >= 9, `parameters agree to ${values.toFixed(1)} digits`);
  assert.ok(deviations >= 9, `standard deviations agree to ${deviations.toFixed(1)} digits`);
}

describe("least squares: NIST StRD, nonlinear", () => {
  for (const set of nistStrd.sets) {
    // set.source names the origin of each set; nistStrd.json
    for (const [name, start] of [
      ["start 1", set.start1],
      ["start 2", set.start2],
    ] as const) {
      it(`${set.name} from ${name}, linear parameters eliminated`, () => {
        const model = nistModels[set.name]!;
        const order = [...model.linear, ...model.nonlinear];
        const position = set.values.map((_, i) => order.indexOf(i));
        check(
          model,
          set,
          separable(
            model,
            set.x,
            model.nonlinear.map((i) => [start[i]!]),
          ),
          position,
        );
      });
      it(`${set.name} from ${name}, every parameter nonlinear`, () => {
        const model = nistModels[set.name]!;
        check(
          model,
          set,
          allNonlinear(model, set.x, start),
          set.values.map((_, i) => i + 1),
        );
      });
    }
  }
});

describe("least squares: NIST StRD, linear", () => {
  for (const set of nistLinear.sets) {
    it(set.name, () => {
      const columns = linearBasis(set.formula, set.x, set.values.length);
      const fit = fitLeastSquares(Float64Array.from(set.y), null, {
        linear: columns.map((_, j) => ({ name: `b${j}`, fixed: null, low: -Infinity, high: Infinity })),
        nonlinear: [],
        evaluate(_theta, basis) {
          for (let j = 0; j < columns.length; j++) basis[j]!.set(columns[j]!);
        },
      });
      assert.equal(fit.stop, "converged");
      const exact = set.residualSumOfSquares === 0;
      for (let j = 0; j < columns.length; j++) {
        // certified to 15 digits; the quintic of Wampler1 is the worst conditioned
        const least = exact ? 9 : 10;
        assert.ok(digits(fit.values[j]!, set.values[j]!) >= least, `b${j}: ${fit.values[j]}`);
        const deviation = Math.sqrt((fit.chiSquare / fit.degreesOfFreedom) * fit.covariance![j]![j]!);
        if (exact) assert.ok(deviation < 1e-8);
        else assert.ok(digits(deviation, set.standardDeviations[j]!) >= 10);
      }
    });
  }
});

/** Columns of y = b0 + b1 x …, y = b1 x, y = b0 + b1 x1 + b2 x2 … by the shape of the set. */
function linearBasis(formula: string, x: readonly (readonly number[])[], count: number): number[][] {
  if (formula === "y = b1 x") return [x[0]!.slice()];
  if (x.length > 1) return [x[0]!.map(() => 1), ...x.map((column) => column.slice())];
  return Array.from({ length: count }, (_, power) => x[0]!.map((value) => value ** power));
}
