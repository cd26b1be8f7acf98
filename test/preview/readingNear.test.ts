import assert from "node:assert/strict";
import type { PlotReading } from "../../src/contract/previewProtocol.js";
import { readingNear } from "../../src/preview/plotPlaces.js";

const reading = (t: number, y: number): PlotReading => ({ t, y, kind: "used", piece: 0, line: t + 2, words: "" });

describe("the reading a pointer means", () => {
  // Ten px a unit of time, a hundred a unit of the signal, which grows upwards.
  const places = {
    ...{ left: 0, right: 100, top: 0, bottom: 100 },
    x: (t: number) => 10 * t,
    y: (signal: number) => 100 - 100 * signal,
    time: (x: number) => x / 10,
  };
  const readings = [reading(0, 1), reading(1, 0.9), reading(2, 0.5)];

  it("is the nearest on the screen, whatever the units", () => {
    assert.equal(readingNear(readings, places, [4, 4])?.t, 0);
    assert.equal(readingNear(readings, places, [7, 8])?.t, 1);
    assert.equal(readingNear(readings, places, [20, 50])?.t, 2);
  });

  it("is none where none is near", () => {
    assert.equal(readingNear(readings, places, [60, 60]), null);
    assert.equal(readingNear(readings, places, [20, 65]), null);
    assert.equal(readingNear([], places, [0, 0]), null);
  });
});
