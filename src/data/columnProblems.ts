import type { MessageArguments, ProblemCode } from "../contract/catalogue.js";
import { type Origin, type Problem, problem } from "../contract/problem.js";
import type { Column, Columns, FaultTally } from "./columns.js";
import { valueText } from "./valueText.js";

/**
 * What is wrong with the cells of one used column (index from 0): one problem a kind of fault, at the first cell that
 * has it, with how many there are. `file` is the path as the description writes it, `origin` the column's line there.
 */
export function cellProblems(columns: Columns, column: number, file: string, origin: Origin): Problem[] {
  const header = nameOf(columns, column);
  const own = columns.tallies.filter(({ first: { kind, column: at } }) => at === column && !ofRow.has(kind));
  // a short row lacks every column from the first it lacks
  const lacking = merged(columns.tallies.filter(({ first: { kind, column: at } }) => kind === "short" && at <= column));
  const found = [...own, ...lacking].sort((a, b) => a.first.row - b.first.row);
  return found.flatMap((tally) => {
    const { row, text } = tally.first;
    const line = columns.lines[row] ?? 1;
    const place = { file, line, header, text, count: tally.count };
    return inWords(tally, place, columns, columns.columns[column]?.time ?? null, origin);
  });
}

const ofRow = new Set(["short", "long"]);

/** Tallies taken together: the first place and the sum. */
function merged(tallies: readonly FaultTally[]): FaultTally[] {
  const [some, ...others] = tallies;
  if (some === undefined) return [];
  return [
    others.reduce(
      (a, b) => ({ first: a.first.row <= b.first.row ? a.first : b.first, count: a.count + b.count }),
      some,
    ),
  ];
}

interface Place {
  readonly file: string;
  readonly line: number;
  readonly header: string;
  readonly text: string;
  readonly count: number;
}

function inWords(
  { first: { kind } }: FaultTally,
  place: Place,
  { decimalComma }: Columns,
  time: Column["time"],
  origin: Origin,
): Problem[] {
  const { text, count, ...where } = place;
  const say = <Code extends ProblemCode>(code: Code, args: MessageArguments<Code>) => [problem(code, args, origin)];
  switch (kind) {
    case "empty":
      return say("data-cell-empty", { ...where, count });
    case "short":
      return say("data-row-short", { ...where, count });
    case "thousands":
      return say("data-thousands-mark", place);
    case "other mark":
      return say(decimalComma ? "data-decimal-point" : "data-decimal-comma", { ...where, text });
    case "word":
      return say("data-cell-word", place);
    case "date order":
      return say("data-date-order", place);
    case "clock parts":
      return say("data-clock-parts", { ...where, text });
    case "time":
      return say("data-cell-time", { ...place, start: time?.start ?? "2026-11-03 10:15:30" });
    case "offset":
      return say("data-time-offset", { ...place, start: time?.start ?? "" });
    case "long":
      return [];
  }
}

/** What is wrong with the rows as such: cells beyond the last column. */
export function rowProblems(columns: Columns, file: string, origin: Origin): Problem[] {
  const [long] = columns.tallies.filter(({ first }) => first.kind === "long");
  if (long === undefined) return [];
  const { row, text } = long.first;
  const args = { file, line: columns.lines[row] ?? 1, text, columns: columns.columns.length, count: long.count };
  return [problem("data-row-long", args, origin)];
}

/**
 * Whether the time column (index from 0) runs backwards or stands still, and whether it was taken to pass midnight; cells
 * without a number are passed over.
 */
export function timeProblems(columns: Columns, column: number, file: string, origin: Origin): Problem[] {
  const found = columns.columns[column];
  if (found === undefined) return [];
  return [...midnightProblems(columns, column, found, file, origin), ...order(columns, column, found, file, origin)];
}

function midnightProblems(columns: Columns, column: number, found: Column, file: string, origin: Origin): Problem[] {
  const row = found.time?.midnightRow ?? null;
  if (row === null || found.time === null) return [];
  const line = columns.lines[row] ?? 1;
  const after = valueText(found, found.values[row] ?? 0);
  const args = { file, line, header: nameOf(columns, column), after, count: found.time.midnights };
  return [problem("data-midnight-passed", args, origin)];
}

function order(columns: Columns, column: number, found: Column, file: string, origin: Origin): Problem[] {
  const { values } = found;
  const header = nameOf(columns, column);
  let before = Number.NEGATIVE_INFINITY;
  let twice = 0;
  let firstTwice = -1;
  for (let row = 0; row < values.length; row++) {
    const time = values[row] ?? Number.NaN;
    if (Number.isNaN(time)) continue;
    const line = columns.lines[row] ?? 1;
    if (time < before) {
      const args = { file, line, header, before: valueText(found, before), after: valueText(found, time) };
      return [problem("data-time-backwards", args, origin)];
    }
    if (time === before && twice++ === 0) firstTwice = row;
    before = time;
  }
  if (twice === 0) return [];
  const line = columns.lines[firstTwice] ?? 1;
  const time = valueText(found, values[firstTwice] ?? before);
  return [problem("data-time-twice", { file, line, header, time, count: twice }, origin)];
}

/** The header on one line, or the number of the column where it has none. */
function nameOf(columns: Columns, column: number): string {
  const header = (columns.columns[column]?.header ?? "").replace(/\s+/g, " ").trim();
  return header === "" ? `column ${column + 1}` : header;
}
