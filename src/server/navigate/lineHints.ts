import { ionHint } from "../../chemistry/ionHint.js";
import type { Description, Run as RunFindings } from "../../contract/findings.js";
import type { Bound } from "../../language/bind/bind.js";
import { isKind } from "../../quantity/kinds.js";
import { printedQuantity } from "../../report/printedText.js";
import type { Run, Taken } from "../../study/run.js";

/** What follows from a line, to stand behind it. */
export interface LineHint {
  /** end of the line's own words, offset in the text */
  readonly offset: number;
  readonly label: string;
  readonly tooltip: string;
}

interface RunHint extends LineHint {
  readonly run: Run;
}

/**
 * What stands behind the lines of a description: of what was taken its concentration in the mixture, whether it is
 * limiting and its ions; of a fit its k. A line that several runs share shows what holds for all of them, else what
 * holds for the run it stands in, else each with its run's name.
 */
export function lineHints({ study }: Bound, description: Description): LineHint[] {
  const byOffset = new Map<number, RunHint[]>();
  for (const source of study.runs) {
    if (source.kind !== "run") continue;
    const findings = description.runs.find(({ name }) => name === source.run.name);
    if (findings === undefined) continue;
    for (const hint of runHints(source.run, findings)) {
      byOffset.set(hint.offset, [...(byOffset.get(hint.offset) ?? []), hint]);
    }
  }
  return [...byOffset.values()].map(together).sort((a, b) => a.offset - b.offset);
}

/** Runs named on one line at most. */
const mostRuns = 3;

function together(hints: readonly RunHint[]): LineHint {
  const [first] = hints as [RunHint];
  const { offset, tooltip } = first;
  const same = hints.every(({ label }) => label === first.label);
  const own = hints.find(({ run }) => run.block.start <= offset && offset <= run.block.end);
  if (same || own !== undefined) return { offset, label: (own ?? first).label, tooltip: (own ?? first).tooltip };
  const shown = hints.slice(0, mostRuns).map(({ run, label }) => `${run.name}: ${label}`);
  return { offset, label: [...shown, ...(hints.length > mostRuns ? ["…"] : [])].join("; "), tooltip };
}

function runHints(run: Run, findings: RunFindings): RunHint[] {
  const several = (run.reaction?.reactants.length ?? 0) > 1;
  const taken = run.taken.flatMap((one, index): RunHint[] => {
    const found = findings.taken[index];
    const facts = found === undefined ? [] : takenFacts(one, found, several);
    if (facts.length === 0) return [];
    const label = facts.map(({ words }) => words).join(" · ");
    return [{ run, offset: one.origin.end, label, tooltip: facts.map(({ why }) => why).join(" ") }];
  });
  const fits = run.fits.flatMap((wish): RunHint[] => {
    const k = findings.fits.find(({ id }) => id === wish.id)?.parameters["k"];
    if (k === undefined) return [];
    return [
      { run, offset: wish.origin.end, label: `k = ${printedQuantity(k)}`, tooltip: "The rate constant of this fit." },
    ];
  });
  return [...taken, ...fits];
}

interface HintFact {
  readonly words: string;
  readonly why: string;
}

function takenFacts(
  { species, given, ions }: Taken,
  found: RunFindings["taken"][number],
  several: boolean,
): HintFact[] {
  const facts: HintFact[] = [];
  if (found.concentration !== null && !isKind(given.unit, "concentration")) {
    const words = `= ${printedQuantity(found.concentration)}`;
    facts.push({ words, why: "The concentration in the mixture at the start, from what was taken and the volume." });
  }
  if (found.limiting && several) {
    facts.push({ words: "limiting", why: "It is used up first: the others are in excess." });
  }
  const inWater = species.formula === null || ions !== null ? null : ionHint(species.formula.text, "unicode");
  if (inWater !== null) facts.push({ words: inWater, why: "Its ions in water, from the handbook." });
  return facts;
}
