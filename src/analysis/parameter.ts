import type { P } from "../contract/findings.js";
import { fromSI } from "../quantity/conversion.js";
import type { Unit } from "../quantity/unit.js";
import { shown } from "./shown.js";

/** An estimate, SI. */
export interface Estimate {
  readonly value: number;
  readonly uRandom: number | null;
  readonly uCommon: number | null;
  /** ends of the 95 % interval from the random part alone; null where it does not close or is not known */
  readonly randomInterval: readonly [number, number] | null;
  readonly by: "t" | "profile" | null;
  readonly fixed: boolean;
  readonly bound: "low" | "high" | null;
}

/** √Σx²: independent parts taken together (Math.hypot is not the same on every engine). */
export function rootOfSquares(parts: Iterable<number>): number {
  let sum = 0;
  for (const part of parts) sum += part * part;
  return Math.sqrt(sum);
}

/** √(u_random² + u_common²), null where neither is known. */
export function totalUncertainty({ uRandom, uCommon }: Pick<Estimate, "uRandom" | "uCommon">): number | null {
  if (uRandom === null && uCommon === null) return null;
  return rootOfSquares([uRandom ?? 0, uCommon ?? 0]);
}

/** The estimate times a number known exactly, as from k′ to k. */
export function scaled(estimate: Estimate, factor: number): Estimate {
  const times = (u: number | null): number | null => (u === null ? null : u * Math.abs(factor));
  const ends = estimate.randomInterval?.map((end) => end * factor).sort((a, b) => a - b);
  return {
    ...estimate,
    value: estimate.value * factor,
    uRandom: times(estimate.uRandom),
    uCommon: times(estimate.uCommon),
    randomInterval: ends === undefined ? null : [ends[0] as number, ends[1] as number],
  };
}

/** The estimate as findings show it in `unit`. */
export function shownParameter(estimate: Estimate, role: P["role"], unit: Unit): P {
  const inUnit = (u: number | null): number | null => (u === null ? null : shown(0, u, unit).u);
  return {
    ...shown(estimate.value, totalUncertainty(estimate), unit),
    uRandom: inUnit(estimate.uRandom),
    uCommon: inUnit(estimate.uCommon),
    uCorrelated: null,
    interval95: interval95(estimate, unit),
    by: estimate.by,
    fixed: estimate.fixed,
    role,
    bound: estimate.bound,
  };
}

/**
 * Half-widths are √(random² + (1.96 u_common)²), the random one from the t-quantile or the profile, each end by itself:
 * simulated, this holds 94.5 to 96 % where total u times t does not.
 */
function interval95({ value, uCommon, randomInterval }: Estimate, unit: Unit): [number, number] | null {
  if (randomInterval === null) return null;
  const common = 1.959963984540054 * (uCommon ?? 0);
  const low = value - rootOfSquares([value - randomInterval[0], common]);
  const high = value + rootOfSquares([randomInterval[1] - value, common]);
  return [fromSI(low, unit), fromSI(high, unit)];
}
