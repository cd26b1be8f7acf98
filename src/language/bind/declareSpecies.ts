import { readFormula } from "../../chemistry/readFormula.js";
import { type Problem, placed } from "../../contract/problem.js";
import { isFault } from "../../quantity/shifted.js";
import type { Species } from "../../study/reaction.js";
import { fieldOf, isBroken, originOf, textOf } from "../fields.js";
import type { Statement } from "../syntax.js";
import type { NameUse } from "./binding.js";

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
    if (reading === null) {
      declared.set(key, { key, formula: null });
    } else if (isFault(reading)) {
      declared.set(key, { key, formula: null });
      const at = statement.offset + (field?.span.start ?? 0);
      const found = placed(reading, uri, at);
      problems.set(`${found.code} ${found.origin.start} ${found.origin.end}`, found);
    } else {
      declared.set(key, { key, formula: reading.formula });
    }
  }
  return declared;
}
