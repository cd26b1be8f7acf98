import assert from "node:assert/strict";
import { pictureContent, residualsOf } from "../../src/report/pictureContent.js";
import { plotData } from "../../src/report/plotData.js";
import { thinCurves } from "../../src/report/thinCurves.js";
import { findingsWith, inventedRun } from "./invented.js";

function thinned(count: number) {
  const run = inventedRun(count);
  const [description] = findingsWith([run]).descriptions;
  assert.ok(description);
  const [thin] = thinCurves(description).runs;
  const [follow] = thin?.follow ?? [];
  assert.ok(thin && follow);
  return { run, thin, follow };
}

describe("thinned curves", () => {
  it("leave few readings as they are", () => {
    const { run, thin } = thinned(600);
    assert.deepEqual(thin, run);
  });

  it("hold of many readings what makes the outlines of signal and residuals, each with its own residual", () => {
    const { run, thin, follow } = thinned(40_000);
    const whole = run.follow[0];
    const readings = follow.time?.values.length ?? 0;
    assert.ok(readings >= 600 && readings <= 1_202, `${readings}`);
    const [fit] = thin.fits;
    const all = run.fits[0];
    assert.ok(fit && all && whole);
    assert.equal(fit.residuals?.values.length, readings);
    const extremes = (values: readonly (number | null)[] | undefined): number[] => {
      const sorted = (values ?? []).flatMap((value) => value ?? []).sort((a, b) => a - b);
      return [sorted[0] ?? Number.NaN, sorted.at(-1) ?? Number.NaN];
    };
    assert.deepEqual(extremes(fit.residuals?.values), extremes(all.residuals?.values));
    assert.deepEqual(extremes(follow.signal?.values), extremes(whole.signal?.values));
    // Each residual still stands at the time of its reading.
    const at = new Map(whole.time?.values.map((t, index) => [t, all.residuals?.values[index]]));
    for (const { time, residual } of residualsOf(follow, fit)) assert.equal(at.get(time), residual);
    assert.deepEqual({ ...fit, residuals: null }, { ...all, residuals: null });
  });

  it("are drawn as an outline, like all of them", () => {
    const { run, thin, follow } = thinned(40_000);
    assert.equal(pictureContent(thin, follow)?.thinned, true);
    const [whole] = run.follow;
    assert.ok(whole);
    const [from, to] = [plotData(run, whole, null), plotData(thin, follow, null)];
    const extent = (plot: typeof from): number[] => {
      const values = plot?.readings.map(({ y }) => y) ?? [];
      return [Math.min(...values), Math.max(...values), values.length > 500 ? 1 : 0];
    };
    assert.deepEqual(extent(to), extent(from));
  });
});
