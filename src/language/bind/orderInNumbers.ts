import { type Problem, problem, replacement } from "../../contract/problem.js";
import type { Reaction } from "../../study/reaction.js";
import { orderInWords } from "../statements.js";
import { usedUp } from "./reactionSpecies.js";

const numbers: Readonly<Record<string, string>> = {
  zero: "0",
  zeroth: "0",
  "0th": "0",
  half: "0.5",
  first: "1",
  "1st": "1",
  second: "2",
  "2nd": "2",
  third: "3",
  "3rd": "3",
};

/** Of an order told in words: what to write, in the reactant where there is but one it can be in. */
export function withOrderInNumbers(found: Problem, text: string, reactions: readonly Reaction[]): Problem {
  if (found.code !== "order-in-words") return found;
  const { origin } = found;
  const said = orderInWords.exec(text.slice(origin.start, origin.end))?.[1]?.toLowerCase() ?? "";
  const reactants = [...new Set(reactions.flatMap(usedUp))];
  const example = `order ${numbers[said] ?? "1"} in ${reactants[0] ?? "A"}`;
  const mend = reactants.map((species) => replacement(origin, `order ${numbers[said] ?? "1"} in ${species}`));
  return problem("order-in-words", { example }, origin, mend);
}
