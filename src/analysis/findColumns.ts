import { type Origin, type Problem, problem, replacement } from "../contract/problem.js";
import type { Column, Columns } from "../data/columns.js";
import { findColumn } from "../data/findColumn.js";
import { sameDimension } from "../quantity/dimension.js";
import type { Unit } from "../quantity/unit.js";
import type { ColumnFact, Run } from "../study/run.js";
import { type Notes, note } from "./notes.js";

/** A column of the description found in its file. */
export interface FoundColumn {
  readonly fact: ColumnFact;
  /** index in the file, from 0 */
  readonly index: number;
  /** of the line or of the header; null where neither states one */
  readonly unit: Unit | null;
  readonly values: Float64Array;
}

/** The declared columns that the file has; of the others the notes say why not. */
export function findColumns(run: Run, file: Columns, notes: Notes): FoundColumn[] {
  return (run.data?.columns ?? []).flatMap((fact) => {
    const { value: by, origin } = fact.by;
    const found = findColumn(file, "number" in by ? by.number : by.header, run.data?.path ?? "", origin);
    if (!found.ok) {
      note(notes, run.id, inRun(run, fact, found.problem));
      return [];
    }
    const index = found.value;
    const column = file.columns[index] as Column;
    const unit = unitOf(run, fact, column, file, notes);
    return unit === "differs" ? [] : [{ fact, index, unit, values: column.values }];
  });
}

/** Where a problem of a run's data shows: on the column's line, or where the run itself names the file. */
export function dataOrigin(run: Run, column: ColumnFact | null): Origin {
  if (column !== null && isWithin(run, column.origin)) return column.origin;
  if (run.data !== null && isWithin(run, run.data.origin)) return run.data.origin;
  return run.origin;
}

/** A problem of an inherited column shows where the run names its own file, where the mend would not fit. */
export function inRun(run: Run, column: ColumnFact, found: Problem): Problem {
  if (isWithin(run, column.origin)) return found;
  const { mend: _, ...rest } = found;
  return { ...rest, origin: dataOrigin(run, null) };
}

/** Whether a line stands in the run's own lines, and is not inherited. */
export function isWithin(run: Run, origin: Origin): boolean {
  return origin.start >= run.block.start && origin.end <= run.block.end;
}

function unitOf(run: Run, fact: ColumnFact, column: Column, file: Columns, notes: Notes): Unit | null | "differs" {
  const stated = fact.unit?.value ?? null;
  const where = { file: run.data?.path ?? "", line: file.headerLine ?? 1, header: column.header };
  if (stated !== null && column.unit !== null && !sameUnit(stated, column.unit)) {
    const origin = fact.unit?.origin ?? fact.origin;
    const args = { ...where, there: column.unit.text, here: stated.text };
    const found = problem("data-unit-differs", args, origin, [replacement(origin, column.unit.text)]);
    note(notes, run.id, inRun(run, fact, found));
    return "differs";
  }
  if (stated === null && column.unit === null && column.unreadUnit !== null) {
    const args = { ...where, unit: column.unreadUnit };
    note(notes, run.id, problem("data-unit-unread", args, dataOrigin(run, fact)));
  }
  return stated ?? column.unit;
}

function sameUnit(a: Unit, b: Unit): boolean {
  return sameDimension(a.dimension, b.dimension) && a.factor === b.factor && a.offset === b.offset;
}
