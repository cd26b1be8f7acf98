import { toSuperscript } from "../quantity/plainText.js";

/** Element symbols and brackets with numbers behind them, an optional state of charge: `Fe(CN)6^3-`, `H2O2`. */
const formula = /^(?:[A-Z][a-z]?\d*|[([]|[)\]]\d*)+(?:\^\d*[+-])?(?:\((?:aq|s|l|g)\))?$/;
const lowered = "₀₁₂₃₄₅₆₇₈₉";

/** A species as it is printed: a formula with its numbers lowered and its charge raised, any other name as it is. */
export function printedSpecies(name: string): string {
  if (!formula.test(name)) return name;
  return name.replace(/\^(\d*[+-])|\d/g, (found, charge: string | undefined) =>
    charge === undefined ? (lowered[Number(found)] ?? found) : toSuperscript(charge),
  );
}

/** An equation with the signs of print: `2 H2O2 -> 2 H2O + O2` as `2 H₂O₂ → 2 H₂O + O₂`, `<=>` as ⇌. */
export function printedEquation(equation: string): string {
  return equation
    .split(/(\s+)/)
    .map((word) => {
      if (word === "->") return "→";
      return word === "<=>" ? "⇌" : printedSpecies(word);
    })
    .join("");
}

/** A law's words, "order 1 in H2O2", with its species as they are printed. */
export function printedLaw({ law }: { readonly law: string }): string {
  return law.split(" ").map(printedSpecies).join(" ");
}
