import { type Mend, problem } from "../../contract/problem.js";
import { isKind } from "../../quantity/kinds.js";
import type { Run } from "../../study/run.js";
import type { Statement } from "../syntax.js";
import { type Binding, lineBelow, report } from "./binding.js";

/** What becomes a concentration only by the volume of the mixture. */
const needsVolume = ["amount", "mass", "volume"] as const;

/** Says on the `run` line what the run lacks. A line that is there but broken is not missing. */
export function checkRun(
  binding: Binding,
  header: Statement,
  run: Run,
  lines: readonly Statement[],
  reactionWritten: boolean,
): void {
  const written = new Set(lines.map((statement) => statement.line.row?.head));
  const wanted = written.has("rate") || written.has("fit");
  const say = { run: run.name };
  const { origin } = run;
  const below = (line: string): Mend[] => [lineBelow(binding, header, line)];
  const species = run.reaction?.reactants[0] ?? "A";
  if (written.has("follow") && !written.has("data")) {
    report(binding, problem("run-lacks-data", say, origin, below(`data "data/${run.name}.csv"`)));
  }
  if (wanted && !written.has("follow")) {
    const column = run.data?.columns.at(-1)?.name ?? "c";
    const example = `follow ${species} as concentration from ${column}`;
    report(binding, problem("run-lacks-follow", { ...say, example }, origin, run.data === null ? [] : below(example)));
  }
  if (written.has("follow") && !reactionWritten) report(binding, problem("run-lacks-reaction", say, origin));
  if (written.has("follow") && !wanted) {
    report(
      binding,
      problem("run-wants-nothing", say, origin, [...below("rate initial"), ...below(`fit order 1 in ${species}`)]),
    );
  }
  if (written.has("fit") && !written.has("temperature")) {
    report(binding, problem("run-lacks-temperature", say, origin, below("temperature 25.0 °C")));
  }
  if (!written.has("volume")) {
    const needing = run.taken.find(({ given }) => needsVolume.some((kind) => isKind(given.unit, kind)));
    if (needing !== undefined) {
      const args = { ...say, species: needing.species.key };
      report(binding, problem("run-lacks-volume", args, origin, below("volume 50.00 mL")));
    }
  }
}

/** Says of each mass that was taken that it gives no amount where no molar mass is known. */
export function checkMasses(binding: Binding, run: Run): void {
  for (const { species, given, origin: line } of run.taken) {
    if (
      species.formula === null &&
      species.molarMass === null &&
      !binding.halfDeclared.has(species.key) &&
      (isKind(given.unit, "mass") || isKind(given.unit, "massConcentration"))
    ) {
      report(binding, problem("taken-needs-formula", { species: species.key }, line));
    }
  }
}
