import { readSpecies } from "../../chemistry/readSpecies.js";
import { type Origin, type Problem, placed, problem, replacement } from "../../contract/problem.js";
import { nearest } from "../../quantity/nearest.js";
import { isFault } from "../../quantity/shifted.js";
import type { Reaction, Species } from "../../study/reaction.js";
import { originOf, textOf } from "../fields.js";
import type { Statement } from "../syntax.js";
import { type Binding, lineOnTop, report } from "./binding.js";

/**
 * The species a field names: a declared name wins over a formula. Null where it is neither, which is reported
 * unless a broken reaction line names it too.
 */
export function resolveSpecies(
  binding: Binding,
  statement: Statement,
  field: string,
  reactions: readonly Reaction[],
): Species | null {
  const text = textOf(statement, field);
  if (text === null) return null;
  return resolveSpeciesText(binding, text, originOf(binding.uri, statement, field), reactions);
}

/** The same for a text that stands at `origin`. */
export function resolveSpeciesText(
  binding: Binding,
  text: string,
  origin: Origin,
  reactions: readonly Reaction[],
): Species | null {
  const declared = binding.declared.get(withoutState(text));
  if (declared !== undefined) {
    binding.uses.push({ kind: "species", name: declared.key, run: null, declares: false, origin });
    return declared;
  }
  const reading = readSpecies(text);
  if (!isFault(reading) && reading.end === text.length) return bareSpecies(reading.key, reading.formula);
  if (binding.salvaged.has(withoutState(text))) return null;
  if (isFault(reading)) {
    const known = [...binding.declared.keys(), ...reactions.flatMap(({ numbers }) => [...numbers.keys()])];
    const near = nearest(text, [...new Set(known)]);
    // A name of the study that is near is a likelier mend than an element.
    const mend = near.map((name) => replacement(origin, name));
    const args = { what: "species", name: text, known: `; there is ${near.join(" or ")}` };
    if (near.length === 0) report(binding, withDeclaration(binding, placed(reading, binding.uri, origin.start), text));
    else report(binding, problem("name-unknown", args, origin, mend));
    return null;
  }
  const rest = { uri: binding.uri, start: origin.start + reading.end, end: origin.end };
  report(binding, problem("formula-left-over", { formula: reading.key, rest: text.slice(reading.end) }, rest));
  return null;
}

/** A word that is no formula may be a name that is not declared yet: then its declaration is a mend. */
export function withDeclaration(binding: Binding, found: Problem, word: string): Problem {
  if (found.code !== "species-unknown" || !/^[\p{L}\p{N}_\-′]+$/u.test(word)) return found;
  return { ...found, mend: [...(found.mend ?? []), lineOnTop(binding, `species ${word}`)] };
}

/** How the study calls what a text names: its declared name, or the normal form of its formula, else the text. */
export function speciesKey(binding: Pick<Binding, "declared">, text: string): string {
  if (binding.declared.has(withoutState(text))) return withoutState(text);
  const reading = readSpecies(text);
  return isFault(reading) ? text : reading.key;
}

/** A species of which no more is known than its formula. */
export function bareSpecies(key: string, formula: Species["formula"]): Species {
  return { key, formula, molarMass: null, charge: null, pKa: null, absorptivities: [] };
}

function withoutState(text: string): string {
  return text.replace(/\((s|l|g|aq)\)$/, "");
}
