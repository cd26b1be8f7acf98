import { readFormula } from "../../chemistry/readFormula.js";
import { type Problem, placed } from "../../contract/problem.js";
import { isFault } from "../../quantity/shifted.js";
import type { Species } from "../../study/reaction.js";
import { fieldOf, isBroken, originOf, quantityOf, textOf } from "../fields.js";
import type { Statement } from "../syntax.js";
import type { NameUse } from "./binding.js";
import { linesWith, numberFact, quantityFact, textFact } from "./facts.js";

/** The declared species by their names; the first declaration of a name counts. */
export function declareSpecies(
  uri: string,
  problems: Map<string, Problem>,
  uses: NameUse[],
  lines: readonly Statement[],
): ReadonlyMap<string, Species> {
  const declared = new Map<string, Species>();
  for (const statement of lines) {
    const key = textOf(statement, "species");
    if (key === null) continue;
    const origin = originOf(uri, statement, "species");
    uses.push({ kind: "species", name: key, run: null, declares: true, origin });
    if (declared.has(key)) continue;
    const field = fieldOf(statement, "formula");
    const reading = field === null || isBroken(statement) ? null : readFormula(field.text);
    if (reading !== null && isFault(reading)) {
      const at = statement.offset + (field?.span.start ?? 0);
      const found = placed(reading, uri, at);
      problems.set(`${found.code} ${found.origin.start} ${found.origin.end}`, found);
    }
    const formula = reading === null || isFault(reading) ? null : reading.formula;
    declared.set(key, { key, formula, ...factsOf(uri, statement) });
  }
  return declared;
}

function factsOf(uri: string, { children }: Statement): Omit<Species, "key" | "formula"> {
  return {
    molarMass: quantityFact(uri, children, "molar", "molarMass"),
    charge: chargeOf(textFact(uri, children, "ion", "charge")?.value ?? null),
    pKa: numberFact(children, "pKa"),
    absorptivities: linesWith(children, "absorptivity").flatMap((line) => {
      const value = quantityOf(line, "absorptivity");
      const wavelength = quantityOf(line, "wavelength");
      return value === null || wavelength === null ? [] : [{ value, wavelength }];
    }),
  };
}

/** `2+`, `-`: a number of elementary charges. */
function chargeOf(text: string | null): number | null {
  const found = /^(\d*)([+\-−])$/.exec(text ?? "");
  if (found === null) return null;
  const size = found[1] === "" ? 1 : Number(found[1]);
  return found[2] === "+" ? size : -size;
}
