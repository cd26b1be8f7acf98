import type { Run } from "../contract/findings.js";
import { itemWords, type Name } from "./names.js";
import { recordedFit } from "./recordedFit.js";
import { maybeQuantity, recordedQuantity } from "./recordedQuantity.js";
import type { RecordedFollow, RecordedRate, RecordedRun } from "./recordShape.js";
import { roundedDecimals } from "./rounded.js";

/** A run as a record has it. */
export function recordedRun(run: Run, name: Name): RecordedRun {
  const { id, title, equation } = run;
  return {
    id,
    title,
    equation,
    taken: run.taken.flatMap((taken) => recordedTaken(id, taken, name)),
    conditions: Object.entries(run.conditions).map(([key, condition]) => ({
      ...recordedQuantity(name(id, key), condition),
      name: key,
    })),
    follow: run.follow.map((follow) => recordedFollow(follow, name)),
    rates: run.rates.map((rate) => recordedRate(rate, name)),
    fits: run.fits.map((fit) => recordedFit(fit, name)),
    comparisons: run.comparisons.map(({ follow, fits, weights, decision }) => ({
      what: name(follow, "comparison of laws"),
      fits: fits.map(itemWords),
      weights: weights.map((weight) => roundedDecimals(weight)),
      decision,
    })),
    suitability: run.suitability.map(({ monitor, verdict }) => ({
      what: name(id, `${monitor} as monitor`),
      monitor,
      verdict,
    })),
    cautions: run.cautions.map(({ code, species }) => ({
      what: name(id, `caution ${[code, ...species].join(" ")}`),
      code,
      species,
    })),
  };
}

/** The amount, and behind it what it makes at the start where that is known. */
function recordedTaken(id: string, taken: Run["taken"][number], name: Name): RecordedRun["taken"] {
  const { species, given, stock, concentration, limiting } = taken;
  const amount = {
    ...recordedQuantity(name(id, `${species} taken`), given),
    species,
    ...(stock === null ? {} : { stock }),
    ...(limiting ? { limiting } : {}),
  };
  if (concentration === null) return [amount];
  return [amount, { ...recordedQuantity(name(id, `${species} at the start`), concentration), species, start: true }];
}

function recordedFollow(follow: Run["follow"][number], name: Name): RecordedFollow {
  const { id, species, monitor, column, timeColumn, points, used, sources } = follow;
  return {
    id,
    species,
    monitor,
    column,
    timeColumn,
    readings: { what: name(id, "readings"), points, used },
    sources: sources.map((source) => ({
      ...recordedQuantity(name(id, source.name), source.u),
      kind: source.kind,
    })),
  };
}

function recordedRate(rate: Run["rates"][number], name: Name): RecordedRate {
  const { id, kind, species } = rate;
  return {
    id,
    kind,
    from: maybeQuantity(() => name(id, "from"), rate.from),
    to: maybeQuantity(() => name(id, "to"), rate.to),
    at: maybeQuantity(() => name(id, "at"), rate.at),
    rate: maybeQuantity(() => name(id, "v"), rate.rate),
    species:
      species === null
        ? null
        : { ...recordedQuantity(name(id, `dc(${species.name})/dt`), species.rate), name: species.name },
    signal: maybeQuantity(() => name(id, "slope of the signal"), rate.signal),
  };
}
