import type { Palette } from "./palette.js";
import type { PictureContent, Rate } from "./pictureContent.js";
import { type Box, clipSegment, type Point, px, type Scale } from "./plotFrame.js";

/**
 * Chords and tangents. A chord is dashed between two bars, a tangent unbroken with a diamond where it touches; each bears
 * the number of its rate.
 */
export function markParts({ rates }: PictureContent, time: Scale, signal: Scale, box: Box, palette: Palette): string[] {
  const taken: Point[] = [];
  return rates.flatMap(({ rate, number, mark }) => {
    const [first, last] = [0, 1].map((end): [number, number] => [
      time.at(mark.time[end] ?? 0),
      signal.at(mark.signal[end] ?? 0),
    ]) as [[number, number], [number, number]];
    const clipped = clipSegment(first, last, box);
    if (clipped === null) return [];
    const [[x1, y1], [x2, y2]] = clipped;
    const chord = rate.kind === "average";
    const dash = chord ? ` stroke-dasharray="5 3"` : "";
    const line = `<path d="M${px(x1)} ${px(y1)}L${px(x2)} ${px(y2)}" fill="none" stroke="${palette.mark}" stroke-width="1.2"${dash}/>`;
    const ends = chord ? bars([first, last], palette) : diamond(rate, first, last, time, palette);
    return [line, ends, numeral(number, clipped, chord ? "chord" : "tangent", taken, box, palette)];
  });
}

function bars(ends: readonly (readonly [number, number])[], { mark }: Palette): string {
  const path = ends.map(([x, y]) => `M${px(x)} ${px(y - 5)}v10`).join("");
  return `<path d="${path}" fill="none" stroke="${mark}" stroke-width="1.2"/>`;
}

/** Where a tangent touches: at its time. */
function diamond(
  { at }: Rate,
  [x1, y1]: readonly [number, number],
  [x2, y2]: readonly [number, number],
  time: Scale,
  { mark }: Palette,
): string {
  const x = at === null ? x1 : time.at(at.value);
  const y = x2 === x1 ? y1 : y1 + ((x - x1) / (x2 - x1)) * (y2 - y1);
  return `<path d="M${px(x)} ${px(y - 4)}l4 4l-4 4l-4 -4Z" fill="${mark}"/>`;
}

/** Shares of a line's length at which its number may stand, best first. */
const shares = { chord: [0.5, 0.62, 0.38, 0.75, 0.25], tangent: [0.86, 0.98, 0.74, 0.2, 0.6] };

/** The number of a rate beside its line, below it, where no other number stands yet. */
function numeral(
  number: number,
  [[x1, y1], [x2, y2]]: readonly [Point, Point],
  kind: keyof typeof shares,
  taken: Point[],
  box: Box,
  { mark }: Palette,
): string {
  const aside = y2 < y1 ? 7 : -7;
  const places = shares[kind].map((share): Point => {
    const x = Math.min(box.right - 6, Math.max(box.left + 4, x1 + share * (x2 - x1) + aside));
    return [x, Math.min(box.bottom - 2, y1 + share * (y2 - y1) + 13)];
  });
  const free = places.find(([x, y]) => taken.every(([a, b]) => Math.abs(a - x) > 9 || Math.abs(b - y) > 11));
  const place = free ?? places[0] ?? [x2, y2];
  taken.push(place);
  return `<text x="${px(place[0])}" y="${px(place[1])}" text-anchor="middle" font-size="10" fill="${mark}">${number}</text>`;
}
