import assert from "node:assert/strict";
import { fitLeastSquares, profileInterval } from "../../src/numerics/leastSquares.js";
import { digits, firstOrder, free } from "./firstOrder.js";
import nistStrd from "./nistStrd.json" with { type: "json" };

const fixedAt = (value: number) => ({ ...free, fixed: value });

function scaledErrors(fit: ReturnType<typeof fitLeastSquares>): number[] {
  assert.ok(fit.covariance !== null);
  return fit.covariance.map((row, i) => Math.sqrt((row[i]! * fit.chiSquare) / fit.degreesOfFreedom));
}

describe("least squares: first-order runs without a start value", () => {
  for (const name of ["Misra1a", "BoxBOD"]) {
    it(`${name} (NIST StRD), start fixed at 0`, () => {
      const set = nistStrd.sets.find((candidate) => candidate.name === name)!;
      const fit = fitLeastSquares(Float64Array.from(set.y), null, firstOrder(set.x, { start: fixedAt(0) }));
      assert.equal(fit.stop, "converged");
      assert.deepEqual(fit.free, [1, 2]);
      const errors = scaledErrors(fit);
      for (let i = 0; i < 2; i++) {
        assert.ok(digits(fit.values[i + 1]!, set.values[i]!) >= 10);
        assert.ok(digits(errors[i]!, set.standardDeviations[i]!) >= 10);
      }
      assert.ok(digits(fit.chiSquare, set.residualSumOfSquares) >= 10);
    });
  }

  it("BOD (R package datasets; Bates and Watts 1988, appendix A1.4; estimates by R nls and 50-digit arithmetic)", () => {
    const y = Float64Array.of(8.3, 10.3, 19, 16, 15.6, 19.8);
    const model = firstOrder([1, 2, 3, 4, 5, 7], { start: fixedAt(0) });
    const fit = fitLeastSquares(y, null, model);
    const errors = scaledErrors(fit);
    assert.ok(digits(fit.values[1]!, 19.1425752846) >= 10 && digits(fit.values[2]!, 0.531091376965) >= 10);
    assert.ok(digits(errors[0]!, 2.49591733221) >= 10 && digits(errors[1]!, 0.203082100435) >= 10);
    // t(0.975; 4) = 2.776445105; by definition S at each end of the profile is S_min (1 + t²/4)
    const tSquared = 2.776445105 ** 2;
    for (const index of [1, 2]) {
      const ends = profileInterval(y, null, model, fit, index, { tSquared, scale: "scaled" });
      for (const end of [ends.low, ends.high]) {
        if (end === null) continue;
        const fixed =
          index === 1
            ? firstOrder([1, 2, 3, 4, 5, 7], { start: fixedAt(0), infinity: fixedAt(end) })
            : firstOrder([1, 2, 3, 4, 5, 7], { start: fixedAt(0), low: end, high: end });
        const rise = fitLeastSquares(y, null, fixed).chiSquare / fit.chiSquare - 1;
        assert.ok(Math.abs(rise / (tSquared / 4) - 1) < 1e-7, `end ${end}`);
      }
      // Bates and Watts show that the 95 % interval of the asymptote closes while that of k is open above (from memory)
      assert.ok(ends.low !== null && ends.low < fit.values[index]!);
      assert.equal(ends.lowerMinimum, false);
    }
  });

  // classic-kinetics set "N2O5 gas at 318 K": NCERT Chemistry XII, after Daniels and Johnston 1921; nonlinear fit of
  // c = c0 exp(−k t), equal weights, in 50-digit arithmetic
  it("N2O5 gas at 318 K, infinity fixed at 0", () => {
    const t = [0, 400, 800, 1200, 1600, 2000, 2400, 2800, 3200, 3600];
    const c = Float64Array.of(0.0163, 0.0136, 0.0114, 0.0093, 0.0078, 0.0064, 0.0053, 0.0043, 0.0035, 0.0029);
    const fit = fitLeastSquares(c, null, firstOrder(t, { infinity: fixedAt(0) }));
    const [uStart, uK] = scaledErrors(fit);
    assert.ok(digits(fit.values[2]!, 0.000472804940488) >= 10 && digits(uK!, 3.91664299992e-6) >= 10);
    assert.ok(digits(fit.values[0]!, 0.0164146931788) >= 10 && digits(uStart!, 7.4066630703e-5) >= 10);
    const correlation = fit.covariance![0]![1]! / Math.sqrt(fit.covariance![0]![0]! * fit.covariance![1]![1]!);
    assert.ok(digits(correlation, 0.674361944558) >= 9);
  });

  // classic-kinetics set "hydrogen peroxide decomposition": Petrucci, General Chemistry (data from memory); as above
  it("hydrogen peroxide, infinity fixed at 0", () => {
    const t = [0, 200, 400, 600, 1200, 1800, 3000];
    const c = Float64Array.of(2.32, 2.01, 1.72, 1.49, 0.98, 0.62, 0.25);
    const fit = fitLeastSquares(c, null, firstOrder(t, { infinity: fixedAt(0) }));
    const [uStart, uK] = scaledErrors(fit);
    assert.ok(digits(fit.values[2]!, 0.000731372555547) >= 10 && digits(uK!, 6.01308777044e-6) >= 10);
    assert.ok(digits(fit.values[0]!, 2.3191355255) >= 10 && digits(uStart!, 0.0075057409451) >= 10);
  });

  // classic-kinetics set "sucrose inversion followed by polarimeter": after Pennycuick 1926 (data from memory); as above
  it("sucrose by polarimeter, everything free, a signal that changes sign", () => {
    const t = [0, 7.18, 18, 27.05, 36.8, 56.8, 101.7];
    const rotation = Float64Array.of(24.09, 21.405, 17.735, 15, 12.4, 7.8, 0.3);
    const fit = fitLeastSquares(rotation, null, firstOrder(t));
    const errors = scaledErrors(fit);
    assert.ok(digits(fit.values[2]!, 0.0107706478971) >= 9 && digits(errors[2]!, 0.00015379954324) >= 9);
    assert.ok(digits(fit.values[1]!, -11.6059863292) >= 9 && digits(errors[1]!, 0.315519436758) >= 9);
    assert.ok(digits(fit.values[0]! - fit.values[1]!, 35.6650548912) >= 9);
  });
});
