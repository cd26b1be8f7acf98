import { type Fraction, negative, one, over, plus, times, zero } from "../quantity/fraction.js";

/**
 * A basis of the solutions x of A·x = 0 in exact arithmetic. `rows` are those of A, all of length `width`; each basis
 * vector has length `width`, with a 1 in its own free place. Gauss–Jordan elimination.
 */
export function nullSpace(rows: readonly (readonly Fraction[])[], width: number): Fraction[][] {
  const matrix = rows.map((row) => [...row]);
  const pivots: number[] = [];
  for (let column = 0; column < width; column++) {
    const top = pivots.length;
    const found = matrix.findIndex((row, index) => index >= top && at(row, column).num !== 0n);
    const pivotRow = matrix[found];
    if (pivotRow === undefined) continue;
    matrix[found] = matrix[top] ?? pivotRow;
    const lead = at(pivotRow, column);
    const scaled = pivotRow.map((value) => over(value, lead));
    matrix[top] = scaled;
    matrix.forEach((row, index) => {
      const weight = at(row, column);
      if (index === top || weight.num === 0n) return;
      matrix[index] = row.map((value, place) => plus(value, negative(times(weight, at(scaled, place)))));
    });
    pivots.push(column);
  }
  const free = Array.from({ length: width }, (_, column) => column).filter((column) => !pivots.includes(column));
  return free.map((chosen) =>
    Array.from({ length: width }, (_, column) => {
      if (column === chosen) return one;
      const row = matrix[pivots.indexOf(column)];
      return row === undefined ? zero : negative(at(row, chosen));
    }),
  );
}

function at(row: readonly Fraction[], index: number): Fraction {
  return row[index] ?? zero;
}
