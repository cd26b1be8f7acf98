import type { Fault, Span } from "../contract/problem.js";
import type { Token } from "./lexer.js";
import type { Part } from "./shape.js";
import type { Field } from "./syntax.js";

/** Where the reading of a line stands. */
export interface Cursor {
  readonly text: string;
  readonly tokens: readonly Token[];
  at: number;
  readonly fields: Map<string, Field>;
  fault: Fault | null;
  /** parts that could come at `at` but were not there */
  wanted: Part[];
  /** the words read last, for messages */
  before: string;
}

/** Keeps what was read under its label. */
export function keep(cursor: Cursor, label: string, field: Field): void {
  cursor.fields.set(label, field);
}

/** The text from a token up to the one before `end`, with its place. */
export function slice(cursor: Cursor, first: Token, end: number): { text: string; span: Span } {
  const last = cursor.tokens[end - 1] ?? first;
  return { text: cursor.text.slice(first.start, last.end), span: { start: first.start, end: last.end } };
}

/** From a token to the last one read. */
export function spanOf(cursor: Cursor, first: Token): Span {
  return { start: first.start, end: (cursor.tokens[cursor.at - 1] ?? first).end };
}

/** The text of the tokens from one to the one before another. */
export function textOf(cursor: Cursor, from: number, to: number): string {
  return slice(cursor, cursor.tokens[from] as Token, to).text;
}
