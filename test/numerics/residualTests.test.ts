import assert from "node:assert/strict";
import { seededRandom } from "../../src/numerics/random.js";
import { durbinWatson, lagOneCorrelation, runsTest } from "../../src/numerics/residualTests.js";

describe("residual tests", () => {
  it("counts runs and gives the exact probability worked by hand", () => {
    // two + and two −: of 6 orders, 2 have two runs, 2 three, 2 four
    const two = runsTest([1, 1, -1, -1])!;
    assert.deepEqual([two.runs, two.positive, two.negative, two.expected], [2, 2, 2, 3]);
    assert.ok(Math.abs(two.p - 2 / 3) < 1e-15);
    assert.equal(runsTest([1, -1, 1, -1])!.p, two.p);
    assert.equal(runsTest([1, 0, -1, -1, 1])!.runs, 3);
    // five of each in two blocks: 2 of 252 orders
    assert.ok(Math.abs(runsTest([1, 1, 1, 1, 1, -1, -1, -1, -1, -1])!.p - 4 / 252) < 1e-15);
  });

  it("gives the published moments of the number of runs", () => {
    // Wald and Wolfowitz 1940: mean 2ab/n + 1, variance 2ab(2ab − n)/(n²(n − 1)); a = 12, b = 8: 10.6, 4.345263
    const signs = [...new Array(12).fill(1), ...new Array(8).fill(-1)];
    const test = runsTest(signs)!;
    assert.ok(Math.abs(test.expected - 10.6) < 1e-12);
    assert.ok(Math.abs(test.z - (2 - 10.6) / Math.sqrt((192 * 172) / (400 * 19))) < 1e-12);
  });

  it("joins the exact to the approximate probability", () => {
    // 60 signs are summed, 62 approximated: the same pattern must give nearly the same probability
    const pattern = (n: number) => Array.from({ length: n }, (_, i) => (Math.floor(i / 3) % 2 === 0 ? 1 : -1));
    const exact = runsTest(pattern(60))!;
    const approximate = runsTest(pattern(66))!;
    assert.ok(exact.exact && !approximate.exact);
    assert.ok(exact.p < 0.01 && approximate.p < exact.p && approximate.p > 0.2 * exact.p);
  });

  it("holds its level on independent signs", () => {
    const random = seededRandom(8);
    let rejected = 0;
    for (let k = 0; k < 2000; k++) {
      const test = runsTest(Array.from({ length: 80 }, () => random.normal()))!;
      if (test.p < 0.05) rejected++;
    }
    // at most 5 %; discreteness makes it smaller; three standard deviations above and a floor against a dead test
    assert.ok(rejected < 2000 * 0.05 + 3 * Math.sqrt(2000 * 0.05 * 0.95) && rejected > 20, String(rejected));
  });

  it("gives Durbin–Watson and the lag-1 correlation of a worked series", () => {
    // differences −2, 3, −4: 29; squares 1 + 1 + 4 + 4 = 10; products −1 − 2 − 4 = −7
    const residuals = [1, -1, 2, -2];
    assert.equal(durbinWatson(residuals), (4 + 9 + 16) / 10);
    assert.equal(lagOneCorrelation(residuals), -0.7);
  });

  it("refuses what decides nothing", () => {
    assert.equal(runsTest([1, 2, 3]), null);
    assert.equal(runsTest([]), null);
    assert.equal(runsTest([0, 0]), null);
    assert.equal(durbinWatson([1]), null);
    assert.equal(durbinWatson([0, 0, 0]), null);
    assert.equal(lagOneCorrelation([0, 0]), null);
    assert.equal(durbinWatson([1, Number.NaN]), null);
    assert.equal(runsTest([1, -1])!.z, 0);
  });
});
