import type { Position } from "vscode-languageserver";
import type { Bound } from "../../language/bind/bind.js";
import { positionAt } from "../../language/lineIndex.js";
import { everyStatement } from "../../language/navigate/everyStatement.js";
import { commentOf, lineWords, type WordRole } from "../../language/navigate/lineWords.js";
import type { LineStatement } from "../../language/syntax.js";
import type { Feature } from "../context.js";
import { openBound } from "../openBound.js";

/** Kinds of words, in the order of their numbers; those the protocol has no word for are declared in `package.json`. */
const legend = [
  "keyword",
  "connective",
  "class",
  "variable",
  "species",
  "number",
  "unit",
  "string",
  "operator",
  "comment",
] as const;
const modifiers = ["declaration"];

const typeOf: Readonly<Record<WordRole, (typeof legend)[number]>> = {
  head: "keyword",
  keyword: "connective",
  run: "class",
  series: "class",
  mechanism: "class",
  step: "class",
  calibration: "class",
  reaction: "class",
  column: "variable",
  species: "species",
  number: "number",
  unit: "unit",
  string: "string",
  operator: "operator",
  comment: "comment",
};

/** Colours by what each word means: the same word is a keyword on one line and a column on another. */
export const semanticTokens: Feature = {
  capabilities: {
    semanticTokensProvider: { legend: { tokenTypes: [...legend], tokenModifiers: modifiers }, full: true, range: true },
  },
  start(context) {
    const { semanticTokens: requests } = context.connection.languages;
    requests.on(({ textDocument }) => {
      const found = openBound(context, textDocument);
      return { data: found === null ? [] : tokensOf(found.bound, 0, Number.POSITIVE_INFINITY) };
    });
    requests.onRange(({ textDocument, range: { start, end } }) => {
      const found = openBound(context, textDocument);
      return { data: found === null ? [] : tokensOf(found.bound, start.line, afterLine(end)) };
    });
  },
};

function afterLine({ line, character }: Position): number {
  return character === 0 ? line : line + 1;
}

/** The words of lines `from` up to but without `to`, counted from 0, in the five numbers each that the protocol has. */
export function tokensOf({ parsed }: Bound, from: number, to: number): number[] {
  const { text, index } = parsed;
  const byLine = new Map<number, LineStatement[]>();
  for (const { line, offset } of everyStatement(parsed.statements)) {
    const at = positionAt(index, offset).line;
    byLine.set(at, [...(byLine.get(at) ?? []), line]);
  }
  const data: number[] = [];
  let [lastLine, lastStart] = [0, 0];
  for (let line = from; line < Math.min(to, index.starts.length); line++) {
    const start = index.starts[line] ?? 0;
    const lineText = text.slice(start, index.starts[line + 1] ?? text.length).replace(/[\r\n]+$/, "");
    const words = (byLine.get(line) ?? []).flatMap((statement) => lineWords(lineText, statement));
    const comment = commentOf(lineText);
    for (const word of comment === null ? words : [...words, comment]) {
      const type = legend.indexOf(typeOf[word.role]);
      const delta = line === lastLine ? word.start - lastStart : word.start;
      data.push(line - lastLine, delta, word.end - word.start, type, word.declares ? 1 : 0);
      [lastLine, lastStart] = [line, word.start];
    }
  }
  return data;
}
