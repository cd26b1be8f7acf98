import { type Fault, fault, type Mend, type Span } from "../contract/problem.js";
import { unitInWords } from "./kinds.js";
import type { Unit } from "./unit.js";

/** What a share of a mixture is a share of. */
export type Basis = "mass" | "amount" | "volume";

export const bases: readonly Basis[] = ["mass", "amount", "volume"];

const shares: readonly string[] = ["%", "‰", "ppm", "ppb"];

/** Whether a unit says a share: per cent, per mille, parts per million or billion (of a mixture or of a reading). */
export function isShare({ text }: Unit): boolean {
  return shares.includes(text);
}

/** How people write it otherwise, and what they mean. */
const meant: readonly (readonly [RegExp, Basis])[] = [
  [/^\(?(?:w\/w|m\/m|wt|w|weight|masses|m)\b\.?\)?$/i, "mass"],
  [/^\(?(?:n\/n|mol\/mol|mols?|moles?|amounts|x)\b\.?\)?$/i, "amount"],
  [/^\(?(?:v\/v|vol|v|volumes)\b\.?\)?$/i, "volume"],
];

/** `by mass` at the end of `text` (in plain signs), and where it begins; null where nothing like it stands there. */
export function basisAtEnd(text: string): { readonly basis: Basis; readonly start: number } | null {
  const found = /(?:^| |(?<=[%‰]))by +(mass|amount|volume) *$/.exec(text);
  return found === null ? null : { basis: found[1] as Basis, start: found.index };
}

/**
 * The fault of a share whose basis is written in another way (`30 % w/w`, `30 % by weight`) or is none (`30 % by
 * colour`), with the likely mends; null where `text`, a unit in plain signs, is no such thing.
 */
export function basisFault(text: string): Fault | null {
  const found = /^ *(?:%|‰|ppm|ppb) *(\S.*?) *$/.exec(text);
  const tail = found?.[1] ?? "";
  const joined = /^(?:by|of|in)(?![A-Za-z]) *(.*)$/.exec(tail);
  const word = joined?.[1] ?? tail;
  const known = meant.find(([pattern]) => pattern.test(word))?.[1] ?? bases.find((basis) => basis === word);
  if (found === null || (joined === null && known === undefined)) return null;
  const start = text.lastIndexOf(tail);
  const span = { start, end: start + tail.length };
  const space = text.charAt(start - 1) === " " ? "" : " ";
  const mends: Mend[] = (known === undefined ? bases : [known]).map((basis) => ({
    text: `by ${basis}`,
    edits: [{ ...span, text: `${space}by ${basis}` }],
  }));
  return fault("share-basis", { text: tail }, span, mends);
}

/** The fault of a basis behind what is no share, `30 mL by mass`; null behind a share. */
export function basisMisplaced(unit: Unit, basis: Basis, unitEnd: number, span: Span): Fault | null {
  if (isShare(unit)) return null;
  if (unit.text === "") {
    const mends = [{ text: `% by ${basis}`, edits: [{ start: unitEnd, end: unitEnd, text: " %" }] }];
    return fault("share-basis-alone", { basis, given: "a bare number is none" }, span, mends);
  }
  const given = `${unit.text} is ${unitInWords(unit)}`;
  const mends = [{ text: unit.text, edits: [{ start: unitEnd, end: span.end, text: "" }] }];
  return fault("share-basis-alone", { basis, given }, span, mends);
}
