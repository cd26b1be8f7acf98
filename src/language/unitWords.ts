import type { Token } from "./lexer.js";
import { statementByHead } from "./statements.js";

/** Words that end a quantity or a unit. `within` does not: it belongs to the quantity. */
const stopWords = new Set("and to at in of by as density purity giving using reads because from".split(" "));

/** The index behind the words of a quantity or unit that begins at `from`. Inside brackets no word ends it. */
export function endOfWords(tokens: readonly Token[], from: number): number {
  let depth = 0;
  let at = from;
  for (; at < tokens.length; at++) {
    const token = tokens[at] as Token;
    const partOfIt = token.kind === "word" || (token.kind === "operator" && token.text === "±");
    if (!partOfIt) break;
    if (at > from && beginsBasis(tokens, at - 1)) continue;
    if (depth === 0 && at > from && beginsNext(tokens, at)) break;
    const ends = stopWords.has(token.text) || beginsHead(tokens, at);
    if (at > from && depth === 0 && ends && !beginsBasis(tokens, at)) break;
    for (const letter of token.text) depth += letter === "(" ? 1 : letter === ")" ? -1 : 0;
  }
  return at;
}

/** Whether a number begins something else: it stands behind a unit that is no part of a time such as `1 min 30 s`. */
function beginsNext(tokens: readonly Token[], at: number): boolean {
  const before = tokens[at - 1]?.text ?? "";
  if (!/^\d+(\.\d+)?$/.test(tokens[at]?.text ?? "") || !/\p{L}$/u.test(before)) return false;
  return !/^([\d.]*(d|h|hr|min|s|sec)|within|x|X)$/.test(before);
}

/** Whether a line's first word stands here; of a line of two fixed words (`molar mass`) both. */
function beginsHead(tokens: readonly Token[], at: number): boolean {
  const row = statementByHead.get(tokens[at]?.text ?? "");
  const second = row?.parts[0];
  const next = tokens[at + 1];
  return row !== undefined && (second?.part !== "keyword" || next?.text === second.word);
}

/** `by mass`, and behind a share whatever stands in its place: what it is a share of is a part of its unit. */
function beginsBasis(tokens: readonly Token[], at: number): boolean {
  const [before, by, basis] = [tokens[at - 1], tokens[at], tokens[at + 1]];
  if (by?.text !== "by") return false;
  return /(%|‰|ppm|ppb)$/.test(before?.text ?? "") || /^(mass|amount|volume)$/.test(basis?.text ?? "");
}
