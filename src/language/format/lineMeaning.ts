import { equationText } from "../../chemistry/equation.js";
import { readEquation } from "../../chemistry/readEquation.js";
import { parseLine } from "../parseLine.js";
import { type IsDeclared, keyOf } from "./speciesSigns.js";

/** Keys of a field that say where and how it is written. */
const spelling = new Set(["span", "unitSpan", "start", "end"]);

/** Whether two lines by themselves say the same, both without a fault. */
export function sameLine(before: string, after: string, isDeclared: IsDeclared): boolean {
  return before === after || lineMeaning(before, isDeclared) === lineMeaning(after, isDeclared);
}

function lineMeaning(text: string, isDeclared: IsDeclared): string {
  const { statements, fault } = parseLine(text);
  const all = statements.map(({ row, fields }) => [
    row?.head ?? null,
    [...fields].map(([label, field]) => [label, meaning(field, isDeclared)]),
  ]);
  return JSON.stringify([fault?.code ?? null, all]);
}

function meaning(value: unknown, isDeclared: IsDeclared): unknown {
  if (Array.isArray(value)) return value.map((entry: unknown) => meaning(entry, isDeclared));
  if (typeof value !== "object" || value === null) return value;
  if ("dimension" in value && "factor" in value && "offset" in value) {
    return { dimension: value.dimension, factor: value.factor, offset: value.offset };
  }
  // The words of a number or unit are its spelling; those of everything else are what it says.
  const inWords = !("value" in value || "unit" in value || "quantity" in value || "items" in value);
  return Object.fromEntries(
    Object.entries(value).flatMap(([name, entry]: [string, unknown]) => {
      if (spelling.has(name)) return [];
      if (name !== "text" || typeof entry !== "string") return [[name, meaning(entry, isDeclared)]];
      return inWords ? [[name, chemicalMeaning(entry, isDeclared)]] : [];
    }),
  );
}

/** A text as the species or equation it may be: two spellings of one are the same. */
function chemicalMeaning(text: string, isDeclared: IsDeclared): string {
  const key = keyOf(text, isDeclared);
  if (key !== null) return key;
  const { equation } = readEquation(text, isDeclared);
  return equation === null ? text : equationText(equation);
}
