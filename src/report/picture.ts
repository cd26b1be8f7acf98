import type { Run } from "../contract/findings.js";
import { axisMarkup, signalName } from "./axisText.js";
import { curveParts } from "./curveParts.js";
import { escapeHtml } from "./escape.js";
import { markParts } from "./markParts.js";
import type { Palette } from "./palette.js";
import { type PictureContent, pictureContent, residualsOf, signalsOf } from "./pictureContent.js";
import { pictureTitle, pictureWords } from "./pictureWords.js";
import { type Box, extentOf, linearScale, px, type Scale } from "./plotFrame.js";
import { leftOutParts, readingParts, residualParts } from "./readingParts.js";
import { niceTicks, type Ticks } from "./ticks.js";

/** How a picture is drawn. Sizes in px. */
export interface PictureStyle {
  readonly palette: Palette;
  readonly width: number;
  readonly height: number;
  /** height of the strip of residuals under the same time axis; 0 for none */
  readonly strip: number;
}

/** Of the hover: small, without residuals. */
export function hoverStyle(palette: Palette): PictureStyle {
  return { palette, width: 360, height: 220, strip: 0 };
}

/** Of the report. */
export function reportStyle(palette: Palette): PictureStyle {
  return { palette, width: 680, height: 420, strip: 84 };
}

const letter = 11;
/** Width of a digit in the letter size, px; generous for any sans-serif. */
const digit = 6.4;

/**
 * What was seen of one follow line, as an SVG picture: readings, fitted curves with their 95 % band, chords and tangents,
 * quantity and unit at the axes, a strip of residuals where the style has one, and all of it in words for those who do
 * not see it. No script, no reference to anything outside. Null where there are no readings.
 */
export function runPicture(run: Run, follow: Run["follow"][number], style: PictureStyle): string | null {
  const content = pictureContent(run, follow);
  if (content === null) return null;
  const { palette, width, height } = style;
  const residuals = style.strip === 0 ? [] : content.fits.flatMap(({ fit }) => residualsOf(follow, fit));
  const strip = residuals.length === 0 ? 0 : style.strip;
  const top = 26;
  const bottom = height - 36 - (strip === 0 ? 0 : strip + 26);
  const signalTicks = (low: number, high: number) => niceTicks(low, high, Math.max(2, (bottom - top) / 36));
  const [low, high] = extentOf(signalsOf(content), 0.05);
  const across = signalTicks(low, high);
  const gap = Math.max(...across.labels.map((label) => label.length), 1) * digit + 16;
  const box: Box = { left: Math.max(gap, strip === 0 ? 0 : 64), right: width - 16, top, bottom };
  const time = linearScale(...extentOf(timesOf(content), 0.02), box.left, box.right);
  const signal = linearScale(low, high, box.bottom, box.top);
  const along = niceTicks(time.low, time.high, (box.right - box.left) / 64);
  const floor = strip === 0 ? box.bottom : height - 36;
  const parts = [
    palette.card
      ? `<rect x="0.5" y="0.5" width="${width - 1}" height="${height - 1}" rx="4" fill="${palette.ground}" stroke="${palette.faint}" stroke-opacity="0.4"/>`
      : "",
    signalAxis(signal, across, box, palette),
    words(
      box.left - gap + 6,
      14,
      "start",
      palette.ink,
      axisMarkup({ ...signalName(follow, content.signalUnit), power: across.power }),
    ),
    // A ribbon of readings would hide the curve, single readings would be hidden by it.
    ...(content.thinned ? readingParts(content, time, signal, palette) : []),
    ...curveParts(content, time, signal, box, palette),
    ...(content.thinned ? [] : readingParts(content, time, signal, palette)),
    ...leftOutParts(content, time, signal, box, palette),
    ...markParts(content, time, signal, box, palette),
    ...(strip === 0 ? [] : residualParts(content, time, { ...box, top: floor - strip, bottom: floor }, palette)),
    timeAxis(time, along, floor, palette),
    words(
      box.right,
      floor + 31,
      "end",
      palette.ink,
      axisMarkup({ symbol: "t", of: "", unit: content.timeUnit, power: along.power }),
    ),
  ];
  return [
    `<svg xmlns="http://www.w3.org/2000/svg" width="${width}" height="${height}" viewBox="0 0 ${width} ${height}" role="img"`,
    ` font-family="system-ui, 'Segoe UI', 'Helvetica Neue', Arial, sans-serif" font-size="${letter}" style="font-variant-numeric: tabular-nums">`,
    `<title>${escapeHtml(pictureTitle(run, content))}</title><desc>${escapeHtml(pictureWords(content))}</desc>`,
    ...parts,
    "</svg>",
  ].join("");
}

function* timesOf({ readings, fits }: PictureContent): Iterable<number | null> {
  for (const { time } of readings) yield time;
  for (const { curve } of fits) yield* curve.time.values;
}

function words(x: number, y: number, anchor: "start" | "middle" | "end", colour: string, markup: string): string {
  return `<text x="${px(x)}" y="${px(y)}" text-anchor="${anchor}" fill="${colour}">${markup}</text>`;
}

/** The axes reach from the first to the last round number, not around the picture. */
function signalAxis(scale: Scale, { values, labels }: Ticks, { left }: Box, { ink, faint }: Palette): string {
  const x = left - 4;
  const ends = [values[0], values[values.length - 1]].map((value) => scale.at(value ?? scale.low));
  const line = `<path d="M${px(x)} ${px(ends[0] ?? 0)}V${px(ends[1] ?? 0)}${values.map((value) => `M${px(x - 4)} ${px(scale.at(value))}h4`).join("")}" stroke="${faint}" fill="none"/>`;
  return line + values.map((value, i) => words(x - 7, scale.at(value) + 3.8, "end", ink, labels[i] ?? "")).join("");
}

function timeAxis(scale: Scale, { values, labels }: Ticks, floor: number, { ink, faint }: Palette): string {
  const y = floor + 4;
  const ends = [values[0], values[values.length - 1]].map((value) => scale.at(value ?? scale.low));
  const line = `<path d="M${px(ends[0] ?? 0)} ${px(y)}H${px(ends[1] ?? 0)}${values.map((value) => `M${px(scale.at(value))} ${px(y)}v4`).join("")}" stroke="${faint}" fill="none"/>`;
  return line + values.map((value, i) => words(scale.at(value), y + 15, "middle", ink, labels[i] ?? "")).join("");
}
