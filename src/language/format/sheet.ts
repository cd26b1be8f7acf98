import type { Parsed } from "../parse.js";
import { parseLine } from "../parseLine.js";
import type { StatementRow } from "../statements.js";
import type { LineStatement, Statement } from "../syntax.js";
import { opensSection } from "./sections.js";

/** A line of the text with what the formatter needs to know of its place. */
export interface SheetLine {
  /** offset of the line in the text */
  readonly start: number;
  /** without its line break */
  readonly text: string;
  /** its line break; "" behind the last line where none stands there */
  readonly ending: string;
  /** null where the line has no statement, or one that nothing takes */
  readonly place: LinePlace | null;
}

export interface LinePlace {
  /** headers above it */
  readonly depth: number;
  readonly row: StatementRow;
  /** whether it stands below the header of a section, such as a run */
  readonly inSection: boolean;
  /** null where the line is broken: such a line is left alone */
  readonly line: LineStatement | null;
  /** lines of the same kind that follow one another below the same header have the same number */
  readonly group: number;
}

/** The lines of a text, each with its place. A line break at the end begins no line. */
export function sheetOf({ text, index, statements }: Parsed): SheetLine[] {
  const places = new Map<number, LinePlace>();
  placeAll(statements, { depth: 0, inSection: false }, places, { group: 0 });
  const lines = index.starts.map((start, number): SheetLine => {
    const next = index.starts[number + 1] ?? text.length;
    const whole = text.slice(start, next);
    const written = whole.replace(/[\r\n]+$/, "");
    const place = places.get(start) ?? null;
    const alone = place === null || parseLine(written).statements.length === 1;
    const ending = whole.slice(written.length);
    return { start, text: written, ending, place: alone || place === null ? place : { ...place, line: null } };
  });
  const last = lines.at(-1);
  return last !== undefined && last.text === "" ? lines.slice(0, -1) : lines;
}

function placeAll(
  statements: readonly Statement[],
  where: { readonly depth: number; readonly inSection: boolean },
  places: Map<number, LinePlace>,
  counter: { group: number },
): void {
  let before: StatementRow | null = null;
  const below: Statement[] = [];
  for (const statement of statements) {
    const { row, fault } = statement.line;
    if (row === null) continue;
    if (row !== before) counter.group++;
    before = row;
    const line = fault === null ? statement.line : null;
    if (!places.has(statement.offset)) places.set(statement.offset, { ...where, row, line, group: counter.group });
    below.push(statement);
  }
  for (const { line, children } of below) {
    const inSection = where.inSection || (line.row !== null && opensSection(line.row));
    placeAll(children, { depth: where.depth + 1, inSection }, places, counter);
  }
}
