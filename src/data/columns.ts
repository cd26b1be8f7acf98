import type { Unit } from "../quantity/unit.js";

/** One column of a data file as numbers, in the unit the file states (not SI); dates and clock times in s. */
export interface Column {
  /** what its cells are written as: numbers, dates with or without a clock time, clock times alone */
  readonly kind: "number" | "date-time" | "clock";
  /** header cell as written, without the quotes of the file; "" where the file has no header row */
  readonly header: string;
  /** unit stated in the header cell, null where none is; s for dates and clock times */
  readonly unit: Unit | null;
  /** what the header says beside the unit that could not be read as one, null where nothing did */
  readonly unreadUnit: string | null;
  /**
   * one value a row; NaN where the cell is empty or holds no number (see `faults`); of dates and clock times the time
   * since the first of them, s
   */
  readonly values: Float64Array;
  /** what the elapsed times count from; null for a column of numbers, and where no cell holds a time */
  readonly time: ColumnTime | null;
}

/** Where the elapsed times of a column come from. */
export interface ColumnTime {
  /** the first time as the file writes it */
  readonly start: string;
  /** its day, from 1970-01-01; null for a clock, and where day and month could stand in either order */
  readonly day: number | null;
  /** its clock time, s since midnight */
  readonly seconds: number;
  /** how often a clock time fell by more than twelve hours, which is taken for midnight */
  readonly midnights: number;
  /** index of the first data row after a midnight, from 0; null where none passed */
  readonly midnightRow: number | null;
}

/**
 * What is wrong with a cell: nothing in it; no number; a mark between thousands; a decimal mark the file does not use; a
 * date whose day and month could stand in either order; `1:30`, hours or minutes first; no such time, or none at all,
 * among times; with an offset from UTC among times without, or the reverse. Of a row: too few cells, or too many.
 */
export type FaultKind =
  | "empty"
  | "word"
  | "thousands"
  | "other mark"
  | "date order"
  | "clock parts"
  | "time"
  | "offset"
  | "short"
  | "long";

/** A cell or row that is not what it should be. */
export interface CellFault {
  readonly kind: FaultKind;
  /** index of the data row, from 0 */
  readonly row: number;
  /** index of the column, from 0; for a short or long row the first that lacks or is too much */
  readonly column: number;
  /** text of the cell, cut to 40 characters */
  readonly text: string;
}

/** How often one kind of fault is in one column. */
export interface FaultTally {
  readonly first: CellFault;
  readonly count: number;
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
  /** of each kind and column, however many there are, in the order of the first */
  readonly tallies: readonly FaultTally[];
  /** what stands between cells; a single blank means any run of blanks */
  readonly delimiter: string;
  readonly decimalComma: boolean;
  /** line of the header row, from 1; null where the file has none */
  readonly headerLine: number | null;
}
