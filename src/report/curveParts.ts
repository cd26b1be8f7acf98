import type { Block } from "../contract/findings.js";
import type { Palette } from "./palette.js";
import type { PictureContent } from "./pictureContent.js";
import { type Box, px, type Scale } from "./plotFrame.js";

/** Dashes of the first, second, third … curve. */
const dashes = ["", "7 4", "2 3", "10 3 2 3"];

/** How the curve of a fit is drawn; `order` counts the curves of a picture from 0. */
export function curveLook(order: number, { curves }: Palette): { colour: string; dash: string } {
  return { colour: curves[order % curves.length] ?? "", dash: dashes[order % dashes.length] ?? "" };
}

/** Fitted curves with their bands; where there are several each bears its number at its end. */
export function curveParts({ fits }: PictureContent, time: Scale, signal: Scale, box: Box, palette: Palette): string[] {
  const bands = fits.map(({ curve }, order) => {
    const upper = points(curve.time, curve.high, time, signal, box);
    const lower = points(curve.time, curve.low, time, signal, box).reverse();
    if (upper.length < 2 || lower.length < 2) return "";
    const { colour } = curveLook(order, palette);
    return `<path d="M${[...upper, ...lower].join("L")}Z" fill="${colour}" fill-opacity="${palette.band}"/>`;
  });
  const lines = fits.map(({ curve }, order) => {
    const line = points(curve.time, curve.signal, time, signal, box);
    if (line.length < 2) return "";
    const { colour, dash } = curveLook(order, palette);
    const dashed = dash === "" ? "" : ` stroke-dasharray="${dash}"`;
    return `<path d="M${line.join("L")}" fill="none" stroke="${colour}" stroke-width="1.6" stroke-linejoin="round"${dashed}/>`;
  });
  return [...bands, ...lines, ...(fits.length > 1 ? endNumbers(fits, time, signal, box, palette) : [])];
}

/** Places of a curve; what lies outside the box is drawn on its edge. */
function points(times: Block, values: Block, time: Scale, signal: Scale, box: Box): string[] {
  return times.values.flatMap((t, index) => {
    const value = values.values[index];
    if (t === null || value === null || value === undefined) return [];
    const y = Math.min(box.bottom, Math.max(box.top, signal.at(value)));
    return [`${px(time.at(t))} ${px(y)}`];
  });
}

/** "fit 1", "fit 2" … at the ends of the curves, moved apart where they would overlap. */
function endNumbers(fits: PictureContent["fits"], time: Scale, signal: Scale, box: Box, palette: Palette): string[] {
  const ends = fits.flatMap(({ number, curve }, order) => {
    const t = curve.time.values.at(-1);
    const value = curve.signal.values.at(-1);
    if (typeof t !== "number" || typeof value !== "number") return [];
    return [{ number, order, x: Math.min(time.at(t), box.right) - 2, y: signal.at(value) - 9 }];
  });
  ends.sort((a, b) => b.y - a.y);
  let before = box.bottom + 9;
  return ends.map(({ number, order, x, y }) => {
    before = Math.min(before - 13, y);
    const { colour } = curveLook(order, palette);
    return `<text x="${px(x)}" y="${px(before)}" text-anchor="end" fill="${colour}">fit ${number}</text>`;
  });
}
