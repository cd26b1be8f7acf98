import type { FaultKind } from "./columns.js";
import { elapsed } from "./elapsedTime.js";
import { numberOf, wordKind } from "./numberCell.js";
import { addFault, makeRoom, type RowStore } from "./rowStore.js";

/**
 * Adds the cells of the row that begins on `line` (from 1): a cell that is no number becomes NaN and a fault, a row too
 * short or too long is one fault; empty cells beyond the last column are none.
 */
export function addRow(store: RowStore, cells: readonly string[], decimalComma: boolean, line: number): void {
  makeRoom(store);
  const { width, rows, values } = store;
  let count = cells.length;
  while (count > width && cells[count - 1] === "") count--;
  for (let column = 0; column < width; column++) {
    const cell = cells[column];
    const value = cell === undefined ? Number.NaN : cellValue(store, column, cell, decimalComma);
    if (typeof value === "number") values[column]![rows] = value;
    else {
      values[column]![rows] = Number.NaN;
      addFault(store, value, column, (cell ?? "").trim());
    }
  }
  if (count < width) addFault(store, "short", count, "");
  if (count > width) addFault(store, "long", width, (cells[width] ?? "").trim());
  store.lines[rows] = line;
  store.rows++;
}

function cellValue(store: RowStore, column: number, cell: string, decimalComma: boolean): number | FaultKind {
  const time = store.times?.[column] ?? null;
  const value = time === null ? numberOf(cell, decimalComma) : null;
  if (value !== null) return value;
  const text = cell.trim();
  if (text === "") return "empty";
  return time === null ? wordKind(text, decimalComma) : elapsed(time, text, store.rows);
}
