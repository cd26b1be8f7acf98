import assert from "node:assert/strict";
import fc from "fast-check";
import { niceTicks } from "../../src/report/ticks.js";

describe("numbers along an axis", () => {
  it("are round and bear as many decimals as they need", () => {
    assert.deepEqual(niceTicks(0, 1, 5), {
      values: [0, 0.2, 0.4, 0.6, 0.8, 1],
      labels: ["0.0", "0.2", "0.4", "0.6", "0.8", "1.0"],
      power: 0,
    });
    assert.deepEqual(niceTicks(-12, 31, 4).labels, ["\u221210", "0", "10", "20", "30"]);
    assert.deepEqual(niceTicks(0.0951, 0.1049, 3).labels, ["0.096", "0.098", "0.100", "0.102", "0.104"]);
  });

  it("give a power of ten to the unit where they are small or large", () => {
    const small = niceTicks(0, 6e-4, 3);
    assert.deepEqual(small, { values: [0, 2e-4, 4e-4, 6e-4], labels: ["0", "2", "4", "6"], power: -4 });
    assert.deepEqual(niceTicks(0, 260000, 3), {
      values: [0, 100000, 200000],
      labels: ["0", "1", "2"],
      power: 5,
    });
    assert.equal(niceTicks(0, 99000, 3).power, 0);
  });

  it("are none where there is no stretch", () => {
    assert.deepEqual(niceTicks(3, 3, 4).values, []);
    assert.deepEqual(niceTicks(0, Number.POSITIVE_INFINITY, 4).values, []);
  });

  it("lie within the stretch, ascend, differ in their labels and are about as many as wanted", () => {
    const number = fc.double({ min: -1e9, max: 1e9, noNaN: true });
    fc.assert(
      fc.property(
        number,
        fc.double({ min: 1e-6, max: 1e9, noNaN: true }),
        fc.integer({ min: 2, max: 9 }),
        (low, span, wanted) => {
          const high = low + span;
          fc.pre(span > 1e-9 * Math.max(Math.abs(low), Math.abs(high)));
          const { values, labels } = niceTicks(low, high, wanted);
          const slack = 1e-6 * span;
          assert.ok(values.every((value) => value >= low - slack && value <= high + slack));
          assert.ok(values.every((value, i) => i === 0 || value > (values[i - 1] ?? value)));
          assert.equal(new Set(labels).size, labels.length);
          assert.ok(
            values.length >= Math.max(2, wanted / 2 - 1) && values.length <= 2 * wanted + 2,
            `${values.length} for ${wanted}`,
          );
        },
      ),
      { seed: 6, numRuns: 500 },
    );
  });
});
