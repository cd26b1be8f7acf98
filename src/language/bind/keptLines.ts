import { problem } from "../../contract/problem.js";
import { isBroken, originOf } from "../fields.js";
import type { Parsed } from "../parse.js";
import type { Statement } from "../syntax.js";
import { type Binding, report } from "./binding.js";

/** Says of each line that nothing computes with yet that it is understood and kept; a header speaks for its lines. */
export function sayKept(binding: Binding, parsed: Parsed, statements: readonly Statement[]): void {
  for (const statement of statements) {
    const { line, children } = statement;
    if (line.row?.kept === true && !isBroken(statement)) {
      const origin = originOf(binding.uri, statement);
      const words = parsed.text.slice(origin.start, origin.end).replace(/\s+/g, " ");
      const what = children.length === 0 ? `“${words}”` : `“${words}”, with the lines below it,`;
      report(binding, problem("not-computed-yet", { what }, origin));
    } else sayKept(binding, parsed, children);
  }
}

/** Says of each `from "header"` that it stands outside a table of runs. */
export function sayHeadersOutside(binding: Binding, statements: readonly Statement[]): void {
  for (const statement of statements) {
    if (statement.line.row?.opens === "rows") continue;
    for (const [label, field] of statement.line.fields) {
      if (field.kind !== "header") continue;
      const args = { header: field.header };
      report(binding, problem("header-outside-table", args, originOf(binding.uri, statement, label)));
    }
    sayHeadersOutside(binding, statement.children);
  }
}
