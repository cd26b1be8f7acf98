import type { Part } from "../language/shape.js";
import { statements } from "../language/statements.js";

/** One rule of a TextMate grammar, as far as it is used here. */
interface Rule {
  readonly name?: string;
  readonly match?: string;
  readonly begin?: string;
  readonly end?: string;
  readonly captures?: { readonly [group: string]: { readonly name: string } };
  readonly beginCaptures?: { readonly [group: string]: { readonly name: string } };
  readonly patterns?: readonly Rule[];
  readonly include?: string;
}

export interface Grammar {
  readonly name: string;
  readonly scopeName: string;
  readonly patterns: readonly Rule[];
  readonly repository: { readonly [name: string]: Rule };
}

const opensQuote = '["“”„]';

/**
 * The highlighting grammar, made from the statement table: each kind of line by its first word, with the words that
 * may follow it on that line and no others. What the first word is decides all else, as in the language itself.
 */
export function grammar(): Grammar {
  const lines = statements.map(({ head, parts, opens }): Rule => {
    const inner = [...new Set(wordsOf(parts))];
    const keywords: Rule[] =
      inner.length === 0
        ? []
        : [{ name: "keyword.other.raterun", match: `(?<![^\\s])(?:${inner.join("|")})(?![^\\s])` }];
    const equation = holds(parts, "equation");
    const name = declares(parts) ? "(?:\\s+([\\p{L}\\p{N}_\\-′']+))?" : "";
    return {
      begin: `^\\s*(${head})(?![^\\s"“”„#])${name}`,
      end: "$",
      beginCaptures: {
        1: { name: `keyword.control.${opens === undefined ? "line" : "header"}.raterun` },
        2: { name: "entity.name.type.raterun" },
      },
      patterns: [
        { include: "#comment" },
        { include: "#string" },
        ...(equation ? [{ include: "#equation" }] : [...keywords, { include: "#date" }, { include: "#number" }]),
      ],
    };
  });
  return {
    name: "Run description",
    scopeName: "source.raterun",
    patterns: [{ include: "#comment" }, ...lines],
    repository: {
      comment: { name: "comment.line.number-sign.raterun", match: "#.*$" },
      string: { name: "string.quoted.double.raterun", match: `${opensQuote}[^"“”„]*(?:${opensQuote}|$)` },
      date: { name: "constant.numeric.date.raterun", match: "(?<![^\\s])\\d{4}-\\d{2}-\\d{2}(?![^\\s])" },
      number: {
        name: "constant.numeric.raterun",
        match:
          "(?<![^\\s±(])[+−-]?(?:\\d+(?:[.,]\\d+)?|\\.\\d+)(?:\\(\\d+(?:\\.\\d+)?\\))?(?:[eE][+−-]?\\d+)?(?![\\p{L}\\d])",
      },
      equation: {
        patterns: [
          { name: "keyword.operator.arrow.raterun", match: "->|<=>|⇌|→" },
          { name: "keyword.operator.plus.raterun", match: "(?<=\\s)\\+(?=\\s)" },
          { name: "constant.numeric.coefficient.raterun", match: "(?<=^|\\s)\\d+(?:/\\d+)?(?=\\s)" },
          { name: "constant.language.state.raterun", match: "\\((?:s|l|g|aq)\\)" },
        ],
      },
    },
  };
}

/** The grammar as its file holds it. */
export function grammarText(): string {
  return `${JSON.stringify(grammar(), null, 2)}\n`;
}

/** Fixed words on a line, in the order of the table; a phrase counts word by word. */
function wordsOf(parts: readonly Part[]): string[] {
  return parts.flatMap((part) => {
    switch (part.part) {
      case "keyword":
        return [part.word];
      case "words":
        return part.phrase.split(" ");
      case "optional":
        return wordsOf(part.parts);
      case "either":
      case "any":
        return part.options.flatMap((option) => wordsOf(option));
      case "list":
        return wordsOf([part.of]);
      case "orders":
        return ["order", "in", "then", "beside", "free"];
      case "quantity":
        return ["within"];
      default:
        return [];
    }
  });
}

function holds(parts: readonly Part[], kind: Part["part"]): boolean {
  return parts.some((part) => part.part === kind);
}

function declares(parts: readonly Part[]): boolean {
  return parts.some((part) => part.part === "name" && part.declares);
}
