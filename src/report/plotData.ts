import type { Run } from "../contract/findings.js";
import type { Plot, PlotMark, PlotReading } from "../contract/previewProtocol.js";
import { formatQuantity } from "../quantity/formatNumber.js";
import { axisWords } from "./axisText.js";
import { type PictureContent, pictureContent, residualsOf, signalsOf } from "./pictureContent.js";
import { extentOf } from "./plotFrame.js";
import { printedQuantity } from "./printedText.js";
import { niceTicks } from "./ticks.js";

type Follow = Run["follow"][number];

/** Powers of ten taken out of an axis: a value on the axis times 10^power is the value in its unit. */
export interface PlotPowers {
  readonly time: number;
  readonly signal: number;
  readonly residual: number;
}

/** The powers of ten of a plot's axes, as its static picture has them. */
export function plotPowers(run: Run, follow: Follow): PlotPowers {
  const content = pictureContent(run, follow);
  if (content === null) return { time: 0, signal: 0, residual: 0 };
  const power = (values: readonly (number | null)[]): number => niceTicks(...extentOf(values, 0), 6).power;
  return {
    time: power(content.readings.map(({ time }) => time)),
    signal: power(content.readings.map(({ signal }) => signal)),
    residual: power([0, ...residualsIn(content).map(({ residual }) => residual)]),
  };
}

/**
 * What a plot of a follow line draws, thinned out so that the eye sees no difference; null where there are no readings.
 * `file`: URI of the data file, null where it may not be opened.
 */
export function plotData(run: Run, follow: Follow, file: string | null): Plot | null {
  const content = pictureContent(run, follow);
  if (content === null) return null;
  const powers = plotPowers(run, follow);
  const time = (t: number): number => scaled(t, powers.time);
  const signal = (y: number): number => scaled(y, powers.signal);
  // A band that is wider than all there is to see would press the readings flat: it is cut off beyond the picture.
  const [lowest, highest] = extentOf(signalsOf(content), 0.3);
  const kept = (y: number): number => Math.min(highest, Math.max(lowest, y));
  return {
    id: follow.id,
    timeUnit: content.timeUnit,
    timeFactor: Number(`1e${powers.time}`),
    file,
    readings: readingsOf(content, time, signal, kept),
    curves: content.fits.flatMap(({ number, curve }, order) =>
      curve.time.values.flatMap((t, index) => {
        const y = curve.signal.values[index];
        if (t === null || typeof y !== "number") return [];
        const [low, high] = [curve.low.values[index] ?? y, curve.high.values[index] ?? y].map(kept) as [number, number];
        return [{ t: time(t), y: signal(y), low: signal(low), high: signal(high), fit: `fit ${number}`, order }];
      }),
    ),
    marks: content.rates.map((drawn) => markOf(drawn, time, signal)),
    residuals: residualsIn(content).map((one) => ({
      t: time(one.time),
      r: scaled(one.residual, powers.residual),
      order: one.order,
    })),
    residualTitle: axisWords({
      symbol: "reading − curve",
      of: "",
      unit: content.signalUnit,
      power: powers.residual,
    }),
    fits: run.fits.filter((fit) => fit.follow === follow.id).map(({ id }) => id),
  };
}

/**
 * A chord has its number at its middle, a tangent at its end, each on the side where a course that levels off leaves
 * room.
 */
function markOf(
  { rate, number, mark }: PictureContent["rates"][number],
  time: (t: number) => number,
  signal: (y: number) => number,
): PlotMark {
  const [t, t2] = mark.time.map(time) as [number, number];
  const [y, y2] = mark.signal.map(signal) as [number, number];
  const along = (share: number) => ({ t: t + share * (t2 - t), y: y + share * (y2 - y) });
  const touch = rate.at === null || t2 === t ? 0 : (time(rate.at.value) - t) / (t2 - t);
  const aside = y2 < y ? 1 : -1;
  const ends = { t, y, t2, y2, label: String(number) };
  return rate.kind === "average"
    ? { ...ends, kind: "chord", at: null, number: { ...along(0.5), dx: 10, dy: -8 * aside } }
    : { ...ends, kind: "tangent", at: along(touch), number: { ...along(1), dx: -4, dy: 12 * aside } };
}

/** Widest gap between neighbours of an outline, as a share of all the time. */
const widestGap = 0.0125;

function readingsOf(
  { follow, readings, thinned, timeUnit, signalUnit }: PictureContent,
  time: (t: number) => number,
  signal: (y: number) => number,
  kept: (y: number) => number,
): PlotReading[] {
  const words = (t: number, y: number, line: number | null, why: string): string => {
    const where = line === null ? "" : `, line ${line} of the file`;
    const print = (value: number, unit: string): string =>
      printedQuantity({ text: formatQuantity(value, null, unit), unit });
    return `${print(y, signalUnit)} at ${print(t, timeUnit)}${where}${why}`;
  };
  const gap = widestGap * ((readings.at(-1)?.time ?? 0) - (readings[0]?.time ?? 0));
  let last = readings[0]?.time ?? 0;
  let piece = 0;
  const drawn = readings.map((reading): PlotReading => {
    const kind = thinned ? (reading.used ? "outline" : "outline outside") : reading.used ? "used" : "outside";
    if (reading.time - last > gap) piece++;
    last = reading.time;
    const why = reading.used ? "" : "; outside the window of the fit";
    return {
      t: time(reading.time),
      y: signal(reading.signal),
      kind,
      piece,
      line: reading.line,
      words: words(reading.time, reading.signal, reading.line, why),
    };
  });
  const { leftOut } = follow;
  if (leftOut === undefined) return drawn;
  const out = leftOut.time.values.flatMap((t, index): PlotReading[] => {
    const y = leftOut.signal.values[index];
    const line = leftOut.lines[index] ?? null;
    if (t === null || typeof y !== "number") return [];
    const why = `; left out: ${leftOut.why[index] || "no reason stated"}`;
    return [{ t: time(t), y: signal(kept(y)), kind: "left out", piece: 0, line, words: words(t, y, line, why) }];
  });
  return [...drawn, ...out];
}

function residualsIn(content: PictureContent): { time: number; residual: number; order: number }[] {
  return content.fits.flatMap(({ fit }, order) =>
    residualsOf(content.follow, fit).map((residual) => ({ ...residual, order })),
  );
}

/** A value with a power of ten taken out, by division where that is exact to the last digit. */
function scaled(value: number, power: number): number {
  return power >= 0 ? value / Number(`1e${power}`) : value * Number(`1e${-power}`);
}
