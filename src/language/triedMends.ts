import { type Fault, type Mend, replacement, type Span } from "../contract/problem.js";
import { firstWords } from "./describePart.js";
import type { Token } from "./lexer.js";
import type { Part } from "./shape.js";

/** A line that stops making sense at a word, with what could have stood there. */
export interface BrokenLine {
  readonly text: string;
  readonly tokens: readonly Token[];
  readonly fault: Fault;
  readonly wanted: readonly Part[];
}

/** Signs people put between or behind words, which no line has. */
const signs = /^[=:;,.]+$/;

/**
 * Small changes at the word where a line stops making sense, of which those stay that make the whole line sound: a
 * word of the language put before it or in its place, a stray sign taken out, neighbours swapped, what stands last
 * put first. Nothing is offered where too many would do.
 */
export function triedMends(line: BrokenLine, isSound: (text: string) => boolean): Mend[] {
  for (const some of candidates(line)) {
    const found = some.filter((mend) => isSound(changed(line.text, mend)));
    if (found.length > 0) return found.length > 3 ? [] : found;
  }
  return [];
}

/** Likelier kinds of change first: the first kind of which one does speaks. */
function candidates({ text, tokens, fault, wanted }: BrokenLine): Mend[][] {
  const { span, code } = fault;
  if (code === "unit-unreadable") return [strayInUnit(text, span)];
  const at = tokens.findIndex(({ start }) => start === span.start);
  const token = tokens[at];
  if (token === undefined) return [];
  const here = { start: token.start, end: token.end };
  const before = { start: tokens[at - 1]?.end ?? token.start, end: token.end };
  const stray = signs.test(token.text) ? [{ text: "", edits: [{ ...before, text: "" }] }] : [];
  if (code === "line-left-over") return [comma(before, token), quoted(text, tokens, at, wanted), stray];
  if (code !== "line-unexpected") return [];
  const words = firstWords(wanted);
  const onlyWords = wanted.every((part) => firstWords([part]).length > 0);
  const inFront = words.map((word): Mend => ({ text: word, edits: [{ ...here, end: here.start, text: `${word} ` }] }));
  const instead = wanted.length === 1 ? words.map((word) => replacement(here, word)) : [];
  return [
    ...quoted(text, tokens, at, wanted).map((mend) => [mend]),
    onlyWords ? inFront : [],
    instead,
    stray,
    moved(text, tokens, at),
  ];
}

/** A text without its quotes: as few of the words as do. */
function quoted(text: string, tokens: readonly Token[], at: number, wanted: readonly Part[]): Mend[] {
  const rest = tokens.slice(at, at + mostWords);
  const [first] = rest;
  const could = wanted.some(({ part }) => part === "string") && rest.every(({ kind }) => kind !== "string");
  if (!could || first === undefined) return [];
  return rest.map(({ end }) => replacement({ start: first.start, end }, `"${text.slice(first.start, end)}"`));
}

/** Words of a text without quotes that are tried. */
const mostWords = 30;

/** `A, B` for `A B` and for `A and B`. */
function comma(before: Span, token: Token): Mend[] {
  if (/^(and|&|;|\+)$/.test(token.text)) return [{ text: ",", edits: [{ ...before, text: "," }] }];
  return [{ text: `, ${token.text}`, edits: [{ start: before.start, end: before.start, text: "," }] }];
}

/** `mL 50` for `50 mL`, `0.1 mol/L H2O2` for `H2O2 0.1 mol/L`. */
function moved(text: string, tokens: readonly Token[], at: number): Mend[] {
  const [token, next, last] = [tokens[at], tokens[at + 1], tokens.at(-1)];
  if (token === undefined || next === undefined || last === undefined) return [];
  const swapped = replacement({ start: token.start, end: next.end }, `${next.text} ${token.text}`);
  if (last === next) return [swapped];
  const front = text.slice(token.start, last.start).trimEnd();
  return [swapped, replacement({ start: token.start, end: last.end }, `${last.text} ${front}`)];
}

/** A unit in square brackets, or with a sign behind it. */
function strayInUnit(text: string, { start, end }: Span): Mend[] {
  const sign = text.slice(start, end);
  if (sign === ";") return [{ text: "", edits: [{ start, end, text: "" }] }];
  const inner = /^\[([^[\]]+)\]/.exec(text.slice(start));
  if (inner === null) return [];
  return [replacement({ start, end: start + inner[0].length }, inner[1] ?? "")];
}

function changed(text: string, { edits }: Mend): string {
  const [edit] = edits;
  return edit === undefined ? text : text.slice(0, edit.start) + edit.text + text.slice(edit.end);
}
