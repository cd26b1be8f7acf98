import type { Problem } from "../contract/problem.js";
import { firstOrderModel } from "../law/firstOrder.js";
import { fitLeastSquares, type LeastSquaresFit, type SeparableModel, sensitivities } from "../numerics/leastSquares.js";
import type { FitWish } from "../study/run.js";
import { type EndContext, isProblem, type ResolvedEnd, resolveInfinity, resolveStart } from "./endPoints.js";
import { type FitData, refuseAfter, refuseBefore, refuseBeyond } from "./fitRefusals.js";
import type { Refusal } from "./fitResult.js";

/** A first-order fit that came out, SI; parameters in the order start, infinity, k′. */
export interface FirstOrderFit {
  readonly fit: LeastSquaresFit;
  readonly model: SeparableModel;
  readonly start: ResolvedEnd;
  readonly infinity: ResolvedEnd;
  readonly used: UsedReadings;
  /** what was fitted: the readings used, and behind them the reading at infinity where one was measured */
  readonly observed: Observed;
  /** shift of start, infinity and k′ when a common cause is off by one standard uncertainty, by cause */
  readonly common: ReadonlyMap<string, readonly [number, number, number]>;
}

/** The readings inside the window of a fit, SI. */
export interface UsedReadings {
  readonly time: Float64Array;
  readonly value: Float64Array;
  /** 1/u², null: all alike */
  readonly weights: Float64Array | null;
  /** index of each in the signal */
  readonly indices: readonly number[];
}

/** Observations of a fit and their weights, SI. */
export interface Observed {
  readonly value: Float64Array;
  readonly weights: Float64Array | null;
}

/** Fits order 1 to the signal of a follow line. A refusal is a result; a problem means that a line has to be mended. */
export function fitFirstOrder(
  context: EndContext,
  wish: FitWish,
  /** key of the species the order is in */
  of: string,
  stopped: () => boolean,
): FirstOrderFit | { refused: Refusal; used: UsedReadings } | { problem: Problem; used: UsedReadings } {
  const used = usedReadings(context, wish);
  const start = resolveStart(context, wish.start);
  const infinity = resolveInfinity(context, wish.infinity, of);
  if (isProblem(start)) return { problem: start, used };
  if (isProblem(infinity)) return { problem: infinity, used };
  const number = context.run.reaction?.numbers.get(context.follow.species.key) ?? 0;
  const data: FitData = {
    ...used,
    wanted: 1 + (start.kind === "free" ? 1 : 0) + (infinity.kind === "fixed" ? 0 : 1),
    fixedStart: start.kind === "fixed" ? start.value.value : null,
    species: context.follow.species.key,
    direction: Math.sign(number * context.relation.slope),
  };
  const before = refuseBefore(data);
  if (before !== null) return { refused: before, used };
  const measured = infinity.kind === "measured";
  const model = firstOrderModel(used.time, parameterOf("start", start), parameterOf("infinity", infinity), measured);
  const { observed, fit } = fitted(used, infinity, model, stopped);
  const after = refuseAfter(data, fit, fit.values[0] ?? 0, fit.values[1] ?? 0);
  const beyond = after ?? (fit.bound[1] === null ? null : refuseBeyond(data, fit, unbounded(used, start, stopped)));
  if (beyond !== null) return { refused: beyond, used };
  const common = commonShifts(context, used, observed, model, fit, start, infinity);
  return { fit, model, start, infinity, used, observed, common };
}

/**
 * The readings, and a measured infinity as one observation more with its own uncertainty. Where the readings state none,
 * their standard deviation about the curve stands for it, so the fit is repeated until that has settled; an infinity
 * without an uncertainty weighs as one reading.
 */
function fitted(
  used: UsedReadings,
  infinity: ResolvedEnd,
  model: SeparableModel,
  stopped: () => boolean,
): { observed: Observed; fit: LeastSquaresFit } {
  const n = used.value.length;
  const fitOf = (observed: Observed) => ({
    observed,
    fit: fitLeastSquares(observed.value, observed.weights, model, { stopped }),
  });
  if (infinity.kind !== "measured") return fitOf(used);
  const value = new Float64Array(n + 1);
  value.set(used.value);
  value[n] = infinity.value;
  const u = infinity.u === 0 ? null : infinity.u;
  const mean = used.weights === null ? 1 : used.weights.reduce((sum, w) => sum + w, 0) / n;
  const weighed = (last: number): Observed => {
    const weights = new Float64Array(n + 1).fill(1);
    if (used.weights !== null) weights.set(used.weights);
    weights[n] = last;
    return { value, weights };
  };
  if (u === null) return fitOf(weighed(mean));
  if (used.weights !== null) return fitOf(weighed(1 / (u * u)));
  let result = fitOf(weighed(1));
  for (let round = 0; round < mostRounds; round++) {
    const before = result.observed.weights?.[n] ?? 1;
    const parameters = result.fit.values.length - 1;
    const squares = result.fit.residuals.subarray(0, n).reduce((sum, r) => sum + r * r, 0);
    const variance = squares / Math.max(1, n - parameters);
    const weight = Math.max(variance, 1e-30 * u * u) / (u * u);
    result = fitOf(weighed(weight));
    if (Math.abs(weight - before) <= 1e-6 * weight) break;
  }
  return result;
}

/** Rounds after which the weight of a measured infinity has settled; each brings it about a digit nearer. */
const mostRounds = 25;

/** The same fit with nothing known of the infinity. */
function unbounded(used: UsedReadings, start: ResolvedEnd, stopped: () => boolean): LeastSquaresFit {
  const anywhere = { name: "infinity", fixed: null, low: Number.NEGATIVE_INFINITY, high: Number.POSITIVE_INFINITY };
  const model = firstOrderModel(used.time, parameterOf("start", start), anywhere);
  return fitLeastSquares(used.value, used.weights, model, { stopped });
}

function usedReadings({ signal }: EndContext, wish: FitWish): UsedReadings {
  const from = wish.window?.from.value ?? Number.NEGATIVE_INFINITY;
  const to = wish.window?.to.value ?? Number.POSITIVE_INFINITY;
  // A window that ends on a reading includes it, however its time was rounded on the way to SI.
  const slack =
    1e-9 * Math.max(Math.abs(to === Number.POSITIVE_INFINITY ? 0 : to), Math.abs(wish.window?.from.value ?? 0));
  const indices: number[] = [];
  signal.time.forEach((t, i) => {
    if (t >= from - slack && t <= to + slack) indices.push(i);
  });
  const pick = (of: Float64Array): Float64Array => Float64Array.from(indices, (i) => of[i] as number);
  const random = signal.random === null ? null : pick(signal.random);
  return {
    time: pick(signal.time),
    value: pick(signal.value),
    weights: random === null ? null : random.map((u) => 1 / (u * u)),
    indices,
  };
}

function parameterOf(name: string, end: ResolvedEnd) {
  if (end.kind === "fixed") {
    return { name, fixed: end.value.value, low: Number.NEGATIVE_INFINITY, high: Number.POSITIVE_INFINITY };
  }
  return { name, fixed: null, low: end.low, high: end.high };
}

/**
 * What each common cause does to the parameters (JCGM 100:2008, 5.1): causes of the readings shift the observations;
 * causes of a fixed end shift what is left for the others, and the end itself.
 */
function commonShifts(
  { signal }: EndContext,
  used: UsedReadings,
  observed: Observed,
  model: SeparableModel,
  fit: LeastSquaresFit,
  start: ResolvedEnd,
  infinity: ResolvedEnd,
): ReadonlyMap<string, readonly [number, number, number]> {
  const n = observed.value.length;
  const shifts = new Map<string, Float64Array>();
  const own = new Map<string, [number, number, number]>();
  const shiftOf = (name: string): Float64Array => {
    const known = shifts.get(name) ?? new Float64Array(n);
    shifts.set(name, known);
    return known;
  };
  const add = (name: string, i: number, size: number): void => {
    const total = shiftOf(name);
    total[i] = (total[i] as number) + size;
  };
  for (const { name, shift, of } of signal.common) {
    for (const [i, index] of used.indices.entries()) add(name, i, shift[index] as number);
    if (n > used.indices.length) add(name, n - 1, of(observed.value[n - 1] as number));
  }
  const basis = [new Float64Array(n), new Float64Array(n)] as const;
  const slopes = [new Float64Array(n), new Float64Array(n)] as const;
  const rate = fit.values[2] ?? 0;
  model.evaluate(Float64Array.of(rate), basis, [slopes]);
  if (signal.uTimeZero !== null) {
    // Where the reaction began later, every reading is that of an earlier time: the slope of the curve times u.
    const change = (fit.values[1] ?? 0) - (fit.values[0] ?? 0);
    for (const i of used.indices.keys())
      add("time zero", i, change * rate * (basis[0][i] as number) * signal.uTimeZero);
  }
  [start, infinity].forEach((end, which) => {
    if (end.kind !== "fixed") return;
    const ofColumn = end.raw === true ? signal.common.filter(({ name }) => name !== "blank") : [];
    const causes = [...end.value.causes, ...ofColumn.map(({ name, of }) => [name, of(end.value.value)] as const)];
    for (const [name, size] of causes) {
      const column = basis[which] as Float64Array;
      for (let i = 0; i < n; i++) add(name, i, -size * (column[i] as number));
      const direct = own.get(name) ?? [0, 0, 0];
      direct[which] = (direct[which] ?? 0) + size;
      own.set(name, direct);
    }
  });
  const names = [...shifts.keys()];
  const moved = sensitivities(fit, observed.weights, [...shifts.values()]);
  return new Map(
    names.map((name, which) => {
      const result: [number, number, number] = [...(own.get(name) ?? ([0, 0, 0] as const))];
      fit.free.forEach((parameter, place) => {
        result[parameter] = (result[parameter] ?? 0) + (moved[which]?.[place] ?? 0);
      });
      return [name, result] as const;
    }),
  );
}
