import assert from "node:assert/strict";
import fc from "fast-check";
import { tQuantile } from "../../src/numerics/distributions.js";
import { fitLeastSquares, profileInterval, sensitivities, sensitivity } from "../../src/numerics/leastSquares.js";
import { seededRandom } from "../../src/numerics/random.js";
import { firstOrder, free } from "./firstOrder.js";

const times = (n: number, longest: number) => Float64Array.from({ length: n }, (_, i) => (longest * i) / (n - 1));

function noisyDecay(t: Float64Array, k: number, u: number, seed: number): Float64Array {
  const random = seededRandom(seed);
  return t.map((time) => 0.4 + 2 * Math.exp(-k * time) + u * random.normal());
}

describe("least squares: properties", () => {
  it("holds the true k inside its own 95 % interval 95 % of the time", () => {
    const repeats = 400;
    const t = times(20, 60);
    const quantile = tQuantile(0.975, 17)!;
    let wald = 0;
    let profile = 0;
    for (let seed = 0; seed < repeats; seed++) {
      const y = noisyDecay(t, 0.05, 0.03, 1000 + seed);
      const model = firstOrder(t);
      const fit = fitLeastSquares(y, null, model);
      assert.equal(fit.stop, "converged");
      const u = Math.sqrt((fit.covariance![2]![2]! * fit.chiSquare) / fit.degreesOfFreedom);
      if (Math.abs(fit.values[2]! - 0.05) <= quantile * u) wald++;
      const ends = profileInterval(y, null, model, fit, 2, { tSquared: quantile * quantile, scale: "scaled" });
      assert.ok(!ends.lowerMinimum);
      if ((ends.low ?? 0) <= 0.05 && 0.05 <= (ends.high ?? Number.POSITIVE_INFINITY)) profile++;
    }
    // binomial, 400 draws at 0.95: mean 380, standard deviation 4.36; three of them
    assert.ok(wald >= 367 && wald <= 393, `Wald interval: ${wald} of ${repeats}`);
    assert.ok(profile >= 367 && profile <= 393, `profile interval: ${profile} of ${repeats}`);
  });

  it("never calls converged what a dense scan of k beats", () => {
    const random = seededRandom(82);
    let converged = 0;
    for (let repeat = 0; repeat < 120; repeat++) {
      const n = 4 + random.integer(30);
      const t = times(n, n - 1);
      const u = Math.exp(-8 + 8 * random.uniform());
      const k = Math.exp(-4 + 8 * random.uniform()) / (n - 1);
      const [a, b] = [5 * random.normal(), 5 * random.normal()];
      const y = t.map((time) => a + (b - a) * (1 - Math.exp(-k * time)) + u * random.normal());
      const weights = repeat % 3 === 0 ? t.map(() => Math.exp(random.normal())) : null;
      const start = { fixed: repeat % 2 === 0 ? null : a, low: -Infinity, high: Infinity };
      const model = firstOrder(t, { start, low: 1e-9, high: 100 });
      const fit = fitLeastSquares(y, weights, model);
      assert.notEqual(fit.stop, "limit");
      if (fit.stop === "singular") continue;
      converged++;
      assert.ok(fit.offset < 1e-5);
      for (let i = 0; i < 200; i++) {
        const fixed = 1e-6 * 10 ** (i / 25);
        const scan = fitLeastSquares(y, weights, firstOrder(t, { start, low: fixed, high: fixed }));
        assert.ok(scan.chiSquare >= fit.chiSquare * (1 - 1e-6), `repeat ${repeat}: better at k = ${fixed}`);
      }
    }
    assert.ok(converged > 100);
  });

  it("follows the units of signal and time", () => {
    const scale = fc.integer({ min: -12, max: 12 }).map((power) => 10 ** power);
    fc.assert(
      fc.property(fc.integer({ min: 0, max: 1000 }), scale, scale, (seed, c, s) => {
        const t = times(15, 50);
        const y = noisyDecay(t, 0.07, 0.05, seed);
        const plain = fitLeastSquares(y, null, firstOrder(t));
        const scaled = fitLeastSquares(
          y.map((value) => c * value),
          null,
          firstOrder(t.map((time) => s * time)),
        );
        assert.equal(scaled.stop, plain.stop);
        const expected = [c, c, 1 / s];
        for (let i = 0; i < 3; i++) {
          assert.ok(Math.abs(scaled.values[i]! / (plain.values[i]! * expected[i]!) - 1) < 1e-8);
          const ratio = scaled.covariance![i]![i]! / plain.covariance![i]![i]!;
          // the covariance is not scaled by the residual variance
          const unit = expected[i]! / c;
          assert.ok(Math.abs(ratio / (unit * unit) - 1) < 1e-7);
        }
      }),
      { seed: 5, numRuns: 60 },
    );
  });

  it("is not moved by a common factor of the weights, and equals repeated observations", () => {
    const t = times(15, 50);
    const y = noisyDecay(t, 0.07, 0.05, 77);
    const weights = y.map((_, i) => 1 + (i % 3));
    const fit = fitLeastSquares(y, weights, firstOrder(t));
    const tripled = fitLeastSquares(
      y,
      weights.map((w) => 3 * w),
      firstOrder(t),
    );
    const index = Array.from(y).flatMap((_, i) => new Array<number>(1 + (i % 3)).fill(i));
    const repeated = fitLeastSquares(
      Float64Array.from(index, (i) => y[i]!),
      null,
      firstOrder(index.map((i) => t[i]!)),
    );
    for (let i = 0; i < 3; i++) {
      assert.ok(Math.abs(tripled.values[i]! / fit.values[i]! - 1) < 1e-10);
      assert.ok(Math.abs(repeated.values[i]! / fit.values[i]! - 1) < 1e-10);
      assert.ok(Math.abs(repeated.covariance![i]![i]! / fit.covariance![i]![i]! - 1) < 1e-9);
      assert.ok(Math.abs((3 * tripled.covariance![i]![i]!) / fit.covariance![i]![i]! - 1) < 1e-9);
    }
  });

  it("finds the same fit whether or not the start was searched on a thinned sample", () => {
    const t = times(3000, 100);
    const y = noisyDecay(t, 0.05, 0.1, 78);
    const model = firstOrder(t);
    const whole = { linear: model.linear, nonlinear: model.nonlinear, evaluate: model.evaluate };
    const thinned = fitLeastSquares(y, null, model);
    const full = fitLeastSquares(y, null, whole);
    for (let i = 0; i < 3; i++) assert.ok(Math.abs(thinned.values[i]! / full.values[i]! - 1) < 1e-11);
  });

  it("reports residuals, fit and Jacobian that belong together", () => {
    const t = times(15, 50);
    const y = noisyDecay(t, 0.07, 0.05, 79);
    const model = firstOrder(t);
    const fit = fitLeastSquares(y, null, model);
    let sum = 0;
    for (let i = 0; i < t.length; i++) {
      sum += fit.residuals[i]! ** 2;
      assert.ok(Math.abs(fit.residuals[i]! + fit.fitted[i]! - y[i]!) < 1e-14);
      const [start, infinity, k] = fit.values as [number, number, number];
      const e = Math.exp(-k * t[i]!);
      assert.ok(Math.abs(fit.fitted[i]! - (start * e + infinity * (1 - e))) < 1e-13);
      assert.ok(Math.abs(fit.jacobian[2]![i]! - t[i]! * e * (infinity - start)) < 1e-11);
    }
    assert.ok(Math.abs(sum / fit.chiSquare - 1) < 1e-12);
    // normal equations: the residual is orthogonal to every column of the Jacobian
    for (const column of fit.jacobian) {
      let product = 0;
      let size = 0;
      for (let i = 0; i < t.length; i++) {
        product += column[i]! * fit.residuals[i]!;
        size += column[i]! ** 2;
      }
      assert.ok(Math.abs(product) < 1e-9 * Math.sqrt(size * sum));
    }
  });

  it("shifts as a refit of shifted observations does", () => {
    const t = times(40, 80);
    const y = noisyDecay(t, 0.05, 0.002, 80);
    const weights = y.map((_, i) => 1 + i / 40);
    const fit = fitLeastSquares(y, weights, firstOrder(t));
    const offset = y.map(() => 1e-4);
    const drift = t.map((time) => 1e-6 * time);
    const both = sensitivities(fit, weights, [offset, drift]);
    for (const [j, shift] of [offset, drift].entries()) {
      const again = fitLeastSquares(
        y.map((value, i) => value + shift[i]!),
        weights,
        firstOrder(t),
      );
      const shifted = both[j]!;
      assert.deepEqual(sensitivity(fit, weights, shift), shifted);
      const size = Math.max(...shifted.map((value, i) => Math.abs(value) / Math.sqrt(fit.covariance![i]![i]!)));
      for (let i = 0; i < 3; i++) {
        // first order in the shift and in the residuals
        const u = Math.sqrt(fit.covariance![i]![i]!);
        assert.ok(Math.abs(again.values[i]! - fit.values[i]! - shifted[i]!) < 0.01 * size * u);
      }
    }
    // a common offset moves both readings by itself and k not at all
    assert.ok(Math.abs(both[0]![0]! / 1e-4 - 1) < 1e-10 && Math.abs(both[0]![1]! / 1e-4 - 1) < 1e-10);
    assert.ok(Math.abs(both[0]![2]!) < 1e-14);
  });

  it("gives profile ends that are the Wald ends where the model is a straight line", () => {
    const t = times(9, 8);
    const random = seededRandom(81);
    const y = t.map((time) => 1 + 2 * time + random.normal());
    const line = {
      linear: [
        { name: "a", ...free },
        { name: "b", ...free },
      ],
      nonlinear: [],
      evaluate(_theta: Float64Array, basis: readonly Float64Array[]) {
        basis[0]!.fill(1);
        basis[1]!.set(t);
      },
    };
    const fit = fitLeastSquares(y, null, line);
    for (const scale of ["scaled", "absolute"] as const) {
      for (const index of [0, 1]) {
        const variance = scale === "scaled" ? fit.chiSquare / fit.degreesOfFreedom : 1;
        const half = 2.3 * Math.sqrt(variance * fit.covariance![index]![index]!);
        const ends = profileInterval(y, null, line, fit, index, { tSquared: 2.3 ** 2, scale });
        assert.ok(Math.abs((fit.values[index]! - ends.low!) / half - 1) < 1e-7);
        assert.ok(Math.abs((ends.high! - fit.values[index]!) / half - 1) < 1e-7);
      }
    }
  });
});
