import { ionsOf } from "../../chemistry/handbook/dissociation.js";
import { molarMass as molarMassOfFormula } from "../../chemistry/molarMass.js";
import { stockConcentration } from "../../chemistry/stock.js";
import { problem } from "../../contract/problem.js";
import { isKind } from "../../quantity/kinds.js";
import { isFault } from "../../quantity/shifted.js";
import type { Reaction, Species } from "../../study/reaction.js";
import type { Role, Taken } from "../../study/run.js";
import { fieldOf, isBroken, itemsOf, originIn, originOf, quantityOf, textOf } from "../fields.js";
import type { Statement } from "../syntax.js";
import { type Binding, report, reportIn } from "./binding.js";
import { resolveSpecies, resolveSpeciesText } from "./resolveSpecies.js";

/** The `taken` lines of a run. A line that says `none` takes an inherited one out and leaves nothing. */
export function bindTaken(binding: Binding, lines: readonly Statement[], reaction: Reaction | null): Taken[] {
  const reactions = reaction === null ? [] : [reaction];
  return lines.flatMap((statement): Taken[] => {
    if (isBroken(statement) || textOf(statement, "none") !== null) return [];
    const species = resolveSpecies(binding, statement, "species", reactions);
    const given = quantityOf(statement, "given");
    if (species === null || given === null) return [];
    const { uri } = binding;
    const taken: Taken = {
      species,
      given,
      stock: stockOf(statement),
      purity: quantityOf(statement, "purity"),
      density: quantityOf(statement, "density"),
      ions: ionsOnLine(binding, statement, reactions),
      role: (textOf(statement, "role") as Role | null) ?? null,
      origin: originOf(uri, statement),
    };
    checkStock(binding, statement, taken);
    if (reaction?.whole === true && taken.role === null && !takesPart(taken, reaction))
      sayNoPart(binding, statement, taken);
    return [taken];
  });
}

function stockOf(statement: Statement): Taken["stock"] {
  const given = fieldOf(statement, "given");
  const field = given?.kind === "quantity" && given.basis !== null ? given : fieldOf(statement, "stock");
  if (field?.kind !== "quantity") return null;
  if (field.basis === null) return { kind: "concentration", value: field.quantity };
  return { kind: "share", value: field.quantity, basis: field.basis };
}

function ionsOnLine(binding: Binding, statement: Statement, reactions: readonly Reaction[]): readonly Species[] | null {
  const items = itemsOf(statement, "ions");
  if (items.length === 0) return null;
  return items.flatMap(({ text, span }) => {
    const found = resolveSpeciesText(binding, text, originIn(binding.uri, statement, span), reactions);
    return found === null ? [] : [found];
  });
}

/** A volume needs the strength of its stock; anything else has none. */
function checkStock(binding: Binding, statement: Statement, { species, given, stock, density }: Taken): void {
  const isVolume = isKind(given.unit, "volume");
  const isShareOfMixture = isKind(given.unit, "number");
  const origin = originOf(binding.uri, statement, "given");
  if (isVolume && stock === null) {
    report(
      binding,
      problem("taken-volume-of-what", { species: species.key, volume: textOf(statement, "given") ?? "" }, origin),
    );
  }
  if ((isVolume || isShareOfMixture) && stock !== null) {
    const molarMass =
      species.molarMass?.value ?? (species.formula === null ? null : molarMassOfFormula(species.formula));
    const pureDensity = stock.kind === "share" && stock.basis === "volume" ? density : null;
    const facts = { species: species.key, molarMass, density, pureDensity, solventMolarMass: null };
    const field = fieldOf(statement, isVolume ? "stock" : "given");
    const found = field === null ? null : stockConcentration(stock, facts, field.span);
    if (found !== null && isFault(found)) reportIn(binding, statement, 0, found);
  }
  sayUnused(binding, statement, "purity", isKind(given.unit, "mass"));
  sayUnused(binding, statement, "density", stock?.kind === "share");
  if (!isVolume && fieldOf(statement, "stock") !== null) {
    const of = textOf(statement, "stock") ?? "";
    report(binding, problem("stock-without-volume", { stock: of }, originOf(binding.uri, statement, "stock")));
  }
}

/** Says of a part of the line that nothing follows from it as the line stands. */
function sayUnused(binding: Binding, statement: Statement, part: "purity" | "density", used: boolean): void {
  const text = textOf(statement, part);
  if (text === null || used) return;
  const args = {
    part: `${part} ${text}`,
    belongs: part === "purity" ? "a mass" : "a share of a stock, such as 30 % by mass",
  };
  report(binding, problem("taken-part-unused", args, originOf(binding.uri, statement, part)));
}

function sayNoPart(binding: Binding, statement: Statement, { species }: Taken): void {
  const { end } = originOf(binding.uri, statement);
  const asRole = (word: Role) => ({ text: `as ${word}`, edits: [{ start: end, end, text: ` as ${word}` }] });
  const mend = (["catalyst", "inert", "buffer"] as const).map(asRole);
  const origin = originOf(binding.uri, statement, "species");
  report(binding, problem("taken-takes-no-part", { species: species.key }, origin, mend));
}

/** Whether a species, or an ion it gives in water, stands in the reaction. */
function takesPart({ species, ions }: Taken, reaction: Reaction): boolean {
  if (reaction.numbers.has(species.key)) return true;
  const keys = ions?.map(({ key }) => key) ?? ionsOf(species.formula?.text ?? "")?.map(({ key }) => key) ?? [];
  return keys.some((key) => reaction.numbers.has(key));
}
