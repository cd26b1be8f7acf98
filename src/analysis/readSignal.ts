import { type Problem, problem } from "../contract/problem.js";
import { cellProblems, rowProblems, timeProblems } from "../data/columnProblems.js";
import type { Column, Columns } from "../data/columns.js";
import { rowOfLine } from "../data/rowOfLine.js";
import type { CommonCause, Signal } from "../monitor/signal.js";
import { fromSI, intervalToSI, toSI } from "../quantity/conversion.js";
import { sameDimension } from "../quantity/dimension.js";
import { isKind, kinds } from "../quantity/kinds.js";
import { combined, type Quantity } from "../quantity/quantity.js";
import type { Unit } from "../quantity/unit.js";
import type { Exclusion } from "../study/dataFile.js";
import type { Fact } from "../study/fact.js";
import type { ColumnFact, Follow, Run } from "../study/run.js";
import { dataOrigin, type FoundColumn, findColumns, isWithin } from "./findColumns.js";
import { type Notes, note } from "./notes.js";

/** Signal of one follow line, and how many rows its file has. */
export interface ReadSignal {
  readonly signal: Signal;
  readonly points: number;
  readonly timeColumn: string;
  /** line of the data file that each data row begins on, from 1 */
  readonly lines: Uint32Array;
  readonly leftOut: readonly LeftOut[];
}

/** A reading that the description leaves out. */
export interface LeftOut {
  /** s, from the beginning of the reaction */
  readonly time: number;
  /** as `Signal.value`, SI */
  readonly value: number;
  /** index of its data row */
  readonly row: number;
  readonly by: Exclusion;
}

/**
 * The usable readings of a follow line: those rows in which time and signal are both numbers, down to where time runs
 * backwards. Null where there is no signal to speak of; why is in the notes.
 */
export function readSignal(run: Run, follow: Follow, file: Columns, notes: Notes): ReadSignal | null {
  const found = findColumns(run, file, notes);
  const readings = found.find(({ fact }) => fact.name === follow.column);
  if (readings === undefined || run.data === null) return null;
  const time = timeColumn(run, found, follow, notes);
  if (time === null) return null;
  if (readings.unit === null) {
    const args = { column: follow.column, kind: follow.monitor, samples: kinds.concentration.samples };
    note(notes, follow.id, problem("column-lacks-unit", args, dataOrigin(run, readings.fact)));
    return null;
  }
  if (!sayWhatIsWrong(run, follow, file, time, readings, notes)) return null;
  const left = excludedRows(run, follow, file, time, notes);
  const zero = run.data.timeZero;
  const begun = zero === null ? 0 : fileTime(zero.value, zero.clock, file.columns[time.index]);
  const rows = afterZero(run, follow, usableRows(time.values, readings.values, left), time, begun, notes);
  const blank = blankOf(follow, readings.unit, notes);
  const readingAt = (row: number): number => {
    return toSI(readings.values[row] as number, readings.unit as Unit) - (blank?.value ?? 0);
  };
  const timeAt = (row: number): number => {
    return toSI(time.values[row] as number, time.unit as Unit) - begun;
  };
  const value = Float64Array.from(rows, readingAt);
  const signal: Signal = {
    time: Float64Array.from(rows, timeAt),
    uTimeZero: zero === null ? null : combined(zero.value.sources),
    value,
    random: randomOf(follow, readings, value, blank?.value ?? 0, notes),
    common: [...commonOf(follow, readings, value, notes), ...blankCause(blank, value.length)],
    timeUnit: time.unit as Unit,
    unit: readings.unit,
    rows,
  };
  const leftOut = [...left].flatMap(([row, by]): LeftOut[] => {
    const reading = { time: timeAt(row), value: readingAt(row), row, by };
    return Number.isNaN(reading.time) || Number.isNaN(reading.value) ? [] : [reading];
  });
  return { signal, points: file.rows, timeColumn: time.fact.name, lines: file.lines, leftOut };
}

/** The column whose unit is a time; of several the first, with an information. */
function timeColumn(run: Run, found: readonly FoundColumn[], follow: Follow, notes: Notes): FoundColumn | null {
  const times = found.filter(({ fact, unit }) => fact.name !== follow.column && unit !== null && isKind(unit, "time"));
  const [first, second] = times;
  if (first === undefined) {
    // A column that could not be found or read has said so already, and may be the time.
    const declared = run.data?.columns.length ?? 0;
    if (found.length === declared) {
      note(notes, run.id, problem("run-lacks-time", { run: run.name, file: run.data?.path ?? "" }, run.origin));
    }
    return null;
  }
  if (second !== undefined) {
    const args = { run: run.name, column: first.fact.name, others: second.fact.name };
    note(notes, run.id, problem("run-times", args, dataOrigin(run, second.fact)));
  }
  return first;
}

/**
 * Says of the used columns which cells are no numbers and whether time runs backwards. False where more than half of a
 * column is no number: then the rest is no honest signal either.
 */
function sayWhatIsWrong(
  run: Run,
  follow: Follow,
  file: Columns,
  time: FoundColumn,
  readings: FoundColumn,
  notes: Notes,
): boolean {
  const path = run.data?.path ?? "";
  for (const found of rowProblems(file, path, dataOrigin(run, null))) note(notes, follow.id, found);
  for (const { fact, index } of [time, readings]) {
    for (const found of cellProblems(file, index, path, dataOrigin(run, fact))) {
      note(notes, follow.id, withDecimalOption(run, found));
    }
  }
  for (const found of timeProblems(file, time.index, path, dataOrigin(run, time.fact))) note(notes, follow.id, found);
  return [time, readings].every(({ fact, values }) => {
    const bad = values.reduce((count, value) => count + (Number.isNaN(value) ? 1 : 0), 0);
    if (bad * 2 <= file.rows) return true;
    const args = { file: path, column: fact.name, bad, rows: file.rows };
    note(notes, follow.id, problem("column-not-numbers", args, dataOrigin(run, fact)));
    return false;
  });
}

/** Readings in the other decimal mark have a mend: the option below the run's own data line. */
function withDecimalOption(run: Run, found: Problem): Problem {
  const file = run.data;
  if (found.code !== "data-decimal-comma" || file === null || !isWithin(run, file.origin)) return found;
  const { end } = file.origin;
  return { ...found, mend: [{ text: "decimal comma", edits: [{ start: end, end, text: "\n    decimal comma" }] }] };
}

/** Rows that the description leaves out, by the line of the file or by a span of its times; each with what leaves it out. */
function excludedRows(
  run: Run,
  follow: Follow,
  file: Columns,
  time: FoundColumn,
  notes: Notes,
): ReadonlyMap<number, Exclusion> {
  const rows = new Map<number, Exclusion>();
  for (const exclusion of run.data?.exclusions ?? []) {
    const before = rows.size;
    for (const row of excludedBy(exclusion, file, time)) rows.set(row, exclusion);
    if (rows.size > before) continue;
    const what = "line" in exclusion.value ? `line ${exclusion.value.line}` : "this span of the file's times";
    const found = problem("exclude-nothing", { file: run.data?.path ?? "", what }, exclusion.origin);
    note(notes, follow.id, isWithin(run, exclusion.origin) ? found : { ...found, origin: dataOrigin(run, null) });
  }
  return rows;
}

function excludedBy({ value }: Exclusion, file: Columns, time: FoundColumn): number[] {
  if ("line" in value) {
    const row = rowOfLine(file, value.line);
    return row === null ? [] : [row];
  }
  const column = file.columns[time.index];
  const from = fileTime(value.from, value.clock, column);
  const to = fileTime(value.to, value.clock, column);
  const rows: number[] = [];
  for (let row = 0; row < file.rows; row++) {
    const t = toSI(time.values[row] as number, time.unit as Unit);
    if (t >= from && t <= to) rows.push(row);
  }
  return rows;
}

const day = 86_400;

/**
 * A time of the description as a time of the file, s: a clock time beside a column of dates or clock times counts from
 * the first of them, within half a day before or after; everything else is the file's own time.
 */
function fileTime({ value }: Quantity, clock: boolean, column: Column | undefined): number {
  const start = column?.time ?? null;
  if (!clock || start === null) return value;
  const since = value - start.seconds;
  return since <= -day / 2 ? since + day : since > day / 2 ? since - day : since;
}

/** The rows from time zero on; those before it, where the description sets it, are no readings of the reaction. */
function afterZero(
  run: Run,
  follow: Follow,
  rows: Uint32Array,
  time: FoundColumn,
  begun: number,
  notes: Notes,
): Uint32Array {
  const zero = run.data?.timeZero ?? null;
  if (zero === null) return rows;
  const kept = rows.filter((row) => toSI(time.values[row] as number, time.unit as Unit) >= begun);
  const origin = isWithin(run, zero.origin) ? zero.origin : dataOrigin(run, null);
  if (kept.length === 0 && rows.length > 0) note(notes, follow.id, problem("time-zero-late", {}, origin));
  else if (kept.length < rows.length) {
    note(notes, follow.id, problem("readings-before-zero", { count: rows.length - kept.length }, origin));
  }
  return kept;
}

/** Rows with both a time and a reading, down to the first that goes back in time: what follows may be another run. */
function usableRows(time: Float64Array, readings: Float64Array, excluded: ReadonlyMap<number, Exclusion>): Uint32Array {
  const rows: number[] = [];
  let before = Number.NEGATIVE_INFINITY;
  for (let row = 0; row < time.length; row++) {
    const t = time[row] as number;
    if (Number.isNaN(t)) continue;
    if (t < before) break;
    before = t;
    if (!Number.isNaN(readings[row] as number) && !excluded.has(row)) rows.push(row);
  }
  return Uint32Array.from(rows);
}

/** Random standard uncertainty of each reading; null where none is stated or it cannot serve as a weight. */
function randomOf(
  follow: Follow,
  readings: FoundColumn,
  value: Float64Array,
  /** what was taken off the readings: a share is one of what the instrument shows */
  blank: number,
  notes: Notes,
): Float64Array | null {
  const { random } = readings.fact;
  if (random === null || random.value.value === 0) return null;
  const size = sizeOf(follow, readings.fact, readings.unit as Unit, random, notes);
  if (size === null) return null;
  if (size.kind === "offset") return new Float64Array(value.length).fill(size.u);
  if (value.some((reading) => reading + blank === 0)) {
    note(notes, follow.id, problem("uncertainty-of-zero", { column: follow.column }, random.origin));
    return null;
  }
  return value.map((reading) => Math.abs(reading + blank) * size.u);
}

/** The blank, where it is in a unit that can be taken off the readings. */
function blankOf(follow: Follow, unit: Unit, notes: Notes): Quantity | null {
  if (follow.blank === null) return null;
  const { value, origin } = follow.blank;
  if (sameDimension(value.unit.dimension, unit.dimension)) return value;
  const args = { end: "blank", unit: value.unit.text, column: follow.column, columnUnit: unit.text };
  note(notes, follow.id, problem("fit-end-wrong-unit", args, origin));
  return null;
}

function blankCause(blank: Quantity | null, length: number): CommonCause[] {
  const u = blank === null ? null : combined(blank.sources);
  return u === null ? [] : [{ name: "blank", shift: new Float64Array(length).fill(-u), of: () => -u }];
}

function commonOf(follow: Follow, readings: FoundColumn, value: Float64Array, notes: Notes): CommonCause[] {
  const { common } = readings.fact;
  if (common === null || common.value.value === 0) return [];
  const size = sizeOf(follow, readings.fact, readings.unit as Unit, common, notes);
  if (size === null) return [];
  const column = readings.fact.name;
  if (size.kind === "offset") {
    const shift = new Float64Array(value.length).fill(size.u);
    return [{ name: `offset of ${column}`, shift, of: () => size.u }];
  }
  const of = (reading: number): number => reading * size.u;
  return [{ name: `scale of ${column}`, shift: value.map(of), of }];
}

type Size = { readonly kind: "offset" | "share"; readonly u: number };

/** An uncertainty line of a column: in the column's unit an offset (SI), in per cent a share of the reading. */
function sizeOf(
  follow: Follow,
  column: ColumnFact,
  unit: Unit,
  { value, origin }: Fact<Quantity>,
  notes: Notes,
): Size | null {
  if (value.unit.text !== "" && isKind(value.unit, "number")) return { kind: "share", u: value.value };
  if (sameDimension(value.unit.dimension, unit.dimension)) {
    return { kind: "offset", u: intervalToSI(fromSI(value.value, value.unit), value.unit) };
  }
  const args = { unit: value.unit.text, column: column.name, columnUnit: unit.text };
  note(notes, follow.id, problem("uncertainty-wrong-unit", args, origin));
  return null;
}
