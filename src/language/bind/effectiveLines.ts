import { problem } from "../../contract/problem.js";
import { isBroken, originOf, textOf } from "../fields.js";
import { type LineIndex, positionAt } from "../lineIndex.js";
import type { Statement } from "../syntax.js";
import { type Binding, report } from "./binding.js";

/** How the value of a field stands for the same thing: a species by its key, a name by itself. */
export type KeyOf = (statement: Statement, field: string) => string | null;

/**
 * The lines of a run that starts from others: keyed lines and those that stand once are replaced, `rate` and `fit`
 * as a whole once one is written, a new `data` keeps the columns. The order is that of the inherited lines.
 */
export function mergeLines(inherited: readonly Statement[], own: readonly Statement[], keyOf: KeyOf): Statement[] {
  const merged = [...inherited];
  const setsBegun = new Set<string>();
  for (const statement of own) {
    const { row } = statement.line;
    if (row === null) continue;
    const { repeats } = row;
    if (repeats.repeat === "set" && !setsBegun.has(row.head)) {
      setsBegun.add(row.head);
      removeAll(merged, (candidate) => candidate.line.row === row);
    }
    const replaced = replacedBy(merged, statement, keyOf);
    if (replaced < 0) merged.push(statement);
    else merged[replaced] = withKeptColumns(merged[replaced] as Statement, statement, keyOf);
  }
  return merged;
}

function replacedBy(lines: readonly Statement[], statement: Statement, keyOf: KeyOf): number {
  const { row } = statement.line;
  if (row === null) return -1;
  const { repeats } = row;
  if (repeats.repeat === "once") return lines.findIndex((candidate) => candidate.line.row === row);
  if (repeats.repeat !== "key") return -1;
  const key = keyOf(statement, repeats.field);
  if (key === null) return -1;
  return lines.findIndex((candidate) => candidate.line.row === row && keyOf(candidate, repeats.field) === key);
}

function withKeptColumns(before: Statement, after: Statement, keyOf: KeyOf): Statement {
  if (after.line.row?.head !== "data") return after;
  // What else is said of a file is said of that one: its excluded lines and its time zero are none of another.
  const columns = before.children.filter((child) => child.line.row?.head === "column");
  return { ...after, children: mergeLines(columns, after.children, keyOf) };
}

function removeAll(lines: Statement[], which: (statement: Statement) => boolean): void {
  for (let at = lines.length - 1; at >= 0; at--) if (which(lines[at] as Statement)) lines.splice(at, 1);
}

/** Says of each line that states again what a line of the same header states already. */
export function checkRepeats(binding: Binding, index: LineIndex, lines: readonly Statement[], keyOf: KeyOf): void {
  const seen = new Map<string, Statement>();
  for (const statement of lines) {
    const { row } = statement.line;
    checkRepeats(binding, index, statement.children, keyOf);
    if (row === null || isBroken(statement) || row.repeats.repeat === "many" || row.repeats.repeat === "set") continue;
    const field = row.repeats.repeat === "key" ? row.repeats.field : null;
    const key = field === null ? "" : keyOf(statement, field);
    if (key === null) continue;
    const first = seen.get(`${row.head} ${key}`);
    if (first === undefined) {
      seen.set(`${row.head} ${key}`, statement);
      continue;
    }
    const line = positionAt(index, first.offset).line + 1;
    const name = field === null ? null : textOf(statement, field);
    const origin = originOf(binding.uri, statement, field ?? undefined);
    if (name !== null && (field === "run" || field === "column" || row.head === "species")) {
      report(binding, problem("name-twice", { what: row.head, name, line }, origin));
    } else {
      report(binding, problem("line-twice", { what: name === null ? row.head : `${row.head} ${name}`, line }, origin));
    }
  }
}
