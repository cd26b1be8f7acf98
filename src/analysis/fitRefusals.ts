import { fTail } from "../numerics/distributions.js";
import type { LeastSquaresFit } from "../numerics/leastSquares.js";
import { type Refusal, refusal } from "./fitResult.js";

/** What the checks of a first-order fit look at; readings SI. */
export interface FitData {
  readonly time: Float64Array;
  readonly value: Float64Array;
  readonly weights: Float64Array | null;
  /** parameters to be estimated */
  readonly wanted: number;
  /** the fixed start, null where it is free */
  readonly fixedStart: number | null;
  readonly species: string;
  /** +1 where the signal must rise as the reaction goes, −1 where it must fall, 0 where that is not known */
  readonly direction: number;
}

/** Why readings cannot carry a fit at all, seen before it is tried; null where they may. */
export function refuseBefore({ time, value, wanted, direction, species }: FitData): Refusal | null {
  const different = differentTimes(time);
  const need = wanted + 1;
  if (value.length < need || different < wanted) {
    const count = value.length === 1 ? "one reading" : `${value.length} readings at ${different} different times`;
    const remedy = `Use ${need} readings or more: widen the window, or read more often.`;
    return refusal("refused", `${count} cannot determine ${wanted} parameters and their scatter`, remedy);
  }
  const first = time[0] as number;
  const last = time[time.length - 1] as number;
  if (first > mostSpansAway * (last - first)) {
    return refusal(
      "refused",
      "the readings begin so long after time zero that nothing can be said of the signal there",
      "Say when the reaction began, below the data line: time zero, with that time of the file.",
    );
  }
  const trend = trendOf(time, value);
  if (direction !== 0 && trend !== 0 && trend !== direction) return wrongWay(trend, direction, species);
  if (value.every((reading) => reading === value[0])) {
    return refusal(
      "refused",
      "all readings are the same, so nothing is seen to react",
      "Check the column and the window, or follow a signal that the reaction moves.",
    );
  }
  return null;
}

/** Spans of the readings that time zero may lie before the first of them. */
const mostSpansAway = 20;

/** +1 or −1 where a straight line through the readings plainly rises or falls (t above 6), else 0. */
function trendOf(time: Float64Array, value: Float64Array): number {
  const n = time.length;
  const meanTime = time.reduce((sum, t) => sum + t, 0) / n;
  const meanValue = value.reduce((sum, y) => sum + y, 0) / n;
  let products = 0;
  let squares = 0;
  for (let i = 0; i < n; i++) {
    const off = (time[i] as number) - meanTime;
    products += off * ((value[i] as number) - meanValue);
    squares += off * off;
  }
  const slope = products / squares;
  const left = value.reduce((sum, y, i) => {
    const r = y - meanValue - slope * ((time[i] as number) - meanTime);
    return sum + r * r;
  }, 0);
  const u = Math.sqrt(left / Math.max(1, n - 2) / squares);
  return Math.abs(slope) > 6 * u ? Math.sign(slope) : 0;
}

function wrongWay(went: number, should: number, species: string): Refusal {
  return refusal(
    "refused",
    `the signal ${went > 0 ? "rises" : "falls"}, but the reaction ${should > 0 ? "forms" : "uses up"} ${species}`,
    "Check the column, what is followed and how the reaction is written.",
  );
}

/** How many times differ; times ascend. */
function differentTimes(time: Float64Array): number {
  let count = 0;
  for (let i = 0; i < time.length; i++) if (i === 0 || time[i] !== time[i - 1]) count++;
  return count;
}

/** Why the outcome of a fit is no rate constant; null where it is one. `start` and `infinity` are the fitted ends. */
export function refuseAfter(data: FitData, fit: LeastSquaresFit, start: number, infinity: number): Refusal | null {
  const flat = refuseFlat(data, fit);
  if (flat !== null) return flat;
  const change = infinity - start;
  if (data.direction !== 0 && change * data.direction < 0) {
    return wrongWay(Math.sign(change), data.direction, data.species);
  }
  if (fit.stop === "limit" || fit.stop === "stopped") {
    return refusal("limit", "the fit did not converge", "Narrow the window, or fix the start or the infinity.");
  }
  const ofRate = fit.bound[2];
  if (ofRate === "low") {
    return refusal(
      "bound",
      "the readings do not bend as a first-order approach does, so k cannot be told from the infinity",
      "Follow the reaction longer, state the infinity, or try another order.",
    );
  }
  if (ofRate === "high") {
    return refusal(
      "bound",
      "the reaction is over before the second reading",
      "Read earlier and more often, or slow the reaction down.",
    );
  }
  if (fit.stop === "singular" || fit.covariance === null) {
    return refusal(
      "singular",
      "the readings do not tell the parameters apart",
      "Follow the reaction longer, read earlier, or fix the start or the infinity.",
    );
  }
  return null;
}

/**
 * An infinity held at what stoichiometry allows is honest only while the readings do not speak against it: F test, at
 * 1 %, of the held fit against the free one.
 */
export function refuseBeyond({ value, wanted }: FitData, held: LeastSquaresFit, free: LeastSquaresFit): Refusal | null {
  const left = value.length - wanted;
  const worse = held.chiSquare - free.chiSquare;
  const exactly = free.chiSquare <= 1e-24 * held.chiSquare;
  if (!exactly && (left < 1 || (fTail(worse / (free.chiSquare / left), 1, left) ?? 1) >= 0.01)) return null;
  return refusal(
    "bound",
    "the readings run towards an infinity beyond what was taken allows",
    "Check what was taken, the unit of the column and the window, or try another order.",
  );
}

/** A number whose standard uncertainty is as large as itself is none. */
export function refuseUndetermined(k: number, uRandom: number | null): Refusal | null {
  if (uRandom === null || uRandom < k) return null;
  return refusal(
    "refused",
    "the standard uncertainty of k is as large as k itself",
    "Follow the reaction longer or with less scatter, or state the infinity.",
  );
}

/**
 * F test of the law against no change at all, at 1 %: readings that a constant describes as well show no reaction. The
 * constant is the fixed start where there is one, else the weighted mean.
 */
function refuseFlat({ value, weights, fixedStart, wanted }: FitData, fit: LeastSquaresFit): Refusal | null {
  let weight = 0;
  let sum = 0;
  for (let i = 0; i < value.length; i++) {
    const w = weights?.[i] ?? 1;
    weight += w;
    sum += w * (value[i] as number);
  }
  const level = fixedStart ?? sum / weight;
  let flat = 0;
  for (let i = 0; i < value.length; i++) {
    const off = (value[i] as number) - level;
    flat += (weights?.[i] ?? 1) * off * off;
  }
  const more = wanted - (fixedStart === null ? 1 : 0);
  const left = value.length - wanted;
  if (more < 1 || left < 1) return null;
  const gain = flat - fit.chiSquare;
  const exactly = fit.chiSquare <= 1e-24 * flat;
  if (exactly && gain > 0) return null;
  const f = gain / more / (fit.chiSquare / left);
  if (gain > 0 && (fTail(f, more, left) ?? 1) < 0.01) return null;
  return refusal(
    "refused",
    "the readings change no more than they scatter, so no reaction is seen",
    "Check the column and the window, follow the reaction longer, or follow a signal that it moves more.",
  );
}
