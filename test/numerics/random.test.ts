import assert from "node:assert/strict";
import { seededRandom, splitMix64, xoshiro128 } from "../../src/numerics/random.js";

describe("seeded generator", () => {
  it("gives the published sequences", () => {
    // first outputs of xoshiro128** 1.1 from the state 1, 2, 3, 4 (from memory)
    const next = xoshiro128([1, 2, 3, 4]);
    assert.deepEqual(Array.from({ length: 6 }, next), [11520, 0, 5927040, 70819200, 2031721883, 1637235492]);
    // first outputs of SplitMix64 from 1234567 (from memory)
    let counter = 1234567n;
    const values = Array.from({ length: 3 }, () => {
      const step = splitMix64(counter);
      counter = step.counter;
      return step.value;
    });
    assert.deepEqual(values, [6457827717110365317n, 3203168211198807973n, 9817491932198370423n]);
  });

  it("repeats itself for a seed and differs between seeds", () => {
    const draw = (seed: number) => {
      const random = seededRandom(seed);
      return Array.from({ length: 20 }, () => [random.uniform(), random.normal(), random.integer(10)]);
    };
    assert.deepEqual(draw(5), draw(5));
    assert.notDeepEqual(draw(5), draw(6));
    assert.notDeepEqual(draw(5), draw(-5));
  });

  it("has the moments of the uniform and the normal distribution", () => {
    const random = seededRandom(3);
    const n = 100000;
    let [sum, square, normal, normalSquare, fourth] = [0, 0, 0, 0, 0];
    for (let i = 0; i < n; i++) {
      const u = random.uniform();
      assert.ok(u >= 0 && u < 1);
      sum += u;
      square += u * u;
      const z = random.normal();
      normal += z;
      normalSquare += z * z;
      fourth += z * z * z * z;
    }
    // five standard deviations of each mean
    assert.ok(Math.abs(sum / n - 1 / 2) < 5 * Math.sqrt(1 / 12 / n));
    assert.ok(Math.abs(square / n - 1 / 3) < 5 * Math.sqrt(4 / 45 / n));
    assert.ok(Math.abs(normal / n) < 5 * Math.sqrt(1 / n));
    assert.ok(Math.abs(normalSquare / n - 1) < 5 * Math.sqrt(2 / n));
    assert.ok(Math.abs(fourth / n - 3) < 5 * Math.sqrt(96 / n));
  });

  it("draws integers evenly", () => {
    const random = seededRandom(4);
    const counts = new Array<number>(7).fill(0);
    for (let i = 0; i < 70000; i++) counts[random.integer(7)]!++;
    for (const count of counts) assert.ok(Math.abs(count - 10000) < 5 * Math.sqrt(10000));
  });
});
