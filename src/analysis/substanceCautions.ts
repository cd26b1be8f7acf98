import type { SubstanceRow } from "../chemistry/handbook/substances.js";
import type { Run as RunFinding } from "../contract/findings.js";
import type { RunSubstance } from "./substancesOf.js";

type Caution = RunFinding["cautions"][number];

/**
 * `dangerous-substance` for whatever of the run the table of substances classes; a gas written (g) is left to the
 * cautions on gases. The table holds for the strength it names, which a description does not state: the text says so.
 */
export function substanceDangers(all: readonly RunSubstance[]): Caution[] {
  return all.flatMap(({ key, state, gas, reagent, like }): Caution[] => {
    if (state === "g" && gas !== null) return [];
    const rows = reagent === null ? like : [reagent];
    return rows.filter(isClassed).map((row) => {
      const own = `${key}: as ${row.name}`;
      const shared = `${key} shares an ion with ${row.name}; that`;
      const text = `${reagent === null ? shared : own} is classed (categories in brackets): ${classes(row)}. ${validity(row)}${asides(row)}`;
      return { code: "dangerous-substance", text, species: [key] };
    });
  });
}

function isClassed({ hazards, also }: SubstanceRow): boolean {
  return hazards.length > 0 || also !== undefined;
}

function classes({ hazards, also }: SubstanceRow): string {
  return [...hazards, ...(also ?? [])].join("; ");
}

function validity({ name }: SubstanceRow): string {
  if (name.includes("%")) return "This holds for that strength; other strengths are classed otherwise.";
  return "This holds for the substance as named; a solution is classed by its strength.";
}

function asides({ sure, note }: SubstanceRow): string {
  const noted = note === undefined ? "" : ` Note: ${note}.`;
  return sure === false ? `${noted} Suppliers differ on these classes.` : noted;
}
