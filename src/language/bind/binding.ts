import { type Fault, type Origin, type Problem, placed } from "../../contract/problem.js";
import type { Species } from "../../study/reaction.js";
import type { NameKind } from "../shape.js";
import type { Statement } from "../syntax.js";

/** One place where a name is declared or used. Columns belong to a run, the other kinds to the file. */
export interface NameUse {
  readonly kind: NameKind;
  readonly name: string;
  /** the run whose name it is; null for names of the file */
  readonly run: string | null;
  readonly declares: boolean;
  readonly origin: Origin;
}

/** What binding gathers while it goes through the lines. */
export interface Binding {
  readonly uri: string;
  /** one for each code and place: a line that two runs share is not said twice */
  readonly problems: Map<string, Problem>;
  readonly uses: NameUse[];
  /** declared names */
  readonly declared: ReadonlyMap<string, Species>;
  /** names of calibrations */
  readonly calibrations: ReadonlySet<string>;
  /** names on a broken reaction line: they are not unknown */
  readonly salvaged: ReadonlySet<string>;
}

export function report(binding: Binding, problem: Problem): void {
  const key = `${problem.code} ${problem.origin.start} ${problem.origin.end}`;
  if (!binding.problems.has(key)) binding.problems.set(key, problem);
}

/** Reports a fault found in a text that began `at` units behind the start of the statement's line. */
export function reportIn(binding: Binding, statement: Statement, at: number, inner: Fault): void {
  report(binding, placed(inner, binding.uri, statement.offset + at));
}
