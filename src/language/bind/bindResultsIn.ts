import { problem } from "../../contract/problem.js";
import { isKind } from "../../quantity/kinds.js";
import type { ResultsIn } from "../../study/run.js";
import { itemsOf, originOf } from "../fields.js";
import type { Statement } from "../syntax.js";
import { type Binding, report } from "./binding.js";
import { lineWith } from "./facts.js";

/** The units in which results come out: one of concentration and one of time, in that order or the other. */
export function bindResultsIn(binding: Binding, lines: readonly Statement[]): ResultsIn | null {
  const statement = lineWith(lines, "results");
  if (statement === null) return null;
  const units = itemsOf(statement, "units").flatMap((item) => (item.kind === "unit" ? [item.unit] : []));
  const concentration = units.find((unit) => isKind(unit, "concentration"));
  const time = units.find((unit) => isKind(unit, "time"));
  if (units.length === 2 && concentration !== undefined && time !== undefined) return { concentration, time };
  report(binding, problem("results-units", {}, originOf(binding.uri, statement, "units")));
  return null;
}
