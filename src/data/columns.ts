import type { Unit } from "../quantity/unit.js";

/** One column of a data file as numbers, in the unit the file states (not SI). */
export interface Column {
  /** header cell as written, without the quotes of the file; "" where the file has no header row */
  readonly header: string;
  /** unit stated in the header cell, null where none is */
  readonly unit: Unit | null;
  /** what the header says beside the unit that could not be read as one, null where nothing did */
  readonly unreadUnit: string | null;
  /** one value a row; NaN where the cell is empty or holds no number (see `faults`) */
  readonly values: Float64Array;
}

/** A cell or row that is not what it should be. */
export interface CellFault {
  readonly kind: "empty" | "word" | "short" | "long";
  /** index of the data row, from 0 */
  readonly row: number;
  /** index of the column, from 0; for a short or long row the first that lacks or is too much */
  readonly column: number;
  /** text of the cell, cut to 40 characters */
  readonly text: string;
}

/** A delimited text file, read. Rows are data rows: the header and what stands before it are not among them. */
export interface Columns {
  readonly columns: readonly Column[];
  readonly rows: number;
  /** line of the file each data row begins on, from 1, length `rows` */
  readonly lines: Uint32Array;
  /** the first of them, at most 1,000, so that a hostile file cannot fill the memory */
  readonly faults: readonly CellFault[];
  /** how many there are in all */
  readonly faultCount: number;
  /** what stands between cells; a single blank means any run of blanks */
  readonly delimiter: string;
  readonly decimalComma: boolean;
  /** line of the header row, from 1; null where the file has none */
  readonly headerLine: number | null;
}
