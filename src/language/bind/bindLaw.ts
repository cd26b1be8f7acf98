import { problem } from "../../contract/problem.js";
import type { Reaction } from "../../study/reaction.js";
import type { FitWish, Law } from "../../study/wish.js";
import { fieldOf, ordersOf, originIn, originOf } from "../fields.js";
import type { OrderTerm, Statement } from "../syntax.js";
import { type Binding, report } from "./binding.js";
import { describeSpecies, usedUp } from "./reactionSpecies.js";
import { resolveSpecies, resolveSpeciesText } from "./resolveSpecies.js";

type BoundLaw = Pick<FitWish, "law" | "lawText">;

/** The rate law of a `fit` line; null where a species of it is not known or cannot be. */
export function bindLaw(binding: Binding, statement: Statement, reaction: Reaction | null): BoundLaw | null {
  const reactions = reaction === null ? [] : [reaction];
  const terms = ordersOf(statement, "orders");
  if (terms.length === 0) {
    const species = resolveSpecies(binding, statement, "species", reactions);
    if (species === null) return null;
    sayNotComputed(binding, statement, `saturation in ${species.key}`);
    return { law: { kind: "saturation", species }, lawText: `saturation in ${species.key}` };
  }
  const orders: { order: number | "free"; species: NonNullable<ReturnType<typeof resolveSpecies>> }[] = [];
  for (const { order, species } of terms) {
    const origin = originIn(binding.uri, statement, species.span);
    const found = resolveSpeciesText(binding, species.text, origin, reactions);
    if (found !== null) orders.push({ order, species: found });
  }
  if (orders.length < terms.length) return null;
  const [first] = orders;
  const joined = joinOf(terms);
  if (first !== undefined && joined === "alone" && reaction?.whole === true && !isUsedUp(reaction, first.species.key)) {
    const [term] = terms as [OrderTerm];
    const args = { species: first.species.key, there: describeSpecies(usedUp(reaction)) };
    report(binding, problem("fit-not-in-reaction", args, originIn(binding.uri, statement, term.species.span)));
    return null;
  }
  const law: Law = { kind: "orders", joined, orders };
  const lawText = lawWords(law);
  if (joined !== "alone" || first?.order !== 1)
    sayNotComputed(binding, statement, fieldOf(statement, "orders")?.text ?? lawText);
  return { law, lawText };
}

const joinWords: ReadonlyMap<string, string> = new Map([
  ["then", ", then "],
  ["beside", " beside "],
]);

/** `order 1 in A, order 1 in B` and so on, in the words of the language. */
function lawWords(law: Law): string {
  if (law.kind === "saturation") return `saturation in ${law.species.key}`;
  const join = joinWords.get(law.joined) ?? ", ";
  return law.orders.map(({ order, species }) => `order ${order} in ${species.key}`).join(join);
}

function isUsedUp(reaction: Reaction, key: string): boolean {
  return (reaction.numbers.get(key) ?? 0) < 0;
}

function joinOf(terms: readonly OrderTerm[]): "alone" | "and" | "then" | "beside" {
  const second = terms[1]?.joined;
  return second === undefined || second === "first" ? "alone" : second;
}

function sayNotComputed(binding: Binding, statement: Statement, law: string): void {
  report(binding, problem("fit-not-computed", { law }, originOf(binding.uri, statement)));
}
