import { numberOf } from "./numberCell.js";
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
    const value = cell === undefined ? null : numberOf(cell, decimalComma);
    values[column]![rows] = value ?? Number.NaN;
    if (value === null && cell !== undefined)
      addFault(store, cell.trim() === "" ? "empty" : "word", column, cell.trim());
  }
  if (count < width) addFault(store, "short", count, "");
  if (count > width) addFault(store, "long", width, (cells[width] ?? "").trim());
  store.lines[rows] = line;
  store.rows++;
}
