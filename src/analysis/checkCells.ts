import { type Problem, problem } from "../contract/problem.js";
import type { CellFault, Columns } from "../data/columns.js";
import type { Follow, Run } from "../study/run.js";
import { dataOrigin, type FoundColumn } from "./findColumns.js";
import { type Notes, note } from "./notes.js";

/**
 * Says of the used columns which cells are no numbers, once for each kind. False where more than half of a column is
 * not: then the rest is no honest signal either.
 */
export function checkCells(
  run: Run,
  follow: Follow,
  file: Columns,
  used: readonly FoundColumn[],
  notes: Notes,
): boolean {
  let usable = true;
  for (const column of used) {
    let bad = 0;
    for (const value of column.values) if (Number.isNaN(value)) bad++;
    if (bad === 0) continue;
    const origin = dataOrigin(run, column.fact);
    const path = run.data?.path ?? "";
    if (bad * 2 > file.rows) {
      const args = { file: path, column: column.fact.name, bad, rows: file.rows };
      note(notes, follow.id, problem("column-not-numbers", args, origin));
      usable = false;
    }
    for (const kind of ["empty", "word", "short"] as const) {
      const faults = file.faults.filter((fault) => fault.kind === kind && concerns(fault, column.index));
      const [first] = faults;
      if (first !== undefined) {
        note(notes, follow.id, cellProblem(kind, first, faults.length, column, file, path, origin));
      }
    }
  }
  return usable;
}

/** A short row lacks every cell from its first missing one on. */
function concerns(fault: CellFault, column: number): boolean {
  return fault.kind === "short" ? fault.column <= column : fault.column === column;
}

function cellProblem(
  kind: "empty" | "word" | "short",
  first: CellFault,
  count: number,
  column: FoundColumn,
  file: Columns,
  path: string,
  origin: Problem["origin"],
): Problem {
  const where = { file: path, line: file.lines[first.row] ?? 0, header: `“${column.header}”`, count };
  if (kind === "empty") return problem("data-cell-empty", where, origin);
  if (kind === "short") return problem("data-row-short", where, origin);
  return problem("data-cell-word", { ...where, text: first.text }, origin);
}
