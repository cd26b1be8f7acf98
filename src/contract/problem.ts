import { catalogue, type MessageArguments, type ProblemCode } from "./catalogue.js";

/** A stretch of a text, in UTF-16 units from its start; `end` is exclusive. */
export interface Span {
  readonly start: number;
  readonly end: number;
}

/** Where a fact was written: the document and the stretch of its text. */
export interface Origin extends Span {
  readonly uri: string;
}

export type Severity = "error" | "warning" | "information";

/** One replacement in the document of the problem it mends; an empty `text` deletes, an empty span inserts. */
export interface Edit extends Span {
  readonly text: string;
}

/** A way to put a problem right. `text` is what a person reads in the title: what will stand there afterwards. */
export interface Mend {
  readonly text: string;
  readonly edits: readonly Edit[];
}

/** What is wrong, where, and how to mend it; the catalogue turns it into words. Mends stand likeliest first. */
export interface Problem {
  readonly code: ProblemCode;
  readonly severity: Severity;
  readonly args: Readonly<Record<string, string | number>>;
  readonly origin: Origin;
  readonly mend?: readonly Mend[];
}

/** Makes a problem; the arguments are those its text in the catalogue asks for. */
export function problem<Code extends ProblemCode>(
  code: Code,
  args: MessageArguments<Code>,
  origin: Origin,
  mend: readonly Mend[] = [],
): Problem {
  const bare = { code, severity: catalogue[code].severity, args, origin };
  return mend.length > 0 ? { ...bare, mend } : bare;
}

/** The mend that puts `text` in place of `span`. */
export function replacement(span: Span, text: string): Mend {
  return { text, edits: [{ start: span.start, end: span.end, text }] };
}

/** A problem found by an inner parser, which knows its own text only: spans count from the start of that text. */
export interface Fault extends Omit<Problem, "origin"> {
  readonly span: Span;
}

/** Makes a fault, as `problem` makes a problem. */
export function fault<Code extends ProblemCode>(
  code: Code,
  args: MessageArguments<Code>,
  span: Span,
  mend: readonly Mend[] = [],
): Fault {
  const bare = { code, severity: catalogue[code].severity, args, span };
  return mend.length > 0 ? { ...bare, mend } : bare;
}

/** Puts a fault into the document: its text began at `offset` of the document `uri`. */
export function placed(inner: Fault, uri: string, offset: number): Problem {
  const { span, mend, ...rest } = inner;
  const origin = { uri, start: span.start + offset, end: span.end + offset };
  if (mend === undefined) return { ...rest, origin };
  const move = (edit: Edit): Edit => ({ ...edit, start: edit.start + offset, end: edit.end + offset });
  return { ...rest, origin, mend: mend.map(({ text, edits }) => ({ text, edits: edits.map(move) })) };
}
