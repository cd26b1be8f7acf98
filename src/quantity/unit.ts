import type { Dimension } from "./dimension.js";

/** One factor of a unit: a symbol with its prefix, in ASCII (`mol`, `mL`, `degC`), and its exponent. */
export interface UnitPart {
  readonly symbol: string;
  readonly exponent: number;
}

/**
 * A unit of measurement. A value in this unit becomes SI by `value × factor + offset`; `offset` is not zero only for
 * affine temperatures (°C), which convert so as points, never as differences.
 */
export interface Unit {
  readonly dimension: Dimension;
  readonly factor: number;
  readonly offset: number;
  /** what it is written of, in order; empty for a plain number */
  readonly parts: readonly UnitPart[];
  /** SI Brochure, ASCII: `mol L^-1 s^-1`; "" for a plain number */
  readonly text: string;
}
