import { type Origin, type Problem, problem } from "../contract/problem.js";
import type { CellFault, Columns } from "./columns.js";
import { wordKind } from "./numberCell.js";

/**
 * What is wrong with the cells of one used column (index from 0): one problem a kind of fault, at the first cell that
 * has it, with how many there are. `file` is the path as the description writes it, `origin` the column's line there.
 * Counts are of the faults that `Columns` kept.
 */
export function cellProblems(columns: Columns, column: number, file: string, origin: Origin): Problem[] {
  const header = nameOf(columns, column);
  const kinds = new Map<Kind, { first: CellFault; count: number }>();
  for (const cell of columns.faults) {
    const kind = kindOf(cell, column, columns.decimalComma);
    if (kind === null) continue;
    const known = kinds.get(kind);
    if (known === undefined) kinds.set(kind, { first: cell, count: 1 });
    else known.count++;
  }
  return Array.from(kinds, ([kind, { first, count }]) => {
    const place = { file, line: columns.lines[first.row] ?? 1, header };
    return inWords(kind, { ...place, text: first.text, count }, columns.decimalComma, origin);
  });
}

interface Place {
  readonly file: string;
  readonly line: number;
  readonly header: string;
  readonly text: string;
  readonly count: number;
}

function inWords(kind: Kind, place: Place, decimalComma: boolean, origin: Origin): Problem {
  const { text, count, ...where } = place;
  switch (kind) {
    case "empty":
      return problem("data-cell-empty", { ...where, count }, origin);
    case "short":
      return problem("data-row-short", { ...where, count }, origin);
    case "thousands":
      return problem("data-thousands-mark", { ...where, text }, origin);
    case "other mark":
      return problem(decimalComma ? "data-decimal-point" : "data-decimal-comma", { ...where, text }, origin);
    case "word":
      return problem("data-cell-word", { ...where, text, count }, origin);
  }
}

type Kind = "empty" | "short" | ReturnType<typeof wordKind>;

/** Null for a fault of another column. A short row lacks every column from the first it lacks. */
function kindOf(cell: CellFault, column: number, decimalComma: boolean): Kind | null {
  if (cell.kind === "short") return cell.column <= column ? "short" : null;
  if (cell.column !== column || cell.kind === "long") return null;
  return cell.kind === "empty" ? "empty" : wordKind(cell.text, decimalComma);
}

/** What is wrong with the rows as such: cells beyond the last column. */
export function rowProblems(columns: Columns, file: string, origin: Origin): Problem[] {
  const long = columns.faults.filter((cell) => cell.kind === "long");
  const [first] = long;
  if (first === undefined) return [];
  const line = columns.lines[first.row] ?? 1;
  const args = { file, line, text: first.text, columns: columns.columns.length, count: long.length };
  return [problem("data-row-long", args, origin)];
}

/** Whether the time column (index from 0) runs backwards or stands still; cells without a number are passed over. */
export function timeProblems(columns: Columns, column: number, file: string, origin: Origin): Problem[] {
  const values = columns.columns[column]?.values ?? new Float64Array(0);
  const header = nameOf(columns, column);
  let before = Number.NEGATIVE_INFINITY;
  let twice = 0;
  let firstTwice = -1;
  for (let row = 0; row < values.length; row++) {
    const time = values[row] ?? Number.NaN;
    if (Number.isNaN(time)) continue;
    const line = columns.lines[row] ?? 1;
    if (time < before) {
      const args = { file, line, header, before: String(before), after: String(time) };
      return [problem("data-time-backwards", args, origin)];
    }
    if (time === before && twice++ === 0) firstTwice = row;
    before = time;
  }
  if (twice === 0) return [];
  const line = columns.lines[firstTwice] ?? 1;
  const time = String(values[firstTwice] ?? before);
  return [problem("data-time-twice", { file, line, header, time, count: twice }, origin)];
}

/** The header on one line, or the number of the column where it has none. */
function nameOf(columns: Columns, column: number): string {
  const header = (columns.columns[column]?.header ?? "").replace(/\s+/g, " ").trim();
  return header === "" ? `column ${column + 1}` : header;
}
