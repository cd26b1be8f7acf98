import { axisMarkup } from "./axisText.js";
import { curveLook } from "./curveParts.js";
import type { Palette } from "./palette.js";
import { type PictureContent, residualsOf } from "./pictureContent.js";
import { type Box, extentOf, linearScale, type Point, px, type Scale } from "./plotFrame.js";
import { niceTicks } from "./ticks.js";

/** Diameter of a reading, px: smaller where there are many. */
function size(count: number): number {
  return count > 300 ? 2.4 : count > 80 ? 3.4 : 5;
}

/** The readings as dots; hollow where no fit rests on them. */
export function readingParts(
  { readings, thinned }: PictureContent,
  time: Scale,
  signal: Scale,
  { ink, ground }: Palette,
): string[] {
  const places = (used: boolean): [number, number][] =>
    readings.filter((reading) => reading.used === used).map((r) => [time.at(r.time), signal.at(r.signal)]);
  if (thinned) return [...ribbon(places(true), ink, 0.45), ...ribbon(places(false), ink, 0.2)];
  return [
    ...dots(places(true), ink, size(readings.length)),
    ...rings(places(false), ink, ground, size(readings.length)),
  ];
}

/** Readings that the description leaves out: crossed rings, on the picture's edge where they lie outside it. */
export function leftOutParts(
  { follow }: PictureContent,
  time: Scale,
  signal: Scale,
  box: Box,
  { ink }: Palette,
): string[] {
  const { leftOut } = follow;
  const path = (leftOut?.time.values ?? []).flatMap((t, index) => {
    const y = leftOut?.signal.values[index];
    if (t === null || typeof y !== "number") return [];
    const place = [
      Math.min(box.right, Math.max(box.left, time.at(t))),
      Math.min(box.bottom, Math.max(box.top, signal.at(y))),
    ];
    const [left, top] = place.map((middle) => px(middle - 2.5));
    return [`M${left} ${px(place[1] ?? 0)}a2.5 2.5 0 1 0 5 0a2.5 2.5 0 1 0 -5 0M${left} ${top}l5 5m0 -5l-5 5`];
  });
  return path.length === 0 ? [] : [`<path d="${path.join("")}" fill="none" stroke="${ink}" stroke-width="1"/>`];
}

/** Widest gap between neighbours of a ribbon, px. */
const gap = 8;

/** Many readings, each stretch of time from its lowest to its highest; where none were made for a while it is broken. */
function ribbon(places: readonly Point[], colour: string, opacity: number): string[] {
  if (places.length === 0) return [];
  const path = places.map(([x, y], index) => {
    const before = places[index - 1];
    const joined = before !== undefined && x - before[0] <= gap;
    return `${joined ? "L" : "M"}${px(x)} ${px(y)}${joined ? "" : "h0"}`;
  });
  return [
    `<path d="${path.join("")}" fill="none" stroke="${colour}" stroke-opacity="${opacity}" stroke-width="2" stroke-linejoin="round" stroke-linecap="round"/>`,
  ];
}

/** Lines without length with round ends: the shortest way to write many dots. */
function dots(places: readonly (readonly [number, number])[], colour: string, diameter: number): string[] {
  if (places.length === 0) return [];
  const path = places.map(([x, y]) => `M${px(x)} ${px(y)}h0`).join("");
  return [`<path d="${path}" fill="none" stroke="${colour}" stroke-width="${diameter}" stroke-linecap="round"/>`];
}

function rings(
  places: readonly (readonly [number, number])[],
  colour: string,
  ground: string,
  diameter: number,
): string[] {
  if (places.length === 0) return [];
  const r = diameter / 2;
  const ring = `a${r} ${r} 0 1 0 ${diameter} 0a${r} ${r} 0 1 0 ${-diameter} 0`;
  const path = places.map(([x, y]) => `M${px(x - r)} ${px(y)}${ring}`).join("");
  return [`<path d="${path}" fill="${ground}" stroke="${colour}" stroke-width="1"/>`];
}

/** Reading minus curve, as stems from zero, under the same time axis; one set of signs per fit. */
export function residualParts(
  { follow, fits, signalUnit }: PictureContent,
  time: Scale,
  box: Box,
  palette: Palette,
): string[] {
  const sets = fits.map(({ fit }) => residualsOf(follow, fit));
  const [low, high] = extentOf([0, ...sets.flat().map(({ residual }) => residual)], 0.08);
  const greatest = Math.max(Math.abs(low), Math.abs(high));
  const scale = linearScale(-greatest, greatest, box.bottom, box.top);
  const { values, labels, power } = niceTicks(-greatest, greatest, 2.5);
  const x = box.left - 4;
  const name = axisMarkup({ symbol: "reading − curve", of: "", unit: signalUnit, power });
  return [
    `<path d="M${px(box.left)} ${px(scale.at(0))}H${px(box.right)}" stroke="${palette.faint}" stroke-opacity="0.6" fill="none"/>`,
    `<path d="${values.map((value) => `M${px(x - 4)} ${px(scale.at(value))}h4`).join("")}" stroke="${palette.faint}" fill="none"/>`,
    ...values.map(
      (value, i) =>
        `<text x="${px(x - 7)}" y="${px(scale.at(value) + 3.8)}" text-anchor="end" fill="${palette.ink}">${labels[i] ?? ""}</text>`,
    ),
    `<text x="${px(box.left - 48)}" y="${px(box.top - 8)}" fill="${palette.ink}">${name}</text>`,
    ...sets.flatMap((set, order) => residualMarks(set, order, time, scale, palette)),
  ];
}

function residualMarks(
  set: readonly { time: number; residual: number }[],
  order: number,
  time: Scale,
  scale: Scale,
  palette: Palette,
): string[] {
  const { colour } = curveLook(order, palette);
  const places = set.map(({ time: t, residual }): [number, number] => [time.at(t), scale.at(residual)]);
  const zero = px(scale.at(0));
  if (set.length > 300) return ribbon(places, colour, 0.55);
  const stems = set.length > 120 ? "" : places.map(([x, y]) => `M${px(x)} ${zero}V${px(y)}`).join("");
  return [
    stems === "" ? "" : `<path d="${stems}" fill="none" stroke="${colour}" stroke-opacity="0.55"/>`,
    ...(order === 0 ? dots(places, colour, 3.6) : rings(places, colour, "none", 4)),
  ];
}
