import assert from "node:assert/strict";
import * as sealed from "../../src/numerics/elementary.js";
import { seededRandom } from "../../src/numerics/random.js";
import { nearestDoubles } from "./elementaryValues.js";

const functions: Readonly<Record<string, (...x: number[]) => number>> = {
  exp: (x) => sealed.exp(x!),
  expm1: (x) => sealed.expm1(x!),
  log: (x) => sealed.log(x!),
  log10: (x) => sealed.log10(x!),
  log1p: (x) => sealed.log1p(x!),
  pow: (x, y) => sealed.pow(x!, y!),
};

const cell = new Float64Array(1);
const bits = new BigInt64Array(cell.buffer);

/** Bits of a double as a sign-magnitude integer, so that neighbours differ by 1. */
function order(value: number): bigint {
  cell[0] = value;
  return bits[0]! >= 0n ? bits[0]! : -(bits[0]! & 0x7fffffffffffffffn);
}

function unitsApart(a: number, b: number): number {
  const distance = order(a) - order(b);
  return Number(distance < 0n ? -distance : distance);
}

describe("sealed elementary functions", () => {
  it("lie within one unit in the last place of the exact values", () => {
    for (const [name, args, exact] of nearestDoubles) {
      const apart = unitsApart(functions[name]!(...args), exact);
      assert.ok(apart <= 1, `${name}(${args.join(", ")}) is ${apart} units away`);
    }
  });

  it("give the nearest double for exponentials, powers and logarithms to base 10", () => {
    for (const [name, args, exact] of nearestDoubles) {
      if (!name.startsWith("log") || name === "log10")
        assert.equal(functions[name]!(...args), exact, `${name}(${args})`);
    }
  });

  it("stay within two units of the engine's own functions on seeded arguments", () => {
    const random = seededRandom(20);
    const between = (low: number, high: number) => low + (high - low) * random.uniform();
    const compare = (name: string, engine: (...x: number[]) => number, draw: () => number[]) => {
      for (let i = 0; i < 5000; i++) {
        const args = draw();
        const apart = unitsApart(functions[name]!(...args), engine(...args));
        assert.ok(apart <= 2, `${name}(${args.join(", ")}) is ${apart} units away`);
      }
    };
    compare("exp", Math.exp, () => [between(-745, 709)]);
    compare("expm1", Math.expm1, () => [between(-2, 2)]);
    compare("expm1", Math.expm1, () => [between(-60, 709)]);
    compare("log", Math.log, () => [Math.exp(between(-744, 709))]);
    compare("log", Math.log, () => [between(0.5, 2)]);
    compare("log10", Math.log10, () => [Math.exp(between(-744, 709))]);
    compare("log1p", Math.log1p, () => [between(-0.9999, 4)]);
    compare("log1p", Math.log1p, () => [Math.exp(between(-40, 100))]);
    compare("pow", Math.pow, () => [Math.exp(between(-20, 20)), between(-30, 30)]);
  });

  it("keep their bits: a change here changes every record", () => {
    // computed by this code; the test guards against a change, not against an error
    const random = seededRandom(21);
    let digest = 0n;
    for (let i = 0; i < 2000; i++) {
      const x = 60 * (random.uniform() - 0.5);
      const y = 20 * random.uniform() + 1e-3;
      for (const value of [sealed.exp(x), sealed.expm1(x), sealed.log(y), sealed.log1p(y), sealed.log10(y)]) {
        digest = BigInt.asUintN(64, digest * 1099511628211n + order(value));
      }
      digest = BigInt.asUintN(64, digest * 1099511628211n + order(sealed.pow(y, x / 10)));
    }
    assert.equal(digest.toString(16), "57308c2e852bb42f");
  });

  it("are exact for integer powers and powers of ten", () => {
    for (let base = 2; base < 300; base++) {
      let exact = 1n;
      for (let n = 1; ; n++) {
        exact *= BigInt(base);
        if (exact > 9007199254740992n) break;
        assert.equal(sealed.pow(base, n), Number(exact));
      }
    }
    for (let k = -300; k <= 300; k++) assert.equal(sealed.log10(Number(`1e${k}`)), k);
  });

  it("treat the ends of the range as the language does", () => {
    const special = [0, -0, 1, -1, 0.5, 2, -2, 3, -3, 1e308, -1e308, 5e-324, Infinity, -Infinity, NaN];
    for (const x of special) {
      assert.equal(sealed.exp(x), Math.exp(x), `exp ${x}`);
      const [less, engineLess] = [sealed.expm1(x), Math.expm1(x)];
      assert.ok(Object.is(less, engineLess) || unitsApart(less, engineLess) <= 1, `expm1 ${x}`);
      assert.equal(sealed.log1p(x), Math.log1p(x), `log1p ${x}`);
      assert.equal(sealed.log(x), Math.log(x), `log ${x}`);
      for (const y of special) {
        // the language alone says NaN for 1 to the power of NaN or ±∞
        if (Math.abs(x) === 1 && !Number.isFinite(y)) continue;
        const [ours, engine] = [sealed.pow(x, y), x ** y];
        assert.ok(Object.is(ours, engine) || unitsApart(ours, engine) <= 1, `pow ${x} ${y}: ${ours} not ${engine}`);
      }
    }
  });
});
