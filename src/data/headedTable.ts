import { type HeaderUnitReader, headerAt } from "./headerRows.js";
import { cellsOf, isBlankLine, lineLook } from "./lineLook.js";
import type { Block } from "./numericBlocks.js";
import type { Table } from "./table.js";
import { linesFrom, type TextLine } from "./textLines.js";

/** The layout with the header in the first filled line, for files that state how many lines stand before it. */
export function headedTable(text: string, first: TextLine, best: Table, readUnit: HeaderUnitReader): Table {
  const { delimiter, block } = best;
  const line = text.slice(first.start, first.end);
  if (lineLook(line, delimiter, Number.MAX_SAFE_INTEGER).kind === "data") {
    return { delimiter, header: null, start: first, block };
  }
  return headedAt(text, first, delimiter, block, readUnit);
}

/**
 * The layout of a file without a row of numbers alone (names in the first column, words in every row): the delimiter
 * that cuts most of the first lines into equally many cells, the header in the first of these lines.
 */
export function wordTable(
  text: string,
  first: TextLine,
  delimiters: readonly string[],
  stated: boolean,
  readUnit: HeaderUnitReader,
): Table {
  const lines = firstLines(text, first, 200);
  let chosen = { delimiter: delimiters.includes(",") ? "," : (delimiters[0] ?? ","), header: first, steady: 0 };
  for (const delimiter of delimiters) {
    const rows = lines.filter((line) => !isBlankLine(text.slice(line.start, line.end), delimiter));
    const counts = rows.map((line) => [...cellsOf(text.slice(line.start, line.end), delimiter)].length);
    const usual = mostFrequent(counts.filter((count) => count > 1));
    const steady = counts.filter((count) => count === usual).length;
    const header = rows[counts.indexOf(usual)];
    if (steady > chosen.steady && header !== undefined) chosen = { delimiter, header, steady };
  }
  return headedAt(text, stated ? first : chosen.header, chosen.delimiter, null, readUnit);
}

function mostFrequent(counts: readonly number[]): number {
  const times = (count: number): number => counts.filter((other) => other === count).length;
  return counts.reduce((best, count) => (times(count) > times(best) ? count : best), counts[0] ?? 0);
}

/** The table whose header is the row that begins with line `first`. */
function headedAt(
  text: string,
  first: TextLine,
  delimiter: string,
  block: Block | null,
  readUnit: HeaderUnitReader,
): Table {
  const lines = firstLines(text, first, 64);
  const width = block?.width ?? [...cellsOf(text.slice(first.start, first.end), delimiter)].length;
  const found = headerAt(text, lines, delimiter, width, readUnit);
  const last = lines.at(-1) ?? first;
  const start = lines[found?.next ?? 0] ?? { start: last.next, number: last.number + 1 };
  return { delimiter, header: found?.rows ?? null, start, block };
}

function firstLines(text: string, first: TextLine, count: number): TextLine[] {
  const lines: TextLine[] = [];
  for (const line of linesFrom(text, first.start, first.number)) {
    lines.push(line);
    if (lines.length === count) break;
  }
  return lines;
}
