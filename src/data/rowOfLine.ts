import type { Columns } from "./columns.js";

/**
 * Index of the data row, from 0, that begins on `line` of the file (from 1, as an editor counts); null where none does:
 * headers, blank lines, comments, the further lines of a row that goes over several, and what is beyond the end.
 */
export function rowOfLine(columns: Columns, line: number): number | null {
  const { lines } = columns;
  let low = 0;
  let high = columns.rows;
  while (low < high) {
    const middle = (low + high) >>> 1;
    if ((lines[middle] ?? 0) < line) low = middle + 1;
    else high = middle;
  }
  return low < columns.rows && lines[low] === line ? low : null;
}
