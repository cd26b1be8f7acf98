import assert from "node:assert/strict";
import { plotData } from "../../src/report/plotData.js";
import { runPage } from "../../src/report/runPage.js";
import { findingsWith, hostileTexts, inventedRun } from "./invented.js";

describe("data of a plot", () => {
  const follow = (run: ReturnType<typeof inventedRun>) => {
    const [first] = run.follow;
    assert.ok(first);
    return first;
  };

  const descriptionOf = (run: ReturnType<typeof inventedRun>) => {
    const [description] = findingsWith([run]).descriptions;
    assert.ok(description);
    return description;
  };

  it("hold every reading, curve and mark where there are few", () => {
    const run = inventedRun(21);
    const plot = plotData(run, follow(run), null);
    assert.equal(plot?.readings.length, 21);
    assert.ok(plot?.readings.every(({ kind }) => kind === "used"));
    assert.equal(plot?.curves.length, 121);
    assert.equal(plot?.residuals.length, 21);
    assert.deepEqual(
      plot?.marks.map(({ kind, label, at }) => ({ kind, label, at })),
      [{ kind: "chord", label: "1", at: null }],
    );
  });

  it("are thinned out to an outline where there are many, with the first, last, lowest and highest", () => {
    const run = inventedRun(50_000);
    const plot = plotData(run, follow(run), null);
    const values = follow(run).signal?.values as number[];
    assert.ok(plot !== null && plot.readings.length <= 602);
    assert.ok(plot.readings.every(({ kind }) => kind === "outline"));
    assert.ok(plot.readings.every(({ piece }) => piece === 0));
    const drawn = plot.readings.map(({ y }) => y);
    assert.equal(
      Math.min(...drawn),
      values.reduce((a, b) => Math.min(a, b)),
    );
    assert.equal(
      Math.max(...drawn),
      values.reduce((a, b) => Math.max(a, b)),
    );
    assert.deepEqual([plot.readings[0]?.t, plot.readings.at(-1)?.t], [0, 100]);
  });

  it("take powers of ten out of small values, and cut off a band wider than the picture", () => {
    const run = inventedRun(21);
    const one = follow(run);
    const small = one.signal?.values.map((value) => (value ?? 0) * 1e-6) ?? [];
    one.signal = { unit: "mmol L^-1", values: small };
    const [fit] = run.fits;
    const scaled = (values: (number | null)[] | undefined) => (values ?? []).map((value) => (value ?? 0) * 1e-6);
    assert.ok(fit?.curve);
    fit.curve.signal.values = scaled(fit.curve.signal.values);
    fit.curve.low.values = fit.curve.low.values.map(() => -1);
    fit.curve.high.values = fit.curve.high.values.map(() => 1);
    run.rates = [];
    const plot = plotData(run, one, null);
    assert.ok(plot);
    assert.ok(Math.max(...plot.readings.map(({ y }) => y)) > 1, "readings of 1e-5 are drawn as 10");
    assert.ok(Math.max(...plot.curves.map(({ high }) => high)) < 20);
    assert.match(runPage(descriptionOf(run), "run A", null).markup, /10⁻⁶/);
  });

  it("nothing in the names and titles of a run becomes markup", () => {
    for (const hostile of hostileTexts) {
      const run = inventedRun(5, { title: hostile, equation: hostile });
      follow(run).column = hostile;
      follow(run).leftOut = {
        time: { unit: "s", values: [3] },
        signal: { unit: "mmol L^-1", values: [9] },
        lines: [4],
        why: [hostile],
        places: [run.place],
      };
      const { markup, plots } = runPage(descriptionOf(run), "run A", null);
      assert.ok(!/<(script|img|b)\b/i.test(markup), markup);
      assert.ok(!/ on(error|mouseover|focus)=["']/i.test(markup), markup);
      assert.equal(plots[0]?.readings.at(-1)?.kind, "left out");
    }
  });
});
