import type { Run } from "../../study/run.js";
import type { RunTable } from "../../study/study.js";
import { blockOf, originOf, textOf } from "../fields.js";
import type { Statement } from "../syntax.js";
import type { Binding } from "./binding.js";
import type { KeyOf } from "./effectiveLines.js";
import { textFact } from "./facts.js";

/** A table of runs. It stays unexpanded: its rows become runs when the file is read. */
export function bindTable(binding: Binding, statement: Statement, common: Run, keyOf: KeyOf): RunTable {
  const { uri } = binding;
  const path = textOf(statement, "path") ?? "";
  return {
    id: `rows of ${path}`,
    origin: originOf(uri, statement),
    block: blockOf(uri, statement),
    path,
    like: textOf(statement, "like") ?? "",
    namedBy: textFact(uri, statement.children, "named", "header")?.value ?? null,
    values: statement.children.flatMap((line) => valuesOf(line, keyOf)),
    common,
  };
}

/** Each value of a line that stands in a column of the table. */
function valuesOf(statement: Statement, keyOf: KeyOf): RunTable["values"] {
  const { row, fields } = statement.line;
  if (row === null) return [];
  const key = row.repeats.repeat === "key" ? keyOf(statement, row.repeats.field) : null;
  const headers = [...fields.values()].flatMap((field) => (field.kind === "header" ? [field.header] : []));
  const observed = row.head === "observed" ? textOf(statement, "header") : null;
  return [...headers, ...(observed === null ? [] : [observed])].map((header) => ({ head: row.head, key, header }));
}
