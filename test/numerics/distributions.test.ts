import assert from "node:assert/strict";
import {
  chiSquareCdf,
  chiSquareTail,
  fCdf,
  fTail,
  normalCdf,
  normalQuantile,
  normalTail,
  tCdf,
  tQuantile,
} from "../../src/numerics/distributions.js";

function near(actual: number | null, expected: number, within: number): void {
  assert.ok(actual !== null && Math.abs(actual - expected) <= within, `${actual} is not ${expected}`);
}

describe("distributions", () => {
  it("gives the t quantiles of JCGM 100:2008, table G.2 (from memory)", () => {
    const rows: [number, number][] = [
      [1, 12.71],
      [2, 4.3],
      [3, 3.18],
      [4, 2.78],
      [5, 2.57],
      [10, 2.23],
      [20, 2.09],
      [50, 2.01],
      [100, 1.984],
    ];
    for (const [df, t] of rows) near(tQuantile(0.975, df), t, 0.0051);
    near(tQuantile(0.975, Number.POSITIVE_INFINITY), 1.959964, 5e-7);
    near(tQuantile(0.025, 4), -tQuantile(0.975, 4)!, 1e-12);
    // R 4.2 documentation of the data set BOD, Wald limits: 19.1425752846 + t·2.49591733221 = 26.0723527446 with 4 df
    near(tQuantile(0.975, 4), (26.0723527446 - 19.1425752846) / 2.49591733221, 1e-9);
  });

  it("gives the closed forms of t for 1 and 2 degrees of freedom", () => {
    for (const p of [0.6, 0.9, 0.975, 0.9995]) {
      near(tQuantile(p, 1), Math.tan(Math.PI * (p - 0.5)), 1e-9 * Math.tan(Math.PI * (p - 0.5)));
      const a = 2 * p - 1;
      near(tQuantile(p, 2), a * Math.sqrt(2 / (1 - a * a)), 1e-9 * a * Math.sqrt(2 / (1 - a * a)));
      for (const df of [1, 2, 7.5, 300]) near(tCdf(tQuantile(p, df)!, df), p, 1e-12);
    }
  });

  it("gives the normal distribution (Abramowitz and Stegun, table 26.1, from memory)", () => {
    near(normalCdf(1), 0.841344746068543, 1e-14);
    near(normalCdf(1.96), 0.97500210485178, 1e-14);
    near(normalTail(3), 0.00134989803163009, 1e-16);
    near(normalQuantile(0.975), 1.959963984540054, 1e-14);
    near(normalTail(30), 4.906713927148187e-198, 1e-207);
  });

  it("gives the F and χ² points of the usual tables (from memory)", () => {
    const f: [number, number, number][] = [
      [161.4476, 1, 1],
      [6.9443, 2, 4],
      [3.3258, 5, 10],
      [2.3479, 10, 20],
    ];
    for (const [x, d1, d2] of f) near(fTail(x, d1, d2), 0.05, 5e-6);
    const chi: [number, number][] = [
      [3.8415, 1],
      [5.9915, 2],
      [11.0705, 5],
      [18.307, 10],
      [124.3421, 100],
    ];
    for (const [x, df] of chi) near(chiSquareTail(x, df), 0.05, 5e-6);
  });

  it("agrees with the closed forms of F and χ²", () => {
    for (const x of [0.1, 1, 7, 60]) {
      near(chiSquareTail(x, 2), Math.exp(-x / 2), 1e-14);
      near(fTail(x, 2, 6), (1 + x / 3) ** -3, 1e-14);
      near(fCdf(x, 2, 6), 1 - (1 + x / 3) ** -3, 1e-14);
      near(chiSquareCdf(x, 3)! + chiSquareTail(x, 3)!, 1, 1e-14);
    }
  });

  it("refuses by null, never by NaN", () => {
    assert.equal(tQuantile(1, 4), null);
    assert.equal(tQuantile(0.5, 0), null);
    assert.equal(tQuantile(0.975, Number.NaN), null);
    assert.equal(normalQuantile(0), null);
    assert.equal(tCdf(Number.NaN, 3), null);
    assert.equal(fTail(1, 0, 3), null);
    assert.equal(fCdf(Number.NaN, 2, 3), null);
    assert.equal(chiSquareTail(1, -1), null);
    assert.equal(chiSquareTail(-1, 2), 1);
    assert.equal(fCdf(0, 2, 3), 0);
  });
});
