import type { Q, Run as RunFinding } from "../contract/findings.js";
import { problem } from "../contract/problem.js";
import { chooseBandwidth } from "../numerics/bandwidthChoice.js";
import { log } from "../numerics/elementary.js";
import { type LocalFit, localSlope } from "../numerics/localRegression.js";
import { scatter } from "../numerics/noise.js";
import { fromSI } from "../quantity/conversion.js";
import { formatQuantity } from "../quantity/formatNumber.js";
import type { Follow, RateWish, Run } from "../study/run.js";
import { binned, unbinned } from "./bins.js";
import type { EndContext } from "./endPoints.js";
import { type Notes, note } from "./notes.js";
import { rootOfSquares } from "./parameter.js";
import { isOf, lineIn, type RunInput } from "./runInput.js";
import { perTime, type ResultUnits, resultUnits, shown, shownQuantity } from "./shown.js";
import type { Slope } from "./slope.js";

export type RateFinding = RunFinding["rates"][number];

/** The rates that a run wants of one signal, in the order of the text. */
export function ratesOf(
  run: Run,
  followed: Follow,
  context: EndContext | null,
  /** change of the signal over the whole reaction as a fit found it, SI */
  fittedChange: number | null,
  input: RunInput,
  notes: Notes,
): RateFinding[] {
  const wishes = run.rates.filter((wish) => isOf(run, followed, wish));
  const empty = wishes.map((wish) => emptyRate(wish, input));
  if (context === null) return empty;
  const { signal, relation, follow, stoichiometry } = context;
  const number = run.reaction?.numbers.get(follow.species.key) ?? 0;
  const byAmounts = stoichiometry.greatestExtent;
  const work: RateWork = {
    context,
    units: resultUnits(run, signal.timeUnit, signal.unit),
    notes,
    stopped: input.stopped,
    wholeChange: fittedChange ?? (byAmounts === null ? null : number * byAmounts.value * relation.slope),
  };
  return wishes.map((wish, index) => rateOf(work, wish, empty[index] ?? emptyRate(wish, input)));
}

function emptyRate(wish: RateWish, { place }: RunInput): RateFinding {
  return {
    id: wish.id,
    place: place(wish.origin),
    problems: [],
    kind: wish.kind,
    from: wish.kind === "average" ? shownQuantity(wish.from) : null,
    to: wish.kind === "average" ? shownQuantity(wish.to) : null,
    at: wish.kind === "instantaneous" ? shownQuantity(wish.at) : null,
    rate: null,
    species: null,
    signal: null,
    mark: null,
  };
}

/** What the rates of one signal are computed with. */
interface RateWork {
  readonly context: EndContext;
  readonly units: ResultUnits;
  readonly notes: Notes;
  readonly stopped: () => boolean;
  /** change of the signal over the whole reaction, SI; null where it is not known */
  readonly wholeChange: number | null;
}

/**
 * One rate: v = (1/ν) dc/dt by a chord between two times, by a local quadratic (tricube weights, bandwidth by
 * cross-validation) at a time, or by a quadratic over the first fifth of the reaction. Common causes cancel where
 * they cancel: an offset does, a scale does not. Where no random uncertainty is stated the scatter of the readings
 * stands for it (Gasser et al. 1986).
 */
function rateOf(work: RateWork, wish: RateWish, none: RateFinding): RateFinding {
  const times =
    wish.kind === "average" ? [wish.from.value, wish.to.value] : wish.kind === "initial" ? [] : [wish.at.value];
  if (!withinReadings(work, wish, times)) return none;
  if (wish.kind === "average") return withSlope(work, none, chord(work, wish.from.value, wish.to.value));
  if (wish.kind === "instantaneous") return withSlope(work, none, tangent(work, wish, wish.at.value));
  const initial = initialSlope(work, wish);
  const at = initial === null ? null : shown(initial.mark.time[0], null, work.context.signal.timeUnit);
  return withSlope(work, { ...none, at }, initial);
}

/** The finding with the rate that a slope of the signal stands for. */
function withSlope(work: RateWork, none: RateFinding, slope: Slope | null): RateFinding {
  if (slope === null) return none;
  const { run, follow, relation, signal } = work.context;
  const [value, u] = valueAndUncertainty(work, slope);
  const number = run.reaction?.numbers.get(follow.species.key) ?? 1;
  // The slope of the relation is a common cause of v and of the loss of the species, not of the rate of the signal.
  const shares = [...relation.causes.values()].map((share) => share * value);
  const uOfSpecies = u === null && shares.length === 0 ? null : rootOfSquares([u ?? 0, ...shares]);
  const per = (divisor: number): Q =>
    shown(value / divisor, uOfSpecies === null ? null : uOfSpecies / Math.abs(divisor), work.units.rate);
  const inTime = (t: number): number => fromSI(t, signal.timeUnit);
  const inSignal = (s: number): number => fromSI(s, signal.unit);
  const { mark } = slope;
  return {
    ...none,
    rate: per(relation.slope * number),
    species: { name: follow.species.key, rate: per(relation.slope) },
    signal: shown(value, u, perTime(signal.unit, signal.timeUnit)),
    mark: {
      time: [inTime(mark.time[0]), inTime(mark.time[1])],
      signal: [inSignal(mark.signal[0]), inSignal(mark.signal[1])],
    },
  };
}

function withinReadings({ context, notes }: RateWork, wish: RateWish, times: readonly number[]): boolean {
  const { time, timeUnit } = context.signal;
  const first = time[0];
  const last = time[time.length - 1];
  if (first === undefined || last === undefined) return tooFew(context, notes, wish, 0, 2);
  const slack = 1e-9 * Math.max(Math.abs(first), Math.abs(last));
  const outside = times.find((t) => t < first - slack || t > last + slack);
  if (outside === undefined) return true;
  const written = (t: number) => formatQuantity(fromSI(t, timeUnit), null, timeUnit.text);
  const args = { time: written(outside), from: written(first), to: written(last) };
  note(notes, wish.id, problem("rate-outside-readings", args, lineIn(context.run, wish)));
  return false;
}

function tooFew(context: EndContext, notes: Notes, wish: RateWish, count: number, need: number): false {
  note(notes, wish.id, problem("rate-few-readings", { count, need }, lineIn(context.run, wish)));
  return false;
}

/** Average slope between two times, each reading taken where it is, else on the line between its neighbours. */
function chord({ context }: RateWork, t1: number, t2: number): Slope {
  const { time } = context.signal;
  const weights = new Float64Array(time.length);
  const value = (t: number, factor: number): number => {
    let total = 0;
    for (const [index, share] of between(time, t)) {
      weights[index] = (weights[index] as number) + factor * share;
      total += share * (context.signal.value[index] as number);
    }
    return total;
  };
  const span = t2 - t1;
  const first = value(t1, -1 / span);
  const second = value(t2, 1 / span);
  const mark = { time: [t1, t2], signal: [first, second] } satisfies Slope["mark"];
  return { weights, from: 0, scatterWeights: weights, scatterFrom: 0, bend: 0, mark };
}

/** Readings and their shares that make up the signal at `t`; readings at that very time share alike. */
function between(time: Float64Array, t: number): [number, number][] {
  const slack = 1e-9 * Math.max(Math.abs(t), Math.abs(time[time.length - 1] as number));
  const there: number[] = [];
  let before = 0;
  for (let i = 0; i < time.length; i++) {
    if (Math.abs((time[i] as number) - t) <= slack) there.push(i);
    if ((time[i] as number) <= t) before = i;
  }
  if (there.length > 0) return there.map((index) => [index, 1 / there.length]);
  const left = time[before] as number;
  const right = time[before + 1] as number;
  const share = (t - left) / (right - left);
  return [
    [before, 1 - share],
    [before + 1, share],
  ];
}

function tangent(work: RateWork, wish: RateWish, t: number): Slope | null {
  const { signal } = work.context;
  const bins = binned(signal.time, signal.value, mostBins);
  const { time, value } = bins;
  const choice = chooseBandwidth(time, value, { degree: 2, stopped: work.stopped });
  const bandwidth = { neighbours: choice?.neighbours ?? time.length };
  const fit = localSlope(time, value, t, { bandwidth, degree: 2 });
  if (fit === null) {
    tooFew(work.context, work.notes, wish, time.length, 5);
    return null;
  }
  const first = Math.max(time[0] as number, t - fit.halfWidth / 2);
  const last = Math.min(time[time.length - 1] as number, t + fit.halfWidth / 2);
  const cubic = localSlope(time, value, t, { bandwidth, degree: 3 });
  return unbinned(polynomialSlope(fit, cubic, t, [first, last]), bins);
}

/** From more readings than this, neighbours are averaged first: the slope is the same, and the width is found at once. */
const mostBins = 4_000;

/**
 * The slope of a local quadratic. What it misses of the signal's bend is judged by the local cubic of the same width:
 * the difference counts as an uncertainty, with the scatter of the cubic (simulated on decays: two standard
 * uncertainties then hold 91 to 97 %; the scatter of the quadratic alone holds as little as 43 %).
 */
function polynomialSlope(fit: LocalFit, cubic: LocalFit | null, t: number, ends: [number, number]): Slope {
  const at = (x: number) => fit.value + fit.slope * (x - t);
  return {
    weights: fit.slopeCoefficients,
    from: fit.from,
    scatterWeights: (cubic ?? fit).slopeCoefficients,
    scatterFrom: (cubic ?? fit).from,
    bend: cubic === null ? 0 : cubic.slope - fit.slope,
    mark: { time: ends, signal: [at(ends[0]), at(ends[1])] },
  };
}

/** Fewest readings for a quadratic that still shows its own scatter. */
const fewest = 5;

function initialSlope(work: RateWork, wish: RateWish): Slope | null {
  const { time, value } = work.context.signal;
  if (time.length < fewest) {
    tooFew(work.context, work.notes, wish, time.length, fewest);
    return null;
  }
  const first = value[0] as number;
  const whole = work.wholeChange ?? spread(value);
  let count = time.length;
  for (let i = 1; i < time.length; i++) {
    if (Math.abs((value[i] as number) - first) > 0.2 * Math.abs(whole)) {
      count = i;
      break;
    }
  }
  count = Math.max(count, fewest);
  const covered = Math.abs(((value[count - 1] as number) - first) / whole);
  if (covered > 0.3) {
    const share = `${Math.round(100 * covered)} %`;
    note(work.notes, wish.id, problem("rate-initial-late", { share }, lineIn(work.context.run, wish)));
  }
  const start = time[0] as number;
  const end = time[count - 1] as number;
  // Time zero where the first reading is near it, else the first reading: no rate is extrapolated far.
  const at = start > 0 && start <= 0.1 * (end - start) ? 0 : start;
  const readings = [time.subarray(0, count), value.subarray(0, count)] as const;
  const options = { bandwidth: { halfWidth: end - at }, kernel: "equal" } as const;
  const fit = localSlope(...readings, at, { ...options, degree: 2 });
  if (fit === null) {
    tooFew(work.context, work.notes, wish, new Set(readings[0]).size, fewest);
    return null;
  }
  const slope = polynomialSlope(fit, null, at, [at, end]);
  const left = Math.max(0.05, 1 - covered);
  return { ...slope, bend: fit.slope * bendOfDecay * log(left) * log(left) };
}

/**
 * What a parabola over the first readings misses of the bend of a decay, as a share of the slope over (k h)², h the time
 * it spans: the parabola of least squares through t³/6 on [0, h] has the slope −0.1 h² at 0, and the third derivative is
 * k² times the first for order 1, up to three times that for order 2; twice the first stands for both.
 */
const bendOfDecay = 0.2;

function spread(value: Float64Array): number {
  let low = Number.POSITIVE_INFINITY;
  let high = Number.NEGATIVE_INFINITY;
  for (const reading of value) {
    low = Math.min(low, reading);
    high = Math.max(high, reading);
  }
  return high - low;
}

/** The slope, and its standard uncertainty from the scatter or the stated one, the bend and the common causes. */
function valueAndUncertainty({ context }: RateWork, slope: Slope): [number, number | null] {
  const { signal } = context;
  const { weights, from, scatterWeights, scatterFrom, bend } = slope;
  const value = weighted(weights, signal.value, from);
  const stated = signal.random;
  const guessed = stated === null ? scatter(signal.time, signal.value) : null;
  const common = signal.common.map(({ shift }) => weighted(weights, shift, from));
  if (stated === null && guessed === null && common.length === 0) return [value, null];
  let squares = bend * bend;
  for (let i = 0; i < scatterWeights.length; i++) {
    const u = stated === null ? (guessed ?? 0) : (stated[scatterFrom + i] as number);
    const part = (scatterWeights[i] as number) * u;
    squares += part * part;
  }
  return [value, rootOfSquares([Math.sqrt(squares), ...common])];
}

function weighted(weights: Float64Array, values: Float64Array, from: number): number {
  return weights.reduce((sum, weight, i) => sum + weight * (values[from + i] as number), 0);
}
