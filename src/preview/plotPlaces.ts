import type { PlotReading } from "../contract/previewProtocol.js";

/** Where values of a plot stand on the screen, px from the left and upper edge of its frame, and back. */
export interface PlotPlaces {
  readonly left: number;
  readonly right: number;
  readonly top: number;
  readonly bottom: number;
  x(t: number): number;
  y(signal: number): number;
  /** the time at a place, kept within the axis */
  time(x: number): number;
}

/** Farthest a pointer may be from a reading it means, px. */
const reach = 14;

/** The reading nearest to a place; null where none is near. */
export function readingNear(
  readings: readonly PlotReading[],
  places: PlotPlaces,
  [x, y]: readonly [x: number, y: number],
): PlotReading | null {
  let best: PlotReading | null = null;
  let least = reach * reach;
  for (const reading of readings) {
    const [dx, dy] = [places.x(reading.t) - x, places.y(reading.y) - y];
    const distance = dx * dx + dy * dy;
    if (distance > least) continue;
    least = distance;
    best = reading;
  }
  return best;
}
