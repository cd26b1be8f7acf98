import { type Fault, fault, replacement, type Span } from "../contract/problem.js";
import { type Dimension, dimensionless, sameDimension } from "./dimension.js";
import { type Kind, kindOf, kinds, unitInWords } from "./kinds.js";
import type { Unit } from "./unit.js";

/** What a place wants: the word that opens the message (`Volume`) and the dimensions it takes. */
export interface Expected {
  readonly name: string;
  readonly dimensions: readonly Dimension[];
}

/**
 * Null where `unit` is of one of the expected dimensions, else the fault in words. `unit` null means that none was
 * written; `span` is that of the unit, or of the number where there is none. `shown` is the unit as written.
 */
export function checkDimension(unit: Unit | null, expected: Expected, span: Span, shown?: string): Fault | null {
  const { name, dimensions } = expected;
  const given = unit?.dimension ?? dimensionless;
  if (dimensions.some((dimension) => sameDimension(dimension, given))) return null;
  const wanted = dimensions.map(kindOf).filter((found): found is Kind => found !== null);
  const named = wanted.filter((entry) => entry !== kinds.number);
  const share = named.length < wanted.length ? " or a share" : "";
  const kind = `a unit of ${listed(named.map((entry) => entry.name))}${share}`;
  const samples =
    wanted.length === 1 ? (wanted[0]?.samples ?? "") : wanted.map(({ unit: one }) => pretty(one) || "%").join(", ");
  if (unit === null || unit.text === "")
    return fault("missing-unit", { name, kind, samples }, span, insertions(wanted, span));
  const text = shown ?? pretty(unit.text);
  const celsius = wanted.includes(kinds.temperature) && unit.text === "C";
  if (celsius) return fault("coulomb-for-celsius", { name: name.toLowerCase() }, span, [replacement(span, "°C")]);
  const givenKind = unitInWords(unit);
  if (wanted.length === 1 && wanted[0] === kinds.number) {
    return fault("unit-for-plain-number", { name, given: text, givenKind }, span);
  }
  return fault(
    "wrong-dimension",
    { name, kind, samples, given: text, givenKind },
    span,
    spelledOtherwise(unit, wanted, span),
  );
}

/**
 * The slips of hand that have one sensible mend: `F` for °F, `S` for s, `MIN` and the like are unknown units anyway.
 */
function spelledOtherwise(unit: Unit, wanted: readonly Kind[], span: Span) {
  if (wanted.includes(kinds.temperature) && unit.text === "deg") return [replacement(span, "°C")];
  if (wanted.includes(kinds.temperature) && unit.text === "F") return [replacement(span, "°F")];
  if (wanted.includes(kinds.time) && unit.text === "S") return [replacement(span, "s")];
  if (wanted.includes(kinds.time) && unit.text === "H") return [replacement(span, "h")];
  if (wanted.includes(kinds.time) && unit.text === "m") return [replacement(span, "min")];
  if (wanted.includes(kinds.length) && unit.text === "M") return [replacement(span, "m")];
  if (wanted.includes(kinds.concentration) && unit.text === "m") return [replacement(span, "M")];
  if (wanted.includes(kinds.concentration) && unit.text === "mm") return [replacement(span, "mM")];
  return [];
}

function insertions(wanted: readonly Kind[], { end }: Span) {
  return wanted
    .filter(({ unit }) => unit !== "")
    .map(({ unit }) => ({ text: pretty(unit), edits: [{ start: end, end, text: ` ${pretty(unit)}` }] }));
}

function pretty(text: string): string {
  return text.replace(/\bdeg([CF])\b/g, "°$1").replace(/^u(?=[A-Za-z])/, "µ");
}

function listed(names: readonly string[]): string {
  if (names.length < 2) return names.join("");
  return `${names.slice(0, -1).join(", ")} or ${names.at(-1)}`;
}
