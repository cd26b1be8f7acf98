import { spawnSync } from "node:child_process";
import { firstOrderModel } from "../../src/law/firstOrder.js";
import { exp } from "../../src/numerics/elementary.js";
import { fitLeastSquares } from "../../src/numerics/leastSquares.js";
import { seededRandom } from "../../src/numerics/random.js";
import { median, ms, times } from "./sampling.js";

const sizes = [50, 1_000, 100_000];
const free = (name: string) => ({ name, fixed: null, low: Number.NEGATIVE_INFINITY, high: Number.POSITIVE_INFINITY });

/** The same fit by scipy's curve_fit, from a sensible start; prints the median of each size in ms. */
const peer = `
import time, numpy as np
from scipy.optimize import curve_fit
for n in ${JSON.stringify(sizes)}:
    t = np.linspace(0, 500, n); r = np.random.default_rng(1)
    y = 0.1*np.exp(-0.008*t) + 3e-4*r.standard_normal(n)
    f = lambda t, a, b, k: b + (a-b)*np.exp(-k*t)
    out = []
    for i in range(25 if n < 100000 else 9):
        s = time.perf_counter(); curve_fit(f, t, y, p0=[0.1, 0.0, 0.005]); out.append(time.perf_counter()-s)
    print(sorted(out)[len(out)//2]*1000)
`;

/** First-order fit with start and infinity free, covariance included, no start value given; scipy beside it. */
export async function bench(): Promise<string[]> {
  const scipy = spawnSync("/usr/bin/python3", ["-c", peer], { encoding: "utf8" });
  const theirs = scipy.status === 0 ? scipy.stdout.trim().split("\n").map(Number) : null;
  const lines = theirs === null ? ["scipy is not installed: left out"] : [];
  return [
    ...lines,
    ...sizes.map((n, index) => {
      const random = seededRandom(n);
      const time = Float64Array.from({ length: n }, (_, i) => (500 * i) / (n - 1));
      const y = time.map((t) => 0.1 * exp(-0.008 * t) + 3e-4 * random.normal());
      let last = 0;
      const found = times(n < 100_000 ? 101 : 15, n < 100_000 ? 30 : 3, () => {
        const fit = fitLeastSquares(y, null, firstOrderModel(time, free("start"), free("infinity")));
        last = fit.values[2] ?? 0;
      });
      const mine = median(found);
      const other = theirs?.[index];
      const ratio = other === undefined ? "" : `, ${(mine / other).toFixed(2)} × scipy (${ms(other)})`;
      return `N = ${n}: ${ms(mine)}${ratio}; k = ${last.toPrecision(4)}`;
    }),
  ];
}
