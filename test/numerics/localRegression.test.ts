import assert from "node:assert/strict";
import { chooseBandwidth } from "../../src/numerics/bandwidthChoice.js";
import { type LocalOptions, localSlope } from "../../src/numerics/localRegression.js";
import { seededRandom } from "../../src/numerics/random.js";

/**
 * A. Savitzky and M. J. E. Golay, Anal. Chem. 36 (1964) 1627–1639, corrected by J. Steinier, Y. Termonia and J. Deltour,
 * Anal. Chem. 44 (1972) 1906–1909: convolution integers, divisor, noise factor √Σc² (recomputed in exact rational
 * arithmetic; those of the quadratic equal to the published integers from memory).
 */
const published: readonly {
  quantity: "value" | "slope";
  degree: 2 | 3;
  coefficients: readonly number[];
  divisor: number;
  noise: number;
}[] = [
  { quantity: "value", degree: 2, coefficients: [-3, 12, 17, 12, -3], divisor: 35, noise: 0.696932052437 },
  { quantity: "slope", degree: 2, coefficients: [-2, -1, 0, 1, 2], divisor: 10, noise: 0.316227766017 },
  { quantity: "slope", degree: 3, coefficients: [1, -8, 0, 8, -1], divisor: 12, noise: 0.950146187583 },
  { quantity: "value", degree: 2, coefficients: [-2, 3, 6, 7, 6, 3, -2], divisor: 21, noise: 0.57735026919 },
  { quantity: "slope", degree: 2, coefficients: [-3, -2, -1, 0, 1, 2, 3], divisor: 28, noise: 0.188982236505 },
  { quantity: "slope", degree: 3, coefficients: [22, -67, -58, 0, 58, 67, -22], divisor: 252, noise: 0.512412077889 },
  {
    quantity: "value",
    degree: 2,
    coefficients: [-21, 14, 39, 54, 59, 54, 39, 14, -21],
    divisor: 231,
    noise: 0.505382286404,
  },
  { quantity: "slope", degree: 2, coefficients: [-4, -3, -2, -1, 0, 1, 2, 3, 4], divisor: 60, noise: 0.129099444874 },
  {
    quantity: "slope",
    degree: 3,
    coefficients: [86, -142, -193, -126, 0, 126, 193, 142, -86],
    divisor: 1188,
    noise: 0.33813876245,
  },
  {
    quantity: "value",
    degree: 2,
    coefficients: [-36, 9, 44, 69, 84, 89, 84, 69, 44, 9, -36],
    divisor: 429,
    noise: 0.455476901126,
  },
  {
    quantity: "slope",
    degree: 2,
    coefficients: [-5, -4, -3, -2, -1, 0, 1, 2, 3, 4, 5],
    divisor: 110,
    noise: 0.0953462589246,
  },
  {
    quantity: "slope",
    degree: 3,
    coefficients: [300, -294, -532, -503, -296, 0, 296, 503, 532, 294, -300],
    divisor: 5148,
    noise: 0.24572227286,
  },
];

const ramp = (n: number, spacing: number, start: number) =>
  Float64Array.from({ length: n }, (_, i) => start + i * spacing);
const equal = (neighbours: number, degree: 1 | 2 | 3 = 2): LocalOptions => ({
  bandwidth: { neighbours },
  degree,
  kernel: "equal",
});

describe("local regression", () => {
  for (const { quantity, degree, coefficients, divisor, noise } of published) {
    const window = coefficients.length;
    it(`equals the Savitzky–Golay ${quantity} of window ${window}, degree ${degree}, to 12 digits`, () => {
      for (const spacing of [1, 0.25, 30]) {
        const x = ramp(window + 6, spacing, 2);
        const random = seededRandom(window);
        const y = x.map(() => 10 + random.normal());
        const middle = (window - 1) / 2 + 3;
        const fit = localSlope(x, y, x[middle]!, equal(window, degree))!;
        const scale = quantity === "slope" ? spacing : 1;
        const ours = quantity === "slope" ? fit.slopeCoefficients : fit.valueCoefficients;
        assert.equal(fit.from, 3);
        assert.equal(fit.used, window);
        let filtered = 0;
        for (let i = 0; i < window; i++) {
          const exact = coefficients[i]! / divisor / scale;
          assert.ok(Math.abs(ours[i]! - exact) <= (1e-12 * noise) / scale, `coefficient ${i}`);
          filtered += exact * y[3 + i]!;
        }
        const result = quantity === "slope" ? fit.slope : fit.value;
        assert.ok(Math.abs(result - filtered) <= 1e-12 * Math.max(Math.abs(filtered), 10 / scale));
        const ourNoise = quantity === "slope" ? fit.slopeNoise : fit.valueNoise;
        assert.ok(Math.abs((ourNoise * scale) / noise - 1) < 1e-11);
      }
    });
  }

  it("is exact for a polynomial of its own degree, unevenly spaced, anywhere", () => {
    const x = Float64Array.of(0, 0.4, 1, 1.1, 2.3, 3, 3.2, 4.7, 5, 6.1);
    const y = x.map((t) => 3 - 2 * t + 0.5 * t * t);
    for (const x0 of [-0.5, 0, 1.05, 3, 6.1, 6.5]) {
      for (const kernel of ["tricube", "equal"] as const) {
        const fit = localSlope(x, y, x0, { bandwidth: { neighbours: 7 }, kernel })!;
        assert.ok(Math.abs(fit.value - (3 - 2 * x0 + 0.5 * x0 * x0)) < 1e-11);
        assert.ok(Math.abs(fit.slope - (-2 + x0)) < 1e-11);
      }
    }
  });

  it("propagates noise as its noise factor says", () => {
    const random = seededRandom(12);
    const x = ramp(41, 0.5, 0);
    const options: LocalOptions = { bandwidth: { halfWidth: 4 }, degree: 2 };
    let square = 0;
    const repeats = 2000;
    let expected = 0;
    for (let k = 0; k < repeats; k++) {
      const fit = localSlope(
        x,
        x.map(() => random.normal()),
        9.7,
        options,
      )!;
      square += fit.slope * fit.slope;
      expected = fit.slopeNoise;
    }
    // standard deviation of a standard deviation: 1/√(2·2000) = 1.6 %; five of them
    assert.ok(Math.abs(Math.sqrt(square / repeats) / expected - 1) < 0.08);
  });

  it("takes equal x and refuses too few different ones", () => {
    const x = Float64Array.of(0, 0, 1, 1, 2, 2);
    const y = Float64Array.of(0.9, 1.1, 1.9, 2.1, 2.9, 3.1);
    const fit = localSlope(x, y, 1, { bandwidth: { halfWidth: 1 }, degree: 2, kernel: "equal" })!;
    assert.ok(Math.abs(fit.slope - 1) < 1e-12);
    assert.ok(Math.abs(fit.value - 2) < 1e-12);
    assert.equal(localSlope(x, y, 1, { bandwidth: { halfWidth: 0.5 }, degree: 1, kernel: "equal" }), null);
    assert.equal(localSlope(x, y, 1, { bandwidth: { neighbours: 2 }, degree: 1 }), null);
    assert.equal(localSlope(x, y, 1, { bandwidth: { halfWidth: 0 } }), null);
    assert.equal(localSlope(new Float64Array(0), new Float64Array(0), 1, { bandwidth: { neighbours: 3 } }), null);
    assert.equal(localSlope(x, y, Number.NaN, { bandwidth: { neighbours: 6 } }), null);
    assert.equal(
      localSlope(
        x,
        x.map(() => Number.NaN),
        1,
        { bandwidth: { neighbours: 6 } },
      ),
      null,
    );
  });
});

describe("bandwidth by block cross-validation", () => {
  /** errors with correlation ρ from one to the next, standard deviation `u` */
  const errors = (n: number, rho: number, u: number, seed: number) => {
    const random = seededRandom(seed);
    let e = random.normal();
    return Float64Array.from({ length: n }, () => {
      const now = u * e;
      e = rho * e + Math.sqrt(1 - rho * rho) * random.normal();
      return now;
    });
  };

  it("looks farther where the curve bends less", () => {
    const x = ramp(120, 1, 0);
    const noise = errors(120, 0, 0.05, 31);
    const bent = chooseBandwidth(
      x,
      x.map((t, i) => Math.sin(t / 6) + noise[i]!),
    )!;
    const straight = chooseBandwidth(
      x,
      x.map((t, i) => 0.01 * t + noise[i]!),
    )!;
    assert.ok(straight.neighbours > 2 * bent.neighbours, `${straight.neighbours} ${bent.neighbours}`);
    assert.ok(bent.score > 0.05 ** 2 * 0.5 && bent.score < 0.05 ** 2 * 2.5);
  });

  it("does not follow autocorrelated errors, where leaving out single points does", () => {
    const x = ramp(200, 1, 0);
    let block = 0;
    let single = 0;
    for (let seed = 40; seed < 46; seed++) {
      const noise = errors(200, 0.8, 0.05, seed);
      const y = x.map((t, i) => Math.exp(-t / 80) + noise[i]!);
      block += chooseBandwidth(x, y, { blockHalfLength: 6 })!.neighbours / 6;
      single += chooseBandwidth(x, y, { blockHalfLength: 0 })!.neighbours / 6;
    }
    assert.ok(block > 2 * single, `${block} ${single}`);
  });

  it("refuses too few observations and stops when asked", () => {
    assert.equal(chooseBandwidth(ramp(3, 1, 0), ramp(3, 1, 0)), null);
    assert.equal(chooseBandwidth(new Float64Array(8).fill(2), ramp(8, 1, 0)), null);
    assert.equal(chooseBandwidth(ramp(50, 1, 0), ramp(50, 1, 0), { stopped: () => true }), null);
    assert.notEqual(chooseBandwidth(ramp(8, 1, 0), ramp(8, 1, 0)), null);
  });
});
