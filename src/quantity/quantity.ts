import type { Unit } from "./unit.js";

/**
 * One cause of uncertainty. `random` is independent from point to point; `common` is the same for all points of a
 * run (blank, scale, stock concentration …) and is propagated after a fit, never inside its weights.
 */
export interface Source {
  readonly name: string;
  readonly kind: "common" | "random";
  /** one standard uncertainty, SI */
  readonly u: number;
}

/** A number with what it is uncertain by. `value` is SI; `unit` is the one it was written in and is shown in. */
export interface Quantity {
  readonly value: number;
  readonly unit: Unit;
  readonly sources: readonly Source[];
}

/** Combined standard uncertainty of independent sources, SI; null where none is stated (JCGM 100:2008, 5.1.2). */
export function combined(sources: readonly Source[]): number | null {
  if (sources.length === 0) return null;
  return Math.sqrt(sources.reduce((sum, source) => sum + source.u * source.u, 0));
}
