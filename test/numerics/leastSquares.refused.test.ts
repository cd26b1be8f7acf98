import assert from "node:assert/strict";
import {
  fitLeastSquares,
  type LeastSquaresFit,
  profileInterval,
  sensitivity,
} from "../../src/numerics/leastSquares.js";
import { seededRandom } from "../../src/numerics/random.js";
import { firstOrder, free } from "./firstOrder.js";

const times = Float64Array.from({ length: 12 }, (_, i) => 10 * i);

/** Fails where a number in the result is NaN or infinite. */
function assertFinite(fit: LeastSquaresFit): void {
  const numbers = [...fit.values, ...fit.residuals, ...fit.fitted, fit.chiSquare, fit.offset, fit.degreesOfFreedom];
  numbers.push(fit.condition ?? 0, ...(fit.covariance ?? []).flat());
  for (const column of fit.jacobian) numbers.push(...column);
  for (const value of numbers) assert.ok(Number.isFinite(value));
}

function refused(fit: LeastSquaresFit, stop: LeastSquaresFit["stop"]): void {
  assert.equal(fit.stop, stop);
  assertFinite(fit);
}

describe("least squares: what cannot be fitted is said", () => {
  it("constant data: k is not determined", () => {
    for (const level of [0, 3.3, -1e-9, 1e12]) {
      const fit = fitLeastSquares(new Float64Array(12).fill(level), null, firstOrder(times));
      refused(fit, "singular");
      assert.equal(fit.covariance, null);
      const shift = sensitivity(fit, null, new Float64Array(12).fill(1));
      assert.deepEqual(shift, []);
      const none = profileInterval(fit.residuals, null, firstOrder(times), fit, 2, { tSquared: 4, scale: "scaled" });
      assert.deepEqual(none, { low: null, high: null, lowerMinimum: false });
    }
  });

  it("fewer observations than parameters, none, one", () => {
    for (const n of [0, 1, 2]) {
      const fit = fitLeastSquares(
        Float64Array.from({ length: n }, (_, i) => 5 - i),
        null,
        firstOrder(times.slice(0, n)),
      );
      refused(fit, "singular");
    }
  });

  it("a straight line with free infinity: k at its lower bound", () => {
    const line = times.map((t) => 4 - 0.01 * t);
    const fit = fitLeastSquares(line, null, firstOrder(times, { low: 1e-9 }));
    assert.notEqual(fit.stop, "converged");
    assertFinite(fit);
  });

  it("a jump after the first point: k without upper limit is not determined", () => {
    const jump = times.map((t) => (t === 0 ? 1 : 3));
    const fit = fitLeastSquares(jump, null, firstOrder(times));
    refused(fit, "singular");
    const limited = fitLeastSquares(jump, null, firstOrder(times, { high: 0.5 }));
    refused(limited, "bound");
    assert.equal(limited.bound[2], "high");
    assert.deepEqual(limited.free, [0, 1]);
  });

  it("two parameters that do the same", () => {
    const fit = fitLeastSquares(
      times.map((t) => 1 + t),
      null,
      {
        linear: [
          { name: "a", ...free },
          { name: "b", ...free },
        ],
        nonlinear: [],
        evaluate(_theta, basis) {
          basis[0]!.fill(1);
          basis[1]!.fill(2);
        },
      },
    );
    refused(fit, "singular");
  });

  it("a model that is finite nowhere", () => {
    const fit = fitLeastSquares(times, null, {
      linear: [{ name: "a", ...free }],
      nonlinear: [{ name: "b", low: 1, high: 9, grid: [2, 3] }],
      evaluate(_theta, basis, derivative) {
        basis[0]!.fill(Number.NaN);
        if (derivative !== null) derivative[0]![0]!.fill(Number.NaN);
      },
    });
    refused(fit, "singular");
  });

  it("too few iterations allowed", () => {
    const y = times.map((t, i) => 5 * Math.exp(-t / 30) + 0.1 * Math.cos(7 * i));
    refused(fitLeastSquares(y, null, firstOrder(times), { maximumIterations: 1 }), "limit");
    assert.equal(fitLeastSquares(y, null, firstOrder(times)).stop, "converged");
  });

  it("stops when asked", () => {
    const y = times.map((t, i) => 5 * Math.exp(-t / 30) + 0.1 * Math.cos(7 * i));
    let asked = 0;
    refused(fitLeastSquares(y, null, firstOrder(times), { stopped: () => ++asked > 2 }), "stopped");
    assert.equal(asked, 3);
  });

  it("leaves out observations that are not finite or carry no weight", () => {
    const random = seededRandom(2);
    const y = times.map((t) => 1 + 4 * Math.exp(-t / 30) + 0.05 * random.normal());
    const kept = [0, 1, 3, 4, 5, 7, 8, 9, 10];
    const clean = fitLeastSquares(
      Float64Array.from(kept, (i) => y[i]!),
      null,
      firstOrder(kept.map((i) => times[i]!)),
    );
    const dirty = y.slice();
    dirty[2] = Number.NaN;
    dirty[6] = Number.POSITIVE_INFINITY;
    const weights = new Float64Array(12).fill(1);
    weights[11] = 0;
    weights[2] = Number.NaN;
    const fit = fitLeastSquares(dirty, weights, firstOrder(times));
    assertFinite(fit);
    assert.equal(fit.degreesOfFreedom, clean.degreesOfFreedom);
    for (let i = 0; i < 3; i++) assert.ok(Math.abs(fit.values[i]! / clean.values[i]! - 1) < 1e-9);
    assert.equal(fit.residuals[2], 0);
  });
});

describe("least squares: bounds on linear parameters", () => {
  const y = times.map((t, i) => 4 * Math.exp(-t / 30) - 0.3 + 0.02 * Math.sin(5 * i));

  it("puts infinity on its bound and fits the rest as if it were fixed there", () => {
    const bounded = fitLeastSquares(y, null, firstOrder(times, { infinity: { fixed: null, low: 0, high: 10 } }));
    const fixed = fitLeastSquares(y, null, firstOrder(times, { infinity: { ...free, fixed: 0 } }));
    assert.equal(bounded.stop, "converged");
    assert.deepEqual(bounded.bound, [null, "low", null]);
    assert.deepEqual(bounded.free, [0, 2]);
    for (const i of [0, 1, 2]) assert.ok(Math.abs(bounded.values[i]! - fixed.values[i]!) < 1e-9);
    assert.ok(Math.abs(bounded.covariance![1]![1]! / fixed.covariance![1]![1]! - 1) < 1e-8);
  });

  it("leaves a fit alone whose minimum lies between the bounds", () => {
    const bounded = fitLeastSquares(y, null, firstOrder(times, { infinity: { fixed: null, low: -1, high: 1 } }));
    const open = fitLeastSquares(y, null, firstOrder(times));
    assert.deepEqual(bounded.bound, [null, null, null]);
    assert.deepEqual(bounded.values, open.values);
  });

  it("finds the constrained minimum with two parameters on bounds", () => {
    const model = firstOrder(times, {
      start: { fixed: null, low: 0, high: 3 },
      infinity: { fixed: null, low: 0.5, high: 10 },
    });
    const fit = fitLeastSquares(y, null, model);
    assert.deepEqual(fit.bound.slice(0, 2), ["high", "low"]);
    assert.deepEqual(fit.values.slice(0, 2), [3, 0.5]);
    // any k nearby is worse
    for (const factor of [0.999, 1.001]) {
      const k = fit.values[2]! * factor;
      const other = fitLeastSquares(y, null, { ...model, nonlinear: [{ name: "k", low: k, high: k, grid: [k] }] });
      assert.ok(other.chiSquare > fit.chiSquare);
    }
  });

  it("gives the one end of the profile away from a bound", () => {
    const model = firstOrder(times, { infinity: { fixed: null, low: 0, high: 10 } });
    const fit = fitLeastSquares(y, null, model);
    const ends = profileInterval(y, null, model, fit, 1, { tSquared: 4, scale: "scaled" });
    assert.equal(ends.low, null);
    assert.ok(ends.high !== null && ends.high > 0);
    const at = fitLeastSquares(y, null, firstOrder(times, { infinity: { ...free, fixed: ends.high } }));
    const rise = (at.chiSquare - fit.chiSquare) / (fit.chiSquare / fit.degreesOfFreedom);
    assert.ok(Math.abs(rise / 4 - 1) < 1e-7);
  });
});
