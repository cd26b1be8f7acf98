import { type Arrow, equationText, type Term } from "../../chemistry/equation.js";
import { readEquation } from "../../chemistry/readEquation.js";
import type { Signs } from "./quantitySigns.js";
import { type IsDeclared, speciesSigns } from "./speciesSigns.js";

const printedArrow: Readonly<Record<Arrow, string>> = { "->": "→", "<=>": "⇌" };

/**
 * An equation with single spaces and in the signs that are asked for: `2H2O2 -> 2H2O+O2` as `2 H2O2 → 2 H2O + O2`.
 * As written, and where it cannot be read, an equation stays letter by letter.
 */
export function equationSigns(text: string, signs: Signs, isDeclared: IsDeclared): string {
  const equation = signs === "as written" ? null : readEquation(text, isDeclared).equation;
  if (equation === null) return text;
  const arrow = signs === "ascii" ? equation.arrow : printedArrow[equation.arrow];
  const side = (terms: readonly Term[]): string =>
    terms.map((term) => termSigns(text, term, signs, isDeclared)).join(" + ");
  const respelled = `${side(equation.left)} ${arrow} ${side(equation.right)}`;
  const again = readEquation(respelled, isDeclared).equation;
  return again !== null && equationText(again) === equationText(equation) ? respelled : text;
}

function termSigns(text: string, { span, speciesSpan }: Term, signs: Signs, isDeclared: IsDeclared): string {
  const count = text
    .slice(span.start, speciesSpan.start)
    .replace(/\s+/g, "")
    .replace(/[*·×]$/, "");
  const species = speciesSigns(text.slice(speciesSpan.start, speciesSpan.end), signs, isDeclared);
  const state = text.slice(speciesSpan.end, span.end).trim();
  return (count === "" ? "" : `${signs === "ascii" ? plainCount(count) : count} `) + species + state;
}

function plainCount(count: string): string {
  return count.replace("½", "1/2").replace("¼", "1/4").replace("¾", "3/4");
}
