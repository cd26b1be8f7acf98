import { quantityKinds } from "./quantityKinds.js";
import type { Part } from "./shape.js";

/** What the parts are, in words for a message: `“from” or “at”`. */
export function describeParts(parts: readonly Part[]): string {
  const described = [...new Set(parts.map(describePart))];
  const last = described.pop() ?? "the end of the line";
  return described.length === 0 ? last : `${described.join(", ")} or ${last}`;
}

function describePart(part: Part): string {
  switch (part.part) {
    case "keyword":
      return `“${part.word}”`;
    case "words":
      return `“${part.phrase}”`;
    case "name":
      return part.declares ? `a name for the ${part.of}` : `the name of a ${part.of}`;
    case "species":
      return "a species";
    case "formula":
      return "a chemical formula";
    case "equation":
      return "an equation such as 2 H2O2 -> 2 H2O + O2";
    case "string":
      return `${part.what} in quotes`;
    case "date":
      return "a date such as 2026-11-03";
    case "integer":
    case "number":
      return part.what;
    case "unit":
      return "a unit";
    case "quantity":
      return quantityKinds[part.kind].words;
    case "charge":
      return "a charge such as 2+";
    case "run reference":
      return "the name of a run or a path in quotes";
    case "orders":
      return "an order such as order 1 in A";
    case "list":
      return describePart(part.of);
    case "optional":
      return part.parts[0] === undefined ? "the end of the line" : describePart(part.parts[0]);
    case "any":
    case "either":
      return describeParts(part.options.flatMap((option) => option.slice(0, 1)));
  }
}

/** Fixed words that the parts can begin with. */
export function firstWords(parts: readonly Part[]): string[] {
  return parts.flatMap((part) => {
    if (part.part === "keyword") return [part.word];
    if (part.part === "words") return [part.phrase];
    if (part.part === "optional") return firstWords(part.parts.slice(0, 1));
    if (part.part === "orders") return ["order"];
    if (part.part === "list") return firstWords([part.of]);
    if (part.part === "either" || part.part === "any")
      return part.options.flatMap((option) => firstWords(option.slice(0, 1)));
    return [];
  });
}
