import type { Reaction } from "../../study/reaction.js";

/** Keys of the species a reaction uses up, in the order they are written. */
export function usedUp(reaction: Reaction): string[] {
  return [...reaction.numbers].filter(([, number]) => number < 0).map(([key]) => key);
}

/** Keys of the species whose amount the reaction changes. */
export function changed(reaction: Reaction): string[] {
  return [...reaction.numbers].filter(([, number]) => number !== 0).map(([key]) => key);
}

/** A list of species in a sentence. */
export function describeSpecies(keys: readonly string[]): string {
  if (keys.length < 2) return keys[0] ?? "a reactant";
  return `${keys.slice(0, -1).join(", ")} or ${keys.at(-1)}`;
}
