import type { Formula } from "../chemistry/formula.js";
import { type PairRow, pairs } from "../chemistry/handbook/pairs.js";
import { readFormula } from "../chemistry/readFormula.js";
import type { Run as RunFinding } from "../contract/findings.js";
import { isFault } from "../quantity/shifted.js";
import type { RunSubstance } from "./substancesOf.js";

type Caution = RunFinding["cautions"][number];

const ranks = ["danger", "warning", "note"] as const;
const openings = { danger: "Danger", warning: "Take care", note: "Note" } as const;

/**
 * `dangerous-pair` for every two different substances of a run, reagents and products alike, whose groups stand in a row
 * of the table of pairs: one caution for two substances, the gravest row first.
 */
export function pairDangers(all: readonly RunSubstance[]): Caution[] {
  return all.flatMap((first, index) =>
    all.slice(index + 1).flatMap((second): Caution[] => {
      if (first.reagent !== null && first.reagent === second.reagent) return [];
      const rows = ranks.flatMap((rank) => pairs.filter((row) => row.severity === rank && meets(row, first, second)));
      const [gravest] = rows;
      if (gravest === undefined) return [];
      const what = rows.map((row) => describe(row, first, second)).join(" Also: ");
      const text = `${openings[gravest.severity]}, ${first.key} with ${second.key}: ${what} Written for the reagents as supplied.`;
      return [{ code: "dangerous-pair", text, species: [first.key, second.key] }];
    }),
  );
}

function meets({ a, b }: PairRow, first: RunSubstance, second: RunSubstance): boolean {
  const has = (substance: RunSubstance, side: readonly string[]): boolean =>
    side.some((group) => substance.groups.has(group));
  return (has(first, a) && has(second, b)) || (has(first, b) && has(second, a));
}

function describe(row: PairRow, first: RunSubstance, second: RunSubstance): string {
  const gives = row.gives.filter((gas) => canCome(gas, first, second));
  const gas = gives.length === 0 ? "" : `; may give off ${gives.join(", ")}`;
  const strong = [...row.a, ...row.b].some((group) => group.startsWith("concentrated")) ? "concentrated acid" : null;
  const condition = row.condition ?? strong;
  return `${row.text} (${row.effects.join(", ")}${gas}).${condition === null ? "" : ` Condition: ${condition}.`}`;
}

/**
 * Whether a gas of a row can come of these two members of its groups: a row for several groups names the gases of all, and
 * iodide with peroxide gives no nitrogen. Hydrogen and oxygen are always at hand, from water.
 */
function canCome(gas: string, first: RunSubstance, second: RunSubstance): boolean {
  const there = [first, second].map(formulaOf);
  const wanted = readFormula(gas);
  if (isFault(wanted) || there.includes(null)) return true;
  const elements = new Set(["H", "O", ...there.flatMap((formula) => [...(formula?.parts.keys() ?? [])])]);
  return [...wanted.formula.parts.keys()].every((symbol) => elements.has(symbol));
}

function formulaOf({ formula, reagent }: RunSubstance): Formula | null {
  if (formula !== null || reagent === null) return formula;
  const reading = readFormula(reagent.formula);
  return isFault(reading) ? null : reading.formula;
}
