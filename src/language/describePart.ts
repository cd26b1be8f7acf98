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
      return quantityWords[part.kind];
    case "optional":
      return part.parts[0] === undefined ? "the end of the line" : describePart(part.parts[0]);
    case "either":
      return describeParts(part.options.flatMap((option) => option.slice(0, 1)));
  }
}

const quantityWords = {
  time: "a time with its unit, such as 60 s,",
  volume: "a volume with its unit, such as 50.00 mL,",
  temperature: "a temperature with its unit, such as 25.0 °C,",
  taken: "a concentration, an amount or a mass with its unit, such as 0.100 mol/L,",
  reading: "a reading with its unit, such as 0.100 mol/L,",
  uncertainty: "an uncertainty with its unit, such as 0.002 mol/L or 1 %,",
} as const;

/** Fixed words that the parts can begin with. */
export function firstWords(parts: readonly Part[]): string[] {
  return parts.flatMap((part) => {
    if (part.part === "keyword") return [part.word];
    if (part.part === "words") return [part.phrase];
    if (part.part === "optional") return firstWords(part.parts.slice(0, 1));
    if (part.part === "either") return part.options.flatMap((option) => firstWords(option.slice(0, 1)));
    return [];
  });
}
