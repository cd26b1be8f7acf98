import type { Problem } from "../contract/problem.js";
import { problem } from "../contract/problem.js";
import type { Relation } from "../monitor/monitor.js";
import type { Signal } from "../monitor/signal.js";
import { scatter } from "../numerics/noise.js";
import { sameDimension } from "../quantity/dimension.js";
import { combined, type Quantity } from "../quantity/quantity.js";
import type { Fact } from "../study/fact.js";
import type { EndPoint, Follow, Run } from "../study/run.js";
import { exact, plusTimes, type Stoichiometry, standardUncertainty, type Uncertain } from "./stoichiometry.js";

/** The signal at time zero or at infinity, as a fit takes it; SI. */
export type ResolvedEnd =
  | { readonly kind: "free"; readonly low: number; readonly high: number }
  | {
      readonly kind: "measured";
      readonly low: number;
      readonly high: number;
      readonly value: number;
      readonly u: number | null;
    }
  /** `raw`: a reading of the instrument, which shares the common causes of the column */
  | { readonly kind: "fixed"; readonly value: Uncertain; readonly raw?: boolean };

export interface EndContext {
  readonly run: Run;
  readonly follow: Follow;
  readonly signal: Signal;
  readonly relation: Relation;
  readonly stoichiometry: Stoichiometry;
}

/** The start: free unless said; fixed at its stated value, else at the stated reading, else at what was taken. */
export function resolveStart(context: EndContext, wish: EndPoint): ResolvedEnd | Problem {
  if (wish.kind !== "fixed") return { kind: "free", low: Number.NEGATIVE_INFINITY, high: Number.POSITIVE_INFINITY };
  if (wish.value !== null) return statedEnd(context, "start", wish.value, wish.origin, false);
  const reading = context.follow.readingAtStart;
  if (reading !== null) return statedEnd(context, "start", reading.value, reading.origin, true);
  const { follow, stoichiometry } = context;
  const initial = stoichiometry.initial.get(follow.species.key);
  if (initial !== undefined) return { kind: "fixed", value: signalOf(context, initial) };
  return unknownEnd(context, "start", wish.origin, `nothing is stated of ${follow.species.key}`);
}

/**
 * The infinity of a law of first order in the species `of`: fixed at its stated value, else by stoichiometry; by
 * stoichiometry too where nothing is said and `of` itself is followed; else free, within what stoichiometry allows where
 * that is known (see `slackOf`). A law runs towards the end of its own species, be it one that never comes because
 * another runs out first.
 */
export function resolveInfinity(context: EndContext, wish: EndPoint, of: string): ResolvedEnd | Problem {
  const { follow, stoichiometry } = context;
  const exhausted = follow.species.key === of && stoichiometry.limiting !== null;
  const reading = follow.readingAtInfinity;
  if (wish.kind === "measured" || (wish.kind === "default" && reading !== null)) {
    if (reading !== null) return measuredEnd(context, reading);
    const origin = wish.kind === "measured" ? wish.origin : follow.origin;
    return unknownEnd(context, "infinity", origin, "no reading at infinity is stated");
  }
  if (wish.kind === "fixed") {
    if (wish.value !== null) return statedEnd(context, "infinity", wish.value, wish.origin, false);
    if (reading !== null) return statedEnd(context, "infinity", reading.value, reading.origin, true);
    if (exhausted) return { kind: "fixed", value: signalOf(context, exact(0)) };
    const end = endConcentration(context, of);
    if (end !== null) return { kind: "fixed", value: signalOf(context, end) };
    const missing = stoichiometry.missing.map((key) => `nothing is stated of ${key}`).join(", ");
    return unknownEnd(context, "infinity", wish.origin, missing);
  }
  if (wish.kind === "default" && exhausted) return { kind: "fixed", value: signalOf(context, exact(0)) };
  return { kind: "free", ...boundsOfInfinity(context, of) };
}

/** The signal when the limiting reactant `of` is used up, SI; null where it does not follow, or another is limiting. */
export function stoichiometricInfinity(context: EndContext, of: string): Uncertain | null {
  if (context.stoichiometry.limiting !== of) return null;
  const end = endConcentration(context, of);
  return end === null ? null : signalOf(context, end);
}

/** The signal at the start by what was taken, SI; null where nothing is stated of the followed species. */
export function stoichiometricStart(context: EndContext): Uncertain | null {
  const initial = context.stoichiometry.initial.get(context.follow.species.key);
  return initial === undefined ? null : signalOf(context, initial);
}

/** Concentration of the followed species when the species `of` is used up. */
function endConcentration({ run, follow, stoichiometry }: EndContext, of: string): Uncertain | null {
  if (follow.species.key === of) return exact(0);
  const initial = stoichiometry.initial.get(follow.species.key);
  const number = run.reaction?.numbers.get(follow.species.key);
  const ofInitial = stoichiometry.initial.get(of);
  const ofNumber = run.reaction?.numbers.get(of);
  if (initial === undefined || number === undefined || ofInitial === undefined || ofNumber === undefined) return null;
  return plusTimes(initial, -number / ofNumber, ofInitial);
}

function boundsOfInfinity(context: EndContext, of: string): { low: number; high: number } {
  const { run, follow } = context;
  const none = { low: Number.NEGATIVE_INFINITY, high: Number.POSITIVE_INFINITY };
  const end = context.stoichiometry.limiting === of ? endConcentration(context, of) : null;
  const number = run.reaction?.numbers.get(follow.species.key) ?? 0;
  if (end === null || number === 0) return none;
  const limit = signalOf(context, end);
  const slack = slackOf(context, limit);
  const rises = number * context.relation.slope > 0;
  return rises ? { ...none, high: limit.value + slack } : { ...none, low: limit.value - slack };
}

/**
 * How far an infinity may honestly lie beyond what stoichiometry allows: three standard uncertainties of what was taken
 * and of what all readings share, twice the scatter of a reading, and the rounding of the numbers.
 */
function slackOf({ signal }: EndContext, limit: Uncertain): number {
  const { value, time, random } = signal;
  const scattered = random === null ? (scatter(time, value) ?? 0) : random.reduce((most, u) => Math.max(most, u), 0);
  const size = value.reduce((most, reading) => Math.max(most, Math.abs(reading)), 0);
  return 3 * (standardUncertainty(limit) ?? 0) + 3 * commonSize(signal) + 2 * scattered + 1e-6 * size;
}

/** Greatest shift that the common causes give any reading. */
function commonSize(signal: Signal): number {
  return signal.common.reduce((sum, { shift }) => sum + shift.reduce((most, s) => Math.max(most, Math.abs(s)), 0), 0);
}

function signalOf({ relation }: EndContext, concentration: Uncertain): Uncertain {
  const signal = plusTimes(exact(relation.zero), relation.slope, concentration);
  const size = relation.slope * concentration.value;
  const ofSlope = new Map([...relation.causes].map(([name, share]) => [name, share * size] as const));
  return plusTimes(signal, 1, { value: 0, causes: ofSlope });
}

function statedEnd(
  context: EndContext,
  end: "start" | "infinity",
  quantity: Quantity,
  origin: Problem["origin"],
  /** as the instrument shows it, the blank in it */
  raw: boolean,
): ResolvedEnd | Problem {
  const wrong = wrongUnit(context, end, quantity, origin);
  if (wrong !== null) return wrong;
  const u = combined(quantity.sources);
  const stated: Uncertain = { value: quantity.value, causes: new Map(u === null ? [] : [[`${end} stated`, u]]) };
  return { kind: "fixed", value: raw ? plusTimes(stated, -1, blankOf(context)) : stated, raw };
}

/** A reading at infinity counts as an observation with its uncertainty; without one, as one reading more. */
function measuredEnd(context: EndContext, { value: quantity, origin }: Fact<Quantity>): ResolvedEnd | Problem {
  const wrong = wrongUnit(context, "infinity", quantity, origin);
  if (wrong !== null) return wrong;
  const anywhere = { low: Number.NEGATIVE_INFINITY, high: Number.POSITIVE_INFINITY };
  return {
    kind: "measured",
    ...anywhere,
    value: quantity.value - blankOf(context).value,
    u: combined(quantity.sources),
  };
}

/** What the instrument shows without reaction: it is in stated readings as it is in the column. */
function blankOf({ follow }: EndContext): Uncertain {
  const blank = follow.blank?.value;
  const u = blank === undefined ? null : combined(blank.sources);
  return { value: blank?.value ?? 0, causes: new Map(u === null ? [] : [["blank", u]]) };
}

function wrongUnit(
  { follow, signal }: EndContext,
  end: "start" | "infinity",
  quantity: Quantity,
  origin: Problem["origin"],
): Problem | null {
  if (sameDimension(quantity.unit.dimension, signal.unit.dimension)) return null;
  const args = { end, unit: quantity.unit.text, column: follow.column, columnUnit: signal.unit.text };
  return problem("fit-end-wrong-unit", args, origin);
}

function unknownEnd(
  { follow }: EndContext,
  end: "start" | "infinity",
  origin: Problem["origin"],
  missing: string,
): Problem {
  return problem("fit-end-unknown", { end, species: follow.species.key, missing }, origin);
}

export function isProblem(end: ResolvedEnd | Problem): end is Problem {
  return "code" in end;
}
