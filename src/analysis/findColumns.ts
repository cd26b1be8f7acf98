import { type Origin, problem, replacement } from "../contract/problem.js";
import type { Column, Columns } from "../data/columns.js";
import { sameDimension } from "../quantity/dimension.js";
import { nearest } from "../quantity/nearest.js";
import { plainText } from "../quantity/plainText.js";
import type { Unit } from "../quantity/unit.js";
import type { ColumnFact, Run } from "../study/run.js";
import { type Notes, note } from "./notes.js";

/** A column of the description found in its file. */
export interface FoundColumn {
  readonly fact: ColumnFact;
  /** index in the file, from 0 */
  readonly index: number;
  readonly header: string;
  /** of the line or of the header; null where neither states one */
  readonly unit: Unit | null;
  readonly values: Float64Array;
}

/** The declared columns that the file has; of the others the notes say why not. */
export function findColumns(run: Run, file: Columns, notes: Notes): FoundColumn[] {
  return (run.data?.columns ?? []).flatMap((fact) => findColumn(run, fact, file, notes) ?? []);
}

/** Where a problem of a run's data shows: on the column's line, or where the run itself names the file. */
export function dataOrigin(run: Run, column: ColumnFact | null): Origin {
  if (column !== null && within(column.origin, run.block)) return column.origin;
  if (run.data !== null && within(run.data.origin, run.block)) return run.data.origin;
  return run.origin;
}

function within(inner: Origin, outer: Origin): boolean {
  return inner.start >= outer.start && inner.end <= outer.end;
}

function findColumn(run: Run, fact: ColumnFact, file: Columns, notes: Notes): FoundColumn | null {
  const index = indexOf(run, fact, file, notes);
  const column = index === null ? undefined : file.columns[index];
  if (index === null || column === undefined) return null;
  const header = column.header === "" ? `column ${index + 1}` : column.header;
  const unit = unitOf(run, fact, column, header, file, notes);
  if (unit === "differs") return null;
  return { fact, index, header, unit, values: column.values };
}

function indexOf(run: Run, fact: ColumnFact, file: Columns, notes: Notes): number | null {
  const path = run.data?.path ?? "";
  const by = fact.by.value;
  const place = dataOrigin(run, fact);
  const origin = place === fact.origin ? fact.by.origin : place;
  if ("number" in by) {
    if (by.number >= 1 && by.number <= file.columns.length) return by.number - 1;
    const args = { file: path, number: by.number, columns: file.columns.length };
    note(notes, run.id, problem("data-column-number", args, origin));
    return null;
  }
  const { header } = by;
  const matches = headersEqual(file, header);
  const [first] = matches;
  if (matches.length === 1 && first !== undefined) return first;
  if (file.headerLine === null) {
    note(notes, run.id, problem("data-no-header", { file: path, header }, origin));
    return null;
  }
  const line = file.headerLine;
  const mendable = origin === fact.by.origin;
  if (matches.length > 1) {
    const numbers = matches.map((index) => index + 1).join(" or ");
    const mend = mendable ? matches.map((index) => replacement(origin, String(index + 1))) : [];
    note(notes, run.id, problem("data-column-twice", { file: path, header, line, numbers }, origin, mend));
    return null;
  }
  const there = file.columns.map((column) => column.header);
  const near = mendable ? nearest(header, there).map((name) => replacement(origin, `"${name}"`)) : [];
  const headers = there
    .slice(0, 8)
    .map((name) => `“${name}”`)
    .join(", ");
  note(notes, run.id, problem("data-column-missing", { file: path, header, headers, line }, origin, near));
  return null;
}

/** Columns whose header is the one asked for: to the letter, else up to spaces and to how a sign is typed. */
function headersEqual(file: Columns, header: string): number[] {
  const wanted = header.trim();
  const which = (same: (candidate: string) => boolean): number[] =>
    file.columns.flatMap((column, index) => (same(column.header.trim()) ? [index] : []));
  const exact = which((candidate) => candidate === wanted);
  if (exact.length > 0) return exact;
  const plain = simplified(wanted);
  return which((candidate) => simplified(candidate) === plain);
}

function simplified(text: string): string {
  return plainText(text).replace(/\s+/g, " ").trim();
}

function unitOf(
  run: Run,
  fact: ColumnFact,
  column: Column,
  header: string,
  file: Columns,
  notes: Notes,
): Unit | null | "differs" {
  const stated = fact.unit?.value ?? null;
  const path = run.data?.path ?? "";
  const line = file.headerLine ?? 1;
  if (stated !== null && column.unit !== null && !sameUnit(stated, column.unit)) {
    const place = dataOrigin(run, fact);
    const origin = place === fact.origin && fact.unit !== null ? fact.unit.origin : place;
    const mend = origin === fact.unit?.origin ? [replacement(origin, column.unit.text)] : [];
    const args = { file: path, line, header, there: column.unit.text, here: stated.text };
    note(notes, run.id, problem("data-unit-differs", args, origin, mend));
    return "differs";
  }
  if (stated === null && column.unit === null && column.unreadUnit !== null) {
    const args = { file: path, line, header, unit: column.unreadUnit };
    note(notes, run.id, problem("data-unit-unread", args, dataOrigin(run, fact)));
  }
  return stated ?? column.unit;
}

function sameUnit(a: Unit, b: Unit): boolean {
  return sameDimension(a.dimension, b.dimension) && a.factor === b.factor && a.offset === b.offset;
}
