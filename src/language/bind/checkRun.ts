import { problem } from "../../contract/problem.js";
import { isKind } from "../../quantity/kinds.js";
import type { Run } from "../../study/run.js";
import type { Statement } from "../syntax.js";
import { type Binding, report } from "./binding.js";

/** Says on the `run` line what the run lacks. A line that is there but broken is not missing. */
export function checkRun(binding: Binding, run: Run, lines: readonly Statement[], reactionWritten: boolean): void {
  const written = new Set(lines.map((statement) => statement.line.row?.head));
  const wanted = written.has("rate") || written.has("fit");
  const say = { run: run.name };
  const { origin } = run;
  if (written.has("follow") && !written.has("data")) report(binding, problem("run-lacks-data", say, origin));
  if (wanted && !written.has("follow")) {
    const species = run.reaction?.reactants[0] ?? "A";
    const column = run.data?.columns.at(-1)?.name ?? "c";
    const example = `follow ${species} as concentration from ${column}`;
    report(binding, problem("run-lacks-follow", { ...say, example }, origin));
  }
  if (written.has("follow") && !reactionWritten) report(binding, problem("run-lacks-reaction", say, origin));
  if (written.has("follow") && !wanted) report(binding, problem("run-wants-nothing", say, origin));
  if (written.has("fit") && !written.has("temperature")) report(binding, problem("run-lacks-temperature", say, origin));
  if (!written.has("volume")) {
    const needing = run.taken.find(({ given }) => !isKind(given.unit, "concentration"));
    if (needing !== undefined) {
      report(binding, problem("run-lacks-volume", { ...say, species: needing.species.key }, origin));
    }
  }
  for (const { species, given, origin: line } of run.taken) {
    if (species.formula === null && species.molarMass === null && isKind(given.unit, "mass")) {
      report(binding, problem("taken-needs-formula", { species: species.key }, line));
    }
  }
}
