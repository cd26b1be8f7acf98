import type { Block, Place, Run } from "../contract/findings.js";
import type { Origin } from "../contract/problem.js";
import { firstOrderAt } from "../law/firstOrder.js";
import { concentrations } from "../monitor/monitor.js";
import type { Signal } from "../monitor/signal.js";
import { fromSI, intervalFromSI } from "../quantity/conversion.js";
import type { Unit } from "../quantity/unit.js";
import type { EndContext } from "./endPoints.js";
import type { Estimates } from "./estimates.js";
import type { FirstOrderFit } from "./fitFirstOrder.js";
import type { FitFinding } from "./fitResult.js";
import { rootOfSquares } from "./parameter.js";
import type { LeftOut, ReadSignal } from "./readSignal.js";
import { resultUnits } from "./shown.js";

type FollowCurves = Pick<Run["follow"][number], "signal" | "time" | "concentration" | "u" | "lines" | "leftOut">;

/** Times, readings and concentrations of a signal for pictures, with the lines of the file they stand on. */
export function followCurves(
  { run, signal, relation }: EndContext,
  { lines, leftOut }: ReadSignal,
  place: (origin: Origin) => Place,
): FollowCurves {
  const { concentration } = resultUnits(run, signal.timeUnit, signal.unit);
  const u = signal.random === null ? null : Array.from(signal.random, (size) => intervalFromSI(size, signal.unit));
  return {
    time: block(signal.time, signal.timeUnit),
    signal: block(signal.value, signal.unit),
    concentration: block(concentrations(signal, relation), concentration),
    ...(u === null ? {} : { u: { unit: signal.unit.text, values: u } }),
    lines: Array.from(signal.rows, (row) => lines[row] as number),
    ...(leftOut.length === 0 ? {} : { leftOut: leftOutCurves(signal, lines, leftOut, place) }),
  };
}

/** Readings left out, in the order of their times. */
function leftOutCurves(
  { timeUnit, unit }: Signal,
  lines: Uint32Array,
  leftOut: readonly LeftOut[],
  place: (origin: Origin) => Place,
): NonNullable<FollowCurves["leftOut"]> {
  const sorted = [...leftOut].sort((a, b) => a.time - b.time);
  return {
    time: block(
      Float64Array.from(sorted, ({ time }) => time),
      timeUnit,
    ),
    signal: block(
      Float64Array.from(sorted, ({ value }) => value),
      unit,
    ),
    lines: sorted.map(({ row }) => lines[row] as number),
    why: sorted.map(({ by }) => by.value.reason),
    places: sorted.map(({ by }) => place(by.origin)),
  };
}

/** Points of a fitted curve: enough that the eye sees no corner. */
const curvePoints = 121;

/** The fitted curve over the readings used, and its 95 % band (random and common parts as for a parameter). */
export function curveOf(
  { signal }: EndContext,
  { fit, used, common }: FirstOrderFit,
  { variance, quantile }: Estimates,
): NonNullable<FitFinding["curve"]> {
  const [start = 0, infinity = 0, kPrime = 0] = fit.values;
  const first = Math.min(0, used.time[0] ?? 0);
  const last = used.time[used.time.length - 1] ?? 0;
  const from = (used.time[0] ?? 0) <= 0.2 * last ? first : (used.time[0] ?? 0);
  const times = Float64Array.from({ length: curvePoints }, (_, i) => from + ((last - from) * i) / (curvePoints - 1));
  const middle = new Float64Array(curvePoints);
  const low = new Float64Array(curvePoints);
  const high = new Float64Array(curvePoints);
  times.forEach((t, i) => {
    const [value, slopes] = firstOrderAt(t, start, infinity, kPrime);
    const random = quantile === null || variance === null ? 0 : quantile * Math.sqrt(variance * spread(fit, slopes));
    const shared = [...common.values()].map(
      (shift) => 1.959963984540054 * slopes.reduce((sum, slope, p) => sum + slope * (shift[p] ?? 0), 0),
    );
    const half = rootOfSquares([random, ...shared]);
    middle[i] = value;
    low[i] = value - half;
    high[i] = value + half;
  });
  return {
    time: block(times, signal.timeUnit),
    signal: block(middle, signal.unit),
    low: block(low, signal.unit),
    high: block(high, signal.unit),
  };
}

/** gᵀ (JᵀWJ)⁻¹ g over the free parameters. */
function spread({ covariance, free }: FirstOrderFit["fit"], slopes: readonly number[]): number {
  let sum = 0;
  free.forEach((a, row) => {
    free.forEach((b, column) => {
      sum += (slopes[a] ?? 0) * (covariance?.[row]?.[column] ?? 0) * (slopes[b] ?? 0);
    });
  });
  return Math.max(0, sum);
}

/** Reading minus curve at each reading used. */
export function residualCurve({ signal }: EndContext, { fit, used }: FirstOrderFit): Block {
  const residuals = fit.residuals.subarray(0, used.value.length);
  return { unit: signal.unit.text, values: Array.from(residuals, (r) => intervalFromSI(r, signal.unit)) };
}

function block(values: Float64Array, unit: Unit): Block {
  return { unit: unit.text, values: Array.from(values, (value) => fromSI(value, unit)) };
}
