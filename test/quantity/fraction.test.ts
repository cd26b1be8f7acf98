import assert from "node:assert/strict";
import fc from "fast-check";
import { decimal, fraction, toNumber, toNumberRaised } from "../../src/quantity/fraction.js";

describe("exact fractions", () => {
  it("round once, as the engine reads decimals", () => {
    fc.assert(
      fc.property(fc.integer({ min: -1e9, max: 1e9 }), fc.integer({ min: -300, max: 290 }), (digits, power) => {
        assert.equal(toNumber(decimal(`${digits}e${power}`)), Number(`${digits}e${power}`) + 0);
      }),
      { seed: 7, numRuns: 3000 },
    );
  });

  it("divide as the engine divides", () => {
    const whole = fc.integer({ min: 1, max: Number.MAX_SAFE_INTEGER });
    fc.assert(
      fc.property(whole, whole, (a, b) => {
        assert.equal(toNumber(fraction(BigInt(a), BigInt(b))), a / b);
      }),
      { seed: 8, numRuns: 3000 },
    );
  });

  it("take square roots as the engine does (IEEE 754: correctly rounded)", () => {
    fc.assert(
      fc.property(fc.integer({ min: 1, max: Number.MAX_SAFE_INTEGER }), (a) => {
        assert.ok(Math.abs(toNumberRaised(fraction(BigInt(a)), 1, 2) / Math.sqrt(a) - 1) < 2.3e-16);
      }),
      { seed: 9, numRuns: 500 },
    );
  });
});
