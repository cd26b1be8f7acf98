import { problem } from "../contract/problem.js";
import { halfLife } from "../law/firstOrder.js";
import { chiSquareTail } from "../numerics/distributions.js";
import { expm1, log } from "../numerics/elementary.js";
import { fromSI } from "../quantity/conversion.js";
import { formatNumber, formatQuantity } from "../quantity/formatNumber.js";
import type { Species } from "../study/reaction.js";
import type { FitWish } from "../study/run.js";
import { type EndContext, stoichiometricInfinity } from "./endPoints.js";
import { type Estimates, estimatesOf } from "./estimates.js";
import { sayDifferences } from "./fitDifferences.js";
import type { FirstOrderFit } from "./fitFirstOrder.js";
import { refuseUndetermined } from "./fitRefusals.js";
import type { FitFinding, Refusal } from "./fitResult.js";
import { type Notes, note } from "./notes.js";
import { scaled, shownParameter, totalUncertainty } from "./parameter.js";
import { residualFindings } from "./residualFindings.js";
import { lineIn } from "./runInput.js";
import { type ResultUnits, rateConstantUnit, shown } from "./shown.js";
import { standardUncertainty } from "./stoichiometry.js";

/** A fit as findings show it, or why it is none after all. What a person should know of it goes into the notes. */
export function judgeFit(
  context: EndContext,
  wish: FitWish,
  species: Species,
  result: FirstOrderFit,
  empty: FitFinding,
  units: ResultUnits,
  notes: Notes,
  stopped: () => boolean,
): { finding: FitFinding; estimates: Estimates } | Refusal {
  const { fit, used } = result;
  const estimates = estimatesOf(result, stopped);
  const undetermined = refuseUndetermined(estimates.kPrime.value, estimates.kPrime.uRandom);
  if (undetermined !== null) return undetermined;
  const { signal } = context;
  const number = Math.abs(context.run.reaction?.numbers.get(species.key) ?? 1);
  const kUnit = rateConstantUnit(1, units);
  const k = shownParameter(scaled(estimates.kPrime, 1 / number), "rate constant", kUnit);
  const kPrime = estimates.kPrime.value;
  const life = halfLife(kPrime);
  const u = totalUncertainty(estimates.kPrime);
  const first = used.time[0] ?? 0;
  const last = used.time[used.time.length - 1] ?? 0;
  const halfLives = (kPrime * (last - first)) / log(2);
  const finding: FitFinding = {
    ...empty,
    degreesOfFreedom: fit.degreesOfFreedom,
    parameters: {
      k,
      start: shownParameter(estimates.start, "start", signal.unit),
      infinity: shownParameter(estimates.infinity, "infinity", signal.unit),
    },
    kPrime: shownParameter(estimates.kPrime, "rate constant", kUnit),
    covariance: covarianceOf(result, estimates, number, context, units),
    budget: budgetOf(result, estimates),
    halfLife: {
      ...shown(life, u === null ? null : (life * u) / kPrime, signal.timeUnit),
      species: species.key,
    },
    conversion: -expm1(-kPrime * last),
    ...residualFindings(result, signal.unit),
    condition: fit.condition,
    iterations: fit.iterations,
    stop: estimates.infinity.bound === null ? "converged" : "bound",
    verdict: "",
  };
  warn(context, wish, result, estimates, finding, halfLives, notes);
  sayDifferences(context, wish, species.key, result, estimates, notes);
  const verdict = verdictOf(finding, halfLives) + besideVerdict(context, species.key, result);
  return { finding: { ...finding, verdict }, estimates };
}

/** Covariance of what was fitted, random and common together, in the units of the parameters; k, start, infinity. */
function covarianceOf(
  { fit, common }: FirstOrderFit,
  { variance }: Estimates,
  number: number,
  { signal }: EndContext,
  units: ResultUnits,
): FitFinding["covariance"] {
  if (fit.covariance === null || variance === null) return null;
  const order = [2, 0, 1].filter((index) => fit.free.includes(index));
  const kUnit = rateConstantUnit(1, units).factor * number;
  const factor = [1 / signal.unit.factor, 1 / signal.unit.factor, 1 / kUnit];
  const matrix = order.map((a) =>
    order.map((b) => {
      const random = (fit.covariance?.[fit.free.indexOf(a)]?.[fit.free.indexOf(b)] ?? 0) * variance;
      let shared = 0;
      for (const shift of common.values()) shared += (shift[a] ?? 0) * (shift[b] ?? 0);
      return (random + shared) * (factor[a] ?? 1) * (factor[b] ?? 1);
    }),
  );
  return { names: order.map((index) => ["start", "infinity", "k"][index] ?? ""), matrix };
}

/** Shares of the variance of k by cause. */
function budgetOf({ common, used }: FirstOrderFit, { kPrime }: Estimates): FitFinding["budget"] {
  const parts: { source: string; kind: "common" | "random"; variance: number }[] = [];
  if (kPrime.uRandom !== null) {
    const source = used.weights === null ? "scatter of the readings" : "random uncertainty of the readings";
    parts.push({ source, kind: "random", variance: kPrime.uRandom * kPrime.uRandom });
  }
  for (const [source, shift] of common) parts.push({ source, kind: "common", variance: shift[2] * shift[2] });
  const total = parts.reduce((sum, { variance }) => sum + variance, 0);
  if (!(total > 0)) return [];
  // What cancels leaves rounding only, and is no part.
  const real = parts.filter(({ variance }) => variance > 1e-15 * total);
  return real.map(({ source, kind, variance }) => ({ source, kind, share: variance / total }));
}

function warn(
  { signal, run }: EndContext,
  wish: FitWish,
  { infinity, fit, used }: FirstOrderFit,
  estimates: Estimates,
  finding: FitFinding,
  halfLives: number,
  notes: Notes,
): void {
  const place = lineIn(run, wish);
  if (infinity.kind === "free" && halfLives < 3) {
    const share = (100 * (totalUncertainty(estimates.kPrime) ?? 0)) / estimates.kPrime.value;
    const args = { halfLives: halfLives.toFixed(1), percent: `${share.toPrecision(2)} %` };
    const code = halfLives < 2 ? "fit-very-few-half-lives" : "fit-few-half-lives";
    note(notes, wish.id, problem(code, args, place));
  }
  if (estimates.infinity.bound !== null) {
    const limit = formatQuantity(fromSI(estimates.infinity.value, signal.unit), null, signal.unit.text);
    note(notes, wish.id, problem("fit-infinity-at-bound", { limit }, place));
  }
  const p = used.weights === null ? null : chiSquareTail(fit.chiSquare, fit.degreesOfFreedom);
  if (p !== null && finding.reducedChiSquare !== null && (p < 0.001 || p > 0.999)) {
    const args = { chiSquare: finding.reducedChiSquare.toPrecision(3) };
    note(notes, wish.id, problem(p < 0.001 ? "fit-scatter-large" : "fit-scatter-small", args, place));
  }
  const first = used.time[0] ?? 0;
  if (first > (used.time[used.time.length - 1] ?? 0) - first) {
    const { timeUnit } = signal;
    const args = { first: formatQuantity(fromSI(first, timeUnit), null, timeUnit.text) };
    note(notes, wish.id, problem("time-zero-far", args, place));
  }
  const runs = finding.tests.find(({ name }) => name === "runs test");
  if (runs?.p !== undefined && runs.p !== null && runs.p < 0.01 && runs.statistic < 0) {
    note(notes, wish.id, problem("fit-residuals-run", { p: formatNumber(Number(runs.p.toPrecision(2)), null) }, place));
  }
}

function verdictOf(finding: FitFinding, halfLives: number): string {
  const k = finding.parameters["k"];
  if (k === undefined) return "";
  const share = k.u === null ? "" : `, known to ${((100 * k.u) / k.value).toPrecision(2)} %`;
  const interval =
    k.interval95 === null
      ? k.by === "profile"
        ? "; its 95 % interval does not close"
        : ""
      : ` (95 %: ${k.interval95.map((end) => formatNumber(Number(end.toPrecision(4)), null)).join(" to ")})`;
  const span = `${finding.points} readings over ${halfLives.toPrecision(2)} half-lives`;
  return `k = ${k.text}${interval}${share}, from ${span}.`;
}

/** What stands beside a verdict: the infinity by stoichiometry where another was fitted, and a doubt about the equation. */
function besideVerdict(context: EndContext, of: string, { infinity }: FirstOrderFit): string {
  const end = infinity.kind === "fixed" ? null : stoichiometricInfinity(context, of);
  const { unit } = context.signal;
  const said =
    end === null ? "" : ` By stoichiometry the infinity is ${shown(end.value, standardUncertainty(end), unit).text}.`;
  const balanced = context.run.reaction?.balance !== "unbalanced";
  return balanced ? said : `${said} The equation does not balance: k will change with its coefficients.`;
}
