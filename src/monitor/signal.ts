import type { Unit } from "../quantity/unit.js";

/** A cause of uncertainty that all readings of a run share. */
export interface CommonCause {
  readonly name: string;
  /** how far each reading shifts when this cause is off by one standard uncertainty, SI, length n */
  readonly shift: Float64Array;
  /** the same for any reading, SI */
  of(reading: number): number;
}

/** What was read: usable readings in the order of the file. */
export interface Signal {
  /** times, s, ascending, length n */
  readonly time: Float64Array;
  /** standard uncertainty of the time at which the reaction began, s; null where none is stated */
  readonly uTimeZero: number | null;
  /** readings, SI, length n */
  readonly value: Float64Array;
  /** random standard uncertainty of each reading, SI, length n; null where none is stated */
  readonly random: Float64Array | null;
  readonly common: readonly CommonCause[];
  readonly timeUnit: Unit;
  readonly unit: Unit;
  /** index of the data row of each reading, length n */
  readonly rows: Uint32Array;
}
