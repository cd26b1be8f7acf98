/** A linear map from a stretch of values to a stretch of the picture. */
export interface Scale {
  readonly low: number;
  readonly high: number;
  /** place of a value, px */
  at(value: number): number;
}

/** Maps `low…high` to `from…to` px; a stretch without length is widened. */
export function linearScale(low: number, high: number, from: number, to: number): Scale {
  const span = high - low;
  return { low, high, at: (value) => from + ((value - low) / span) * (to - from) };
}

/** Lowest and highest of some values, widened by `share` of their span on each side; a single value by a tenth of itself. */
export function extentOf(values: Iterable<number | null>, share: number): [low: number, high: number] {
  let low = Number.POSITIVE_INFINITY;
  let high = Number.NEGATIVE_INFINITY;
  for (const value of values) {
    if (value === null) continue;
    low = Math.min(low, value);
    high = Math.max(high, value);
  }
  if (low > high) return [0, 1];
  const span = high - low;
  const room = span > 0 ? share * span : Math.abs(low) > 0 ? 0.1 * Math.abs(low) : 1;
  return [low - room, high + room];
}

/** A rectangle of the picture, px. */
export interface Box {
  readonly left: number;
  readonly right: number;
  readonly top: number;
  readonly bottom: number;
}

/** A coordinate as it is written: tenths of a pixel, never "-0". */
export function px(value: number): string {
  const rounded = Math.round(value * 10) / 10;
  return String(rounded === 0 ? 0 : rounded);
}

/** A place in the picture, px. */
export type Point = readonly [x: number, y: number];

/** The part of a straight line that lies in the box (Liang and Barsky 1984); null where none does. */
export function clipSegment([x1, y1]: Point, [x2, y2]: Point, box: Box): [Point, Point] | null {
  let first = 0;
  let last = 1;
  const sides: readonly Point[] = [
    [x1 - x2, x1 - box.left],
    [x2 - x1, box.right - x1],
    [y1 - y2, y1 - box.top],
    [y2 - y1, box.bottom - y1],
  ];
  for (const [towards, room] of sides) {
    if (towards === 0) {
      if (room < 0) return null;
    } else if (towards < 0) first = Math.max(first, room / towards);
    else last = Math.min(last, room / towards);
  }
  if (first > last) return null;
  const along = (share: number): Point => [x1 + share * (x2 - x1), y1 + share * (y2 - y1)];
  return [along(first), along(last)];
}
