import type { Origin } from "../contract/problem.js";

/** Something a description states, with where it is written. */
export interface Fact<T> {
  readonly value: T;
  readonly origin: Origin;
}

/** Something of a run that findings show: `id` is stable, `block` spans its line and the lines below it. */
export interface StudyItem {
  /** `run A/fit 1` */
  readonly id: string;
  readonly origin: Origin;
  readonly block: Origin;
}
