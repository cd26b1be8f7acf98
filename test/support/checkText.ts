import type { Problem } from "../../src/contract/problem.js";
import { messageOf } from "../../src/contract/words.js";
import { type Bound, bind } from "../../src/language/bind/bind.js";
import { parse } from "../../src/language/parse.js";

export const uri = "file:///lab/a.raterun";

/** Parses and binds a text. */
export function boundText(text: string): Bound {
  return bind(parse(uri, text));
}

/** What the text alone tells is wrong: `code “marked words”: message`. */
export function saidOf(text: string): string[] {
  return boundText(text).problems.map((problem) => {
    const marked = text.slice(problem.origin.start, problem.origin.end);
    return `${problem.code} “${marked}”: ${messageOf(problem)}`;
  });
}

/** The text after the first mend of its first problem of a code, or of its first problem. */
export function mended(text: string, code?: Problem["code"], which = 0): string {
  const found = boundText(text).problems.find((problem) => code === undefined || problem.code === code);
  const edits = [...(found?.mend?.[which]?.edits ?? [])].sort((a, b) => b.start - a.start);
  return edits.reduce((now, { start, end, text: words }) => now.slice(0, start) + words + now.slice(end), text);
}
