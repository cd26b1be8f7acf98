import type { Run } from "../contract/findings.js";
import { decimate } from "./decimate.js";

type Follow = Run["follow"][number];
export type Fit = Run["fits"][number];
export type Rate = Run["rates"][number];

/** Greatest number of readings that a picture draws. */
const most = 600;

/** A reading that is drawn; `used`: a fit rests on it. `line` of the data file, from 1; null where it is not known. */
export interface PictureReading {
  readonly time: number;
  readonly signal: number;
  readonly used: boolean;
  readonly line: number | null;
}

/** What a picture of one follow shows, in the units of its columns. */
export interface PictureContent {
  readonly follow: Follow;
  readonly timeUnit: string;
  readonly signalUnit: string;
  /** the readings drawn */
  readonly readings: readonly PictureReading[];
  /** whether `readings` are only the lowest and highest of many, drawn as a ribbon */
  readonly thinned: boolean;
  /** fits with a curve, in the order of the text; `number` counts all fits of the run, from 1 */
  readonly fits: readonly { readonly fit: Fit; readonly number: number; readonly curve: NonNullable<Fit["curve"]> }[];
  /** rates with a chord or tangent, in the order of the text; `number` counts all rates of the run, from 1 */
  readonly rates: readonly { readonly rate: Rate; readonly number: number; readonly mark: NonNullable<Rate["mark"]> }[];
}

/** What is to be drawn of a follow line of a run; null where there are no readings. */
export function pictureContent(run: Run, follow: Follow): PictureContent | null {
  const { time, signal } = follow;
  if (time === undefined || signal === undefined) return null;
  const windows = run.fits.filter((fit) => fit.follow === follow.id && fit.window !== null).map(({ window }) => window);
  const inAWindow = (t: number): boolean =>
    windows.length === 0 || windows.some((window) => window !== null && within(window, t));
  const indices = decimate(time.values, signal.values, most);
  const readings = indices.map((index) => {
    const t = time.values[index] as number;
    return {
      time: t,
      signal: signal.values[index] as number,
      used: inAWindow(t),
      line: follow.lines?.[index] ?? null,
    };
  });
  if (readings.length === 0) return null;
  return {
    follow,
    timeUnit: time.unit,
    signalUnit: signal.unit,
    readings,
    thinned: indices.length < Math.max(follow.used, numbersIn(time.values, signal.values)),
    fits: run.fits.flatMap((fit, index) =>
      fit.curve === undefined || fit.follow !== follow.id ? [] : [{ fit, number: index + 1, curve: fit.curve }],
    ),
    // Rates are those of the first signal of a run.
    rates:
      run.follow[0] === follow
        ? run.rates.flatMap((rate, index) => (rate.mark === null ? [] : [{ rate, number: index + 1, mark: rate.mark }]))
        : [],
  };
}

/** Residuals of a fit with their times, thinned out as readings are; none where the two do not belong together. */
export function residualsOf(follow: Follow, fit: Fit): { time: number; residual: number }[] {
  const { residuals } = fit;
  const times = residualTimes(follow, fit);
  if (residuals === undefined || times.length === 0) return [];
  return decimate(times, residuals.values, most).map((index) => ({
    time: times[index] as number,
    residual: residuals.values[index] as number,
  }));
}

/** Times of a fit's residuals, each of which belongs to the residual of the same index; none where they do not fit together. */
export function residualTimes({ time, signal }: Follow, { window, residuals }: Fit): number[] {
  if (window === null || residuals === undefined || time === undefined || signal === undefined) return [];
  const times = time.values.filter(
    (t, index): t is number => t !== null && signal.values[index] !== null && within(window, t),
  );
  return times.length === residuals.values.length ? times : [];
}

/** How many readings have both a time and a value. */
function numbersIn(time: readonly (number | null)[], value: readonly (number | null)[]): number {
  return time.filter((t, index) => t !== null && typeof value[index] === "number").length;
}

function within([from, to]: NonNullable<Fit["window"]>, t: number): boolean {
  return t >= from.value && t <= to.value;
}

/** What the signal axis must hold: readings, curves and marks; a wide band may leave it. */
export function* signalsOf({ readings, fits, rates }: PictureContent): Iterable<number | null> {
  for (const { signal } of readings) yield signal;
  for (const { curve } of fits) yield* curve.signal.values;
  for (const { mark } of rates) yield* mark.signal;
}
