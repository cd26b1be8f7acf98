import { problem } from "../../contract/problem.js";
import { originOf, textOf } from "../fields.js";
import type { Statement } from "../syntax.js";
import { type Binding, report } from "./binding.js";

/** Says of a line that its time span ends before it begins. */
export function reportEmptySpan(binding: Binding, statement: Statement): void {
  const args = { from: textOf(statement, "from") ?? "", to: textOf(statement, "to") ?? "" };
  report(binding, problem("span-empty", args, originOf(binding.uri, statement)));
}
