import { readSpecies } from "../../chemistry/readSpecies.js";
import { fromSubscript, fromSuperscript, toSuperscript } from "../../quantity/plainText.js";
import { isFault } from "../../quantity/shifted.js";
import type { Signs } from "./quantitySigns.js";

/** Whether a word is a name that the description declares: such names are never respelled. */
export type IsDeclared = (name: string) => boolean;

/**
 * A species in the signs that are asked for: `SO4^2-` as `SO4²⁻`, `CuSO4.5H2O` as `CuSO4·5H2O`, and back. Counts are not
 * lowered: H2O2 is what people type. What would be read as another species, or as none, stays as it is.
 */
export function speciesSigns(text: string, signs: Signs, isDeclared: IsDeclared): string {
  if (signs === "as written" || isDeclared(text)) return text;
  const respelled = signs === "ascii" ? keyboard(text) : print(text);
  return respelled === text || keyOf(respelled, isDeclared) !== keyOf(text, isDeclared) ? text : respelled;
}

/** What a species is known by, with its state; null where the text is not wholly a species. */
export function keyOf(text: string, isDeclared: IsDeclared): string | null {
  const read = readSpecies(text, isDeclared);
  return isFault(read) || read.end !== text.length ? null : `${read.key} ${read.state ?? ""}`;
}

function keyboard(text: string): string {
  return fromSubscript(text)
    .replace(/[⁺⁻⁰¹²³⁴-⁹]+/g, (above) => `^${fromSuperscript(above)}`)
    .replace(/(?<=\^\d*)\u2212|\u2212$/g, "-")
    .replace(/[·\u22c5\u2219\u2022]/g, ".");
}

function print(text: string): string {
  return text
    .replace(/\^(\d*)([-+\u2212])(?=$|\()/, (_, size: string, sign: string) =>
      toSuperscript(size + sign.replace("\u2212", "-")),
    )
    .replace(/(?<=[A-Za-z0-9)\]}])[.*\u22c5\u2219\u2022](?=\d*[A-Z([{])/g, "·");
}
