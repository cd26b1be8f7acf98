import assert from "node:assert/strict";
import { seededRandom } from "../../src/numerics/random.js";
import { project, projection, standsAt } from "../../src/numerics/variableProjection.js";
import { firstOrder } from "./firstOrder.js";

describe("variable projection", () => {
  const t = Float64Array.from({ length: 31 }, (_, i) => i);
  const random = seededRandom(90);
  const y = t.map((time) => 2 + Math.exp(-0.2 * time) + 0.05 * random.normal());
  const work = projection(y, null, firstOrder(t));

  it("gives one sum of squares with and without the Jacobian, even where the derivative underflows", () => {
    for (const k of [1e-9, 1e-3, 0.2, 3, 20, 100, 400, 1e4]) {
      const theta = Float64Array.of(k);
      const plain = project(work, theta, null);
      const full = project(work, theta, [true]);
      assert.ok(Math.abs(full / plain - 1) < 1e-12, `k = ${k}: ${full} and ${plain}`);
      assert.ok(Math.abs((work.remainder + work.projected[0]! ** 2) / plain - 1) < 1e-12);
    }
  });

  it("gives the gradient of the projected sum of squares (Kaufman's form is exact there)", () => {
    for (const k of [0.05, 0.2, 0.7]) {
      const h = 1e-5 * k;
      const rise = project(work, Float64Array.of(k + h), null) - project(work, Float64Array.of(k - h), null);
      project(work, Float64Array.of(k), [true]);
      const gradient = -2 * work.reduced[0]![0]! * work.projected[0]!;
      assert.ok(Math.abs(rise / (2 * h) / gradient - 1) < 1e-6);
    }
  });

  it("knows whether its factorisation belongs to a point", () => {
    project(work, Float64Array.of(0.3), [true]);
    assert.ok(standsAt(work, Float64Array.of(0.3), [true]));
    assert.ok(!standsAt(work, Float64Array.of(0.31), [true]));
    assert.ok(!standsAt(work, Float64Array.of(0.3), [false]));
    project(work, Float64Array.of(0.3), null);
    assert.ok(!standsAt(work, Float64Array.of(0.3), [true]));
  });
});
