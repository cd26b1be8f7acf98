import { describeParts } from "../../language/describePart.js";
import type { Part } from "../../language/shape.js";

/** How a line is written: fixed words small, what is filled in by a word in capitals, optional parts in brackets. */
export function syntaxLine(head: string, parts: readonly Part[]): string {
  return [head, ...parts.map(syntaxOf)].join(" ");
}

function syntaxOf(part: Part): string {
  switch (part.part) {
    case "keyword":
      return part.word;
    case "words":
      return part.phrase;
    case "optional":
      return `[${part.parts.map(syntaxOf).join(" ")}]`;
    case "either":
      return `(${part.options.map((option) => option.map(syntaxOf).join(" ")).join(" | ")})`;
    case "any":
      return part.options.map((option) => `[${option.map(syntaxOf).join(" ")}]`).join(" ");
    case "list":
      return `${syntaxOf(part.of)}, …`;
    default:
      return placeholder(part);
  }
}

/** Parts that a writer fills in. */
type Filled = Exclude<Part, { readonly part: "keyword" | "words" | "optional" | "either" | "any" | "list" }>;

function placeholder(part: Filled): string {
  switch (part.part) {
    case "string":
      return `"${part.label}"`;
    case "name":
      return part.declares ? "NAME" : capitals(part.of);
    case "quantity":
      return part.kind === "taken" ? "QUANTITY" : capitals(part.kind);
    case "run reference":
      return "RUN";
    case "integer":
    case "number":
      return capitals(part.label);
    default:
      return capitals(part.part);
  }
}

/** `molarMass` as `MOLAR-MASS`. */
function capitals(name: string): string {
  return name.replace(/([a-z])([A-Z])/g, "$1-$2").toUpperCase();
}

/** What is filled in on a line, each once: the word of its syntax line, and what it stands for. */
export function filledIn(parts: readonly Part[]): { word: string; words: string }[] {
  const found = new Map<string, string>();
  const visit = (part: Part): void => {
    switch (part.part) {
      case "keyword":
      case "words":
        return;
      case "optional":
        part.parts.forEach(visit);
        return;
      case "either":
      case "any":
        part.options.flat().forEach(visit);
        return;
      case "list":
        visit(part.of);
        return;
      default:
        found.set(placeholder(part), describeParts([part]).replace(/,$/, ""));
    }
  };
  parts.forEach(visit);
  return [...found].map(([word, words]) => ({ word, words }));
}
