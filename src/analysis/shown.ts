import type { Q } from "../contract/findings.js";
import { combineUnits } from "../quantity/combineUnits.js";
import { fromSI, intervalFromSI } from "../quantity/conversion.js";
import { formatQuantity } from "../quantity/formatNumber.js";
import { isKind } from "../quantity/kinds.js";
import { combined, type Quantity } from "../quantity/quantity.js";
import { readUnit } from "../quantity/readUnit.js";
import { isFault } from "../quantity/shifted.js";
import type { Unit } from "../quantity/unit.js";
import type { Run } from "../study/run.js";

/** A value with its standard uncertainty, both SI, as findings show them in `unit`. */
export function shown(value: number, u: number | null, unit: Unit): Q {
  const inUnit = fromSI(value, unit);
  const uInUnit = u === null ? null : Math.abs(intervalFromSI(u, unit));
  return { value: inUnit, u: uInUnit, unit: unit.text, text: formatQuantity(inUnit, uInUnit, unit.text) };
}

/** A difference or an uncertainty, SI, in `unit`: the zero point of °C plays no part. */
export function shownDifference(difference: number, unit: Unit): Q {
  const value = intervalFromSI(difference, unit);
  return { value, u: null, unit: unit.text, text: formatQuantity(value, null, unit.text) };
}

/** A quantity of the description in the unit it was written in. */
export function shownQuantity(quantity: Quantity): Q {
  return shown(quantity.value, combined(quantity.sources), quantity.unit);
}

/** The units in which a run's results come out. */
export interface ResultUnits {
  readonly time: Unit;
  readonly concentration: Unit;
  /** of v: concentration per time */
  readonly rate: Unit;
}

/**
 * Those of the `results in` line; else time in the unit of the time column, and concentration in the unit of the first `taken` line that is a concentration, else
 * of the signal where that is one, else mol/L.
 */
export function resultUnits(run: Run, time: Unit, signal: Unit): ResultUnits {
  if (run.resultsIn !== null)
    return { ...run.resultsIn, rate: perTime(run.resultsIn.concentration, run.resultsIn.time) };
  const taken = run.taken.find(({ given }) => isKind(given.unit, "concentration"));
  const concentration = taken?.given.unit ?? (isKind(signal, "concentration") ? signal : moleOnLitre);
  return { time, concentration, rate: perTime(concentration, time) };
}

/** A unit divided by a unit of time: `mol L^-1 s^-1`. */
export function perTime(unit: Unit, time: Unit): Unit {
  return combineUnits([
    { unit, exponent: 1 },
    { unit: time, exponent: -1 },
  ]);
}

/** Unit of k of an order in all: concentration^(1 − order) / time. */
export function rateConstantUnit(order: number, { concentration, time }: ResultUnits): Unit {
  return combineUnits([
    { unit: concentration, exponent: 1 - order },
    { unit: time, exponent: -1 },
  ]);
}

const moleOnLitre: Unit = unitCalled("mol/L");

function unitCalled(text: string): Unit {
  const reading = readUnit(text);
  if (isFault(reading)) throw new Error(`the unit table lacks ${text}`);
  return reading.unit;
}
