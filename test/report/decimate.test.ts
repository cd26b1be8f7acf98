import assert from "node:assert/strict";
import { decimate } from "../../src/report/decimate.js";

describe("readings drawn", () => {
  it("are all where there are few, those without a number left out", () => {
    assert.deepEqual(decimate([0, 1, null, 3, 4], [5, null, 5, 5, 5], 600), [0, 3, 4]);
    assert.deepEqual(decimate([], [], 600), []);
  });

  it("are at most as many as asked for, ascending, ends and extremes among them", () => {
    const time = Array.from({ length: 100_000 }, (_, i) => i / 7);
    const value = time.map((t) => Math.sin(t / 500));
    value[31_234] = 9;
    value[77_777] = -9;
    const drawn = decimate(time, value, 600);
    assert.ok(drawn.length <= 600 && drawn.length > 500, String(drawn.length));
    assert.ok(drawn.every((index, i) => i === 0 || index > (drawn[i - 1] ?? index)));
    for (const index of [0, 31_234, 77_777, 99_999]) assert.ok(drawn.includes(index), `${index} is drawn`);
    // Each stretch of time keeps its lowest and highest reading, so the outline stays.
    const outline = (indices: Iterable<number>): string[] => {
      const bins = 299;
      const ends = Array.from({ length: bins }, () => [Number.POSITIVE_INFINITY, Number.NEGATIVE_INFINITY]);
      for (const index of indices) {
        const share = (time[index] ?? 0) / (time[time.length - 1] ?? 1);
        const bin = Math.min(bins - 1, Math.floor(share * bins));
        const [low = 0, high = 0] = ends[bin] ?? [];
        ends[bin] = [Math.min(low, value[index] ?? 0), Math.max(high, value[index] ?? 0)];
      }
      return ends.map(String);
    };
    assert.deepEqual(outline(drawn), outline(time.keys()));
  });

  it("at one single time are its first, lowest, highest and last", () => {
    assert.deepEqual(decimate(new Array(10).fill(2), [3, 9, 4, 1, 5, 5, 5, 5, 5, 5], 4), [0, 1, 3, 9]);
  });
});
