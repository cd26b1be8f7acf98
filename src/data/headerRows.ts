import type { Unit } from "../quantity/unit.js";
import { literalCells, singleRecord } from "./csvRecords.js";
import { isBlankLine, lineLook } from "./lineLook.js";
import { lookOf } from "./numberCell.js";
import type { TextLine } from "./textLines.js";

/** Splits a header cell into the name and the unit it states. */
export type HeaderUnitReader = (header: string) => {
  readonly name: string;
  readonly unit: Unit | null;
  readonly unread: string | null;
};

/** The header row, and the row of units under it where there is one; both as the cells of the file. */
export interface HeaderRows {
  readonly headers: readonly string[];
  readonly units: readonly string[] | null;
  /** line of the header row, from 1 */
  readonly line: number;
}

/**
 * The header above the body of a table: the last row before it, or the last but one where the last holds nothing but
 * units. `before` are the lines above the body, at most some dozens, in order. Rows that begin with a number are rows of
 * the body whatever else they hold; `start` is the line of the first of them, null where there is none. `rows` is null
 * where no header is found, or where a single cell stands over a body of several columns (a title, not a header).
 */
export function headerAbove(
  text: string,
  before: readonly TextLine[],
  delimiter: string,
  width: number,
  readUnit: HeaderUnitReader,
): { readonly rows: HeaderRows | null; readonly start: TextLine | null } {
  let start: TextLine | null = null;
  let last = recordUpTo(text, before, before.length, delimiter, width);
  while (last !== null && last.cells.length >= Math.min(2, width) && beginsWithReading(last.cells)) {
    start = before[last.first] ?? start;
    last = recordUpTo(text, before, last.first, delimiter, width);
  }
  if (last === null || (last.cells.length < 2 && width > 1)) return { rows: null, start };
  const above = recordUpTo(text, before, last.first, delimiter, width);
  if (above?.adjacent && isUnitsUnder(above.cells, last.cells, delimiter, width, readUnit)) {
    return { rows: { headers: above.cells, units: last.cells, line: lineNumber(before, above.first) }, start };
  }
  return { rows: { headers: last.cells, units: null, line: lineNumber(before, last.first) }, start };
}

function beginsWithReading(cells: readonly string[]): boolean {
  const { kind } = lookOf(cells[0] ?? "");
  return kind === "number" || kind === "time";
}

/** The header row that begins with the first of `lines`; `next` is the index of the line below it and its row of units. */
export function headerAt(
  text: string,
  lines: readonly TextLine[],
  delimiter: string,
  width: number,
  readUnit: HeaderUnitReader,
): { rows: HeaderRows; next: number } | null {
  const first = recordFrom(text, lines, 0, delimiter, width);
  if (first === null) return null;
  const second = recordFrom(text, lines, first.next, delimiter, width);
  const line = lineNumber(lines, 0);
  if (second !== null && isUnitsUnder(first.cells, second.cells, delimiter, width, readUnit)) {
    return { rows: { headers: first.cells, units: second.cells, line }, next: second.next };
  }
  return { rows: { headers: first.cells, units: null, line }, next: first.next };
}

function lineNumber(lines: readonly TextLine[], index: number): number {
  return lines[index]?.number ?? 1;
}

/**
 * The record that ends with the last line before index `end` that is not blank. It grows upwards until its quotes
 * match, because a header cell may go over several lines; where they never match, quotes are taken for plain characters.
 */
function recordUpTo(
  text: string,
  lines: readonly TextLine[],
  end: number,
  delimiter: string,
  width: number,
): { cells: string[]; first: number; adjacent: boolean } | null {
  let index = end - 1;
  while (index >= 0 && isBlankLine(lineText(text, lines[index]), delimiter)) index--;
  const last = lines[index];
  if (last === undefined) return null;
  const adjacent = index === end - 1;
  if (delimiter === " ") return { cells: blankSeparated(lineText(text, last), width), first: index, adjacent };
  for (let first = index; first >= 0 && first > index - longestRecord; first--) {
    const cells = singleRecord(text.slice(lines[first]?.start, last.end), delimiter);
    if (cells !== null) return { cells: withoutEmptyEnd(cells), first, adjacent };
  }
  return { cells: withoutEmptyEnd(literalCells(lineText(text, last), delimiter)), first: index, adjacent };
}

/** The record that begins with line `first`; it grows downwards until its quotes match. */
function recordFrom(
  text: string,
  lines: readonly TextLine[],
  first: number,
  delimiter: string,
  width: number,
): { cells: string[]; next: number } | null {
  const begin = lines[first];
  if (begin === undefined) return null;
  if (delimiter === " ") return { cells: blankSeparated(lineText(text, begin), width), next: first + 1 };
  for (let last = first; last < lines.length && last < first + longestRecord; last++) {
    const cells = singleRecord(text.slice(begin.start, lines[last]?.end), delimiter);
    if (cells !== null) return { cells: withoutEmptyEnd(cells), next: last + 1 };
  }
  return { cells: withoutEmptyEnd(literalCells(lineText(text, begin), delimiter)), next: first + 1 };
}

/** Lines that one header row may go over. */
const longestRecord = 32;

function lineText(text: string, line: TextLine | undefined): string {
  return line === undefined ? "" : text.slice(line.start, line.end);
}

function withoutEmptyEnd(cells: string[]): string[] {
  let length = cells.length;
  while (length > 0 && cells[length - 1] === "") length--;
  return cells.slice(0, length);
}

/**
 * Header cells separated by blanks. A header such as `t / s` holds blanks itself, so wider gaps are tried first, then
 * single blanks, then single blanks that keep `/ s`, `(s)` and `[s]` with the name before them.
 */
function blankSeparated(line: string, width: number): string[] {
  const tokens = Array.from(line.matchAll(/"([^"]*)"|[^\s"]+/g), (match) => match[1] ?? match[0]);
  const wide = line
    .trim()
    .split(/\s{2,}|\t/)
    .map((cell) => cell.replace(/^"(.*)"$/, "$1"));
  if (wide.length === width) return wide;
  if (tokens.length === width) return tokens;
  const joined = line
    .trim()
    .replace(/\s+\/\s+/g, "\u0000/\u0000")
    .replace(/\s+(?=[[(])/g, "\u0000")
    .split(/\s+/)
    .map((cell) => cell.replaceAll("\u0000", " "));
  return joined.length === width ? joined : tokens;
}

/**
 * Whether `lower` is a row of units under the names `upper`: as many names as columns, all of them words, and every
 * cell of `lower` a unit, in brackets or not, the form of a clock time, empty, or the sign for none; one at least is a
 * unit.
 */
function isUnitsUnder(
  upper: readonly string[],
  lower: readonly string[],
  delimiter: string,
  width: number,
  readUnit: HeaderUnitReader,
): boolean {
  if (upper.length !== width || lower.length > width || upper.some((name) => name === "")) return false;
  if (upper.some((name) => lineLook(name, delimiter === " " ? ";" : delimiter, 2).kind !== "text")) return false;
  const stated = lower
    .map(bareUnit)
    .filter((unit) => !/^(?:|-|–|1|[-a-z/. ]*\bh{1,2}:m{1,2}\S*|m{1,2}:s{1,2}\S*)$/i.test(unit));
  // t / s and V / mL are a time and a volume with their units, though they could be tonnes and volts by something
  if (stated.every((cell) => readUnit(cell).unit !== null)) return false;
  return stated.length > 0 && stated.every((unit) => readUnit(`x / ${unit}`).unit !== null);
}

/** A cell of a row of units without its brackets. */
export function bareUnit(cell: string): string {
  const bracketed = /^(?:\((.*)\)|\[(.*)\])$/.exec(cell.trim());
  return (bracketed?.[1] ?? bracketed?.[2] ?? cell).trim();
}
