import type { Problem } from "../contract/problem.js";

/** A problem that the readings showed, and the item of the findings it belongs to. */
export interface Note {
  readonly problem: Problem;
  /** `run A/fit 1`, null where it belongs to none */
  readonly item: string | null;
}

/** Gathers what analysis has to say. */
export interface Notes {
  readonly all: Note[];
}

export function note(notes: Notes, item: string | null, problem: Problem): void {
  notes.all.push({ problem, item });
}
