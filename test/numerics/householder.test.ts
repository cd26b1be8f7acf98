import assert from "node:assert/strict";
import fc from "fast-check";
import {
  applyTransposed,
  factor,
  factorisation,
  independence,
  inverseOfSquare,
  norm,
  rank,
  scaledCondition,
  solveLowerTransposed,
  solveUpper,
} from "../../src/numerics/householder.js";

const columnsOf = (rows: readonly (readonly number[])[]) =>
  rows[0]!.map((_, j) => Float64Array.from(rows, (row) => row[j]!));

describe("Householder QR", () => {
  it("solves a small system worked by hand", () => {
    // line through (0, 1), (1, 3), (2, 4), (3, 4): normal equations 4a + 6b = 12, 6a + 14b = 23 → a = 1.5, b = 1
    const f = factorisation(
      4,
      columnsOf([
        [1, 0],
        [1, 1],
        [1, 2],
        [1, 3],
      ]),
    );
    const right = Float64Array.of(1, 3, 4, 4);
    factor(f);
    applyTransposed(f, right);
    const x = new Float64Array(2);
    solveUpper(f, right, x);
    assert.ok(Math.abs(x[0]! - 1.5) < 1e-14 && Math.abs(x[1]! - 1) < 1e-14);
    // residuals −0.5, 0.5, 0.5, −0.5: length 1
    assert.ok(Math.abs(norm(right, 2, 4) - 1) < 1e-14);
    // (AᵀA)⁻¹ = [[14, −6], [−6, 4]] / 20
    const inverse = inverseOfSquare(f)!;
    for (const [i, j, value] of [
      [0, 0, 0.7],
      [0, 1, -0.3],
      [1, 0, -0.3],
      [1, 1, 0.2],
    ] as const) {
      assert.ok(Math.abs(inverse[i]![j]! - value) < 1e-14);
    }
  });

  it("keeps lengths and inner products: RᵀR = AᵀA", () => {
    const number = fc.integer({ min: -100000, max: 100000 }).map((value) => value / 1000);
    const matrix = fc.array(fc.array(number, { minLength: 3, maxLength: 3 }), { minLength: 3, maxLength: 12 });
    fc.assert(
      fc.property(matrix, (rows) => {
        const a = columnsOf(rows);
        const f = factorisation(
          rows.length,
          a.map((column) => column.slice()),
        );
        factor(f);
        const r = (i: number, j: number) => (i < j ? f.columns[j]![i]! : i === j ? f.diagonal[i]! : 0);
        for (let i = 0; i < 3; i++) {
          for (let j = 0; j < 3; j++) {
            let exact = 0;
            for (let k = 0; k < rows.length; k++) exact += a[i]![k]! * a[j]![k]!;
            let square = 0;
            for (let k = 0; k < 3; k++) square += r(k, i) * r(k, j);
            assert.ok(Math.abs(square - exact) <= 1e-13 * norm(a[i]!, 0, rows.length) * norm(a[j]!, 0, rows.length));
          }
        }
      }),
      { seed: 11, numRuns: 200 },
    );
  });

  it("solves with R and with its transpose", () => {
    const f = factorisation(
      3,
      columnsOf([
        [2, 1, 0],
        [1, 3, 1],
        [0, 1, 4],
      ]),
    );
    factor(f);
    const x = Float64Array.of(1, -2, 3);
    const upper = new Float64Array(3);
    const lower = new Float64Array(3);
    for (let i = 0; i < 3; i++) {
      for (let j = 0; j < 3; j++) {
        const entry = i < j ? f.columns[j]![i]! : i === j ? f.diagonal[i]! : 0;
        upper[i]! += entry * x[j]!;
        lower[j]! += entry * x[i]!;
      }
    }
    solveUpper(f, upper, upper);
    solveLowerTransposed(f, lower, lower);
    for (let i = 0; i < 3; i++) {
      assert.ok(Math.abs(upper[i]! - x[i]!) < 1e-14);
      assert.ok(Math.abs(lower[i]! - x[i]!) < 1e-14);
    }
  });

  it("sees a column that is a combination of the others", () => {
    const f = factorisation(
      4,
      columnsOf([
        [1, 2, 5],
        [1, -1, -1],
        [1, 4, 9],
        [1, 0.5, 2],
      ]),
    );
    factor(f);
    assert.equal(rank(f), 2);
    assert.ok(independence(f, 2) < 1e-15);
    assert.equal(scaledCondition(f), null);
  });

  it("gives the condition of two columns at an angle: √((1 + cos) / (1 − cos))", () => {
    for (const cos of [0, 0.5, 0.999999]) {
      const f = factorisation(2, [Float64Array.of(3, 0), Float64Array.of(1e6 * cos, 1e6 * Math.sqrt(1 - cos * cos))]);
      factor(f);
      const expected = Math.sqrt((1 + cos) / (1 - cos));
      assert.ok(Math.abs(scaledCondition(f)! / expected - 1) < 1e-9);
    }
  });

  it("takes norms outside the range of squares", () => {
    assert.ok(Math.abs(norm(Float64Array.of(3e-200, 4e-200), 0, 2) / 5e-200 - 1) < 1e-15);
    assert.ok(Math.abs(norm(Float64Array.of(3e200, 4e200), 0, 2) / 5e200 - 1) < 1e-15);
    assert.equal(norm(new Float64Array(3), 0, 3), 0);
  });
});
