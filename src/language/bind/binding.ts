import { type Fault, type Mend, type Origin, type Problem, placed } from "../../contract/problem.js";
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
  /** the whole description */
  readonly text: string;
  /** one for each code and place: a line that two runs share is not said twice */
  readonly problems: Map<string, Problem>;
  readonly uses: NameUse[];
  /** declared names */
  readonly declared: ReadonlyMap<string, Species>;
  /** names of calibrations */
  readonly calibrations: ReadonlySet<string>;
  /** names on a broken reaction line or on a line that was lost: they are not unknown */
  readonly salvaged: ReadonlySet<string>;
  /** species whose line is broken: what they lack may stand there */
  readonly halfDeclared: ReadonlySet<string>;
}

export function report(binding: Binding, problem: Problem): void {
  const key = `${problem.code} ${problem.origin.start} ${problem.origin.end}`;
  if (!binding.problems.has(key)) binding.problems.set(key, problem);
}

/** Reports a fault found in a text that began `at` units behind the start of the statement's line. */
export function reportIn(binding: Binding, statement: Statement, at: number, inner: Fault): void {
  report(binding, placed(inner, binding.uri, statement.offset + at));
}

/** A mend that puts a new line below a line of the text, indented as its children are. */
export function lineBelow(binding: Binding, statement: Statement, line: string): Mend {
  const head = statement.offset + statement.line.head.start;
  const next = binding.text.indexOf("\n", head);
  const end = next < 0 ? binding.text.length : next > 0 && binding.text[next - 1] === "\r" ? next - 1 : next;
  const indent = " ".repeat(statement.line.head.start + 2);
  return { text: line, edits: [{ start: end, end, text: `\n${indent}${line}` }] };
}

/** A mend that puts a new line above everything but the version. */
export function lineOnTop(binding: Binding, line: string): Mend {
  const version = /^\s*ratewright[^\n]*\n/.exec(binding.text)?.[0].length ?? 0;
  return { text: line, edits: [{ start: version, end: version, text: `${line}\n` }] };
}

/** The names there are, behind the sentence that one is not among them. */
export function thereAre(names: readonly string[]): string {
  const more = names.length > 6 ? " …" : "";
  return `; there ${names.length === 1 ? "is" : "are"} ${names.slice(0, 6).join(", ")}${more}`;
}
