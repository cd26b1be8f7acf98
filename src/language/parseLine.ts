import { type Fault, fault, replacement, type Span } from "../contract/problem.js";
import type { Cursor } from "./cursor.js";
import { lexLine, type Token } from "./lexer.js";
import { fail, readParts } from "./readParts.js";
import { type StatementRow, statementByHead } from "./statements.js";
import type { LineStatement, ParsedLine } from "./syntax.js";
import { triedMends } from "./triedMends.js";

/** Lines read before, by their text: an edit re-reads only the lines it touched. */
const readBefore = new Map<string, ParsedLine>();
const mostKept = 50_000;

/** Reads one line by itself (without its line break). Never fails: what is wrong with it is in `fault`. */
export function parseLine(text: string): ParsedLine {
  const known = readBefore.get(text);
  if (known !== undefined) return known;
  if (readBefore.size >= mostKept) readBefore.clear();
  const parsed = readLine(text);
  readBefore.set(text, parsed);
  return parsed;
}

/** Reads a line whose first word is not known as if it were that of `row`: its names are not lost to the rest. */
export function parseLineAs(text: string, row: StatementRow): ParsedLine {
  return readLine(text, row);
}

/** `trying`: only whether the line is sound is wanted, not how it could be made so. */
function readLine(text: string, meant: StatementRow | null = null, trying = false): ParsedLine {
  const tokens = lexLine(text).filter((token) => token.kind !== "comment");
  const statements: LineStatement[] = [];
  let cursor: Cursor | null = null;
  let at = 0;
  while (at < tokens.length) {
    const first = tokens[at] as Token;
    cursor = { text, tokens, at: at + 1, fields: new Map(), fault: null, wanted: [], before: first.text };
    const row = rowOf(first, cursor) ?? (at === 0 ? meant : null);
    if (row === null) {
      statements.push(statement(text, null, first, cursor, tokens.length));
      break;
    }
    readParts(cursor, row.parts, row);
    const end = cursor.fault === null ? cursor.at : endAfterFault(cursor, row);
    const next = tokens[end];
    if (cursor.fault === null && next !== undefined && !beginsLine(next, row)) leftOver(cursor, next, row);
    if (cursor.fault !== null && row.slips !== undefined) cursor.fault = slip(cursor, row, first) ?? cursor.fault;
    if (!trying && cursor.fault !== null) cursor.fault = withTriedMends(cursor, cursor.fault, meant);
    const last = cursor.fault === null ? end : endAfterFault(cursor, row);
    statements.push(statement(text, row, first, cursor, last));
    at = last;
  }
  return { statements, fault: lineFault(text, statements), wanted: cursor?.wanted ?? [] };
}

/** A fault that knows no mend, with those that turn out to make its line sound. */
function withTriedMends({ text, tokens, wanted }: Cursor, fault: Fault, meant: StatementRow | null): Fault {
  const quotes = fault.code === "line-unexpected" && wanted.every(({ part }) => part === "string");
  if (fault.mend !== undefined && fault.code !== "line-left-over" && !quotes) return fault;
  const isSound = (changed: string): boolean => readLine(changed, meant, true).fault === null;
  const mend = triedMends({ text, tokens, fault, wanted }, isSound);
  return mend.length === 0 ? fault : { ...fault, mend };
}

function rowOf(first: Token, cursor: Cursor): StatementRow | null {
  if (first.kind !== "word") return null;
  const row = statementByHead.get(first.text);
  if (row !== undefined) return row;
  const small = statementByHead.get(first.text.toLowerCase());
  if (small === undefined) return null;
  cursor.fault = fault("keyword-capitals", { word: small.head }, first, [replacement(first, small.head)]);
  return small;
}

/** The first fault of the line speaks for it; where there is none, a missing line break. */
function lineFault(text: string, statements: readonly LineStatement[]): Fault | null {
  const broken = statements.find((candidate) => candidate.fault !== null);
  if (broken?.fault) return broken.fault;
  const second = statements[1];
  if (second === undefined) return null;
  const gap = { start: text.slice(0, second.head.start).trimEnd().length, end: second.head.start };
  return breakMissing(gap, second.head);
}

function breakMissing(gap: Span, head: Span & { readonly text: string }): Fault {
  const { text: word, start, end } = head;
  const mend = { text: `a new line before “${word}”`, edits: [{ ...gap, text: "\n" }] };
  return fault("line-break-missing", { word }, { start, end }, [mend]);
}

function leftOver(cursor: Cursor, next: Token, row: StatementRow): void {
  const wanted = cursor.wanted.length > 0;
  if (wanted) fail(cursor, next, row);
  if (cursor.fault !== null) return;
  const head = cursor.tokens[cursor.at + 1];
  if (next.text === "," && head !== undefined && beginsLine(head, row)) {
    const before = cursor.tokens[cursor.at - 1] as Token;
    cursor.at++;
    cursor.fault = breakMissing({ start: before.end, end: head.start }, head);
    return;
  }
  const last = cursor.tokens[cursor.tokens.length - 1] as Token;
  const span: Span = { start: next.start, end: last.end };
  cursor.fault = fault(
    "line-left-over",
    { found: cursor.text.slice(span.start, span.end), example: row.example },
    span,
    [{ text: "", edits: [{ start: (cursor.tokens[cursor.at - 1] as Token).end, end: last.end, text: "" }] }],
  );
}

function slip(cursor: Cursor, row: StatementRow, first: Token): Fault | null {
  const rest = cursor.text.slice(first.end).trim();
  const found = row.slips?.find((candidate) => candidate.pattern.test(rest));
  const last = cursor.tokens[cursor.tokens.length - 1];
  if (found === undefined || last === undefined) return null;
  return found.say({ start: first.end + leadingSpace(cursor.text.slice(first.end)), end: last.end });
}

function leadingSpace(text: string): number {
  return text.length - text.trimStart().length;
}

/** After a fault the rest of the line is passed over, down to a word that begins a line of its own. */
function endAfterFault(cursor: Cursor, row: StatementRow): number {
  let at = Math.max(cursor.at, 1);
  while (at < cursor.tokens.length && !beginsLine(cursor.tokens[at] as Token, row)) at++;
  return at;
}

/** Whether a word begins a line that could stand behind one of `row`: beside it, below it, or as a header. */
function beginsLine(token: Token, row: StatementRow): boolean {
  const next = token.kind === "word" ? statementByHead.get(token.text) : undefined;
  if (next === undefined) return false;
  return next.owners.some((owner) => owner === "file" || owner === row.opens || row.owners.includes(owner));
}

function statement(text: string, row: StatementRow | null, first: Token, cursor: Cursor, end: number): LineStatement {
  const last = cursor.tokens[end - 1] ?? first;
  return {
    row,
    head: { text: text.slice(first.start, first.end), start: first.start, end: first.end },
    fields: cursor.fields,
    span: { start: first.start, end: last.end },
    fault: cursor.fault,
  };
}
