import { itemWords } from "./names.js";
import type { RunRecord } from "./recordShape.js";
import { lastDecimal, lastDigit, lastSignificant } from "./rounded.js";
import { isObject } from "./shape.js";

/** A number, and how far it may move and still be the same. */
interface Allowed {
  readonly value: number;
  readonly within: number;
}

/** One thing that a record states, under words that are the same in any record of the same description. */
export interface Fact {
  readonly what: string;
  /** whether the description states it; else it follows from description and data */
  readonly stated: boolean;
  /** as a person reads it */
  readonly text: string;
  /** numbers with how far each may move and still be the same, by name */
  readonly numbers: ReadonlyMap<string, Allowed>;
  /** everything else it says, by name */
  readonly words: ReadonlyMap<string, string>;
}

/** Parts that repeat what the description says. */
const statedParts = new Set(["conditions", "taken", "sources", "window"]);
/** Facts about an item as a whole that follow from data. */
const found = new Set(["stop"]);

/** Everything that the runs, series and mechanisms of a record state, in its order. */
export function factsOf({ diagnostics, runs, series, mechanisms }: RunRecord): Fact[] {
  const facts: Fact[] = diagnostics.map((diagnostic) => factOf(diagnostic, false));
  for (const item of [...runs, ...series, ...mechanisms]) collect(item, facts);
  return facts;
}

function collect(item: Readonly<Record<string, unknown>>, facts: Fact[]): void {
  const id = typeof item["id"] === "string" ? item["id"] : "";
  for (const [key, value] of Object.entries(item)) {
    if (key === "id") continue;
    if (typeof value === "string") facts.push(wordFact(id, key, value));
    else if (isObject(value)) facts.push(factOf(value, isStated(key, value)));
    else if (Array.isArray(value)) {
      for (const entry of value) {
        if (!isObject(entry)) continue;
        if ("what" in entry) facts.push(factOf(entry, isStated(key, entry)));
        else collect(entry, facts);
      }
    }
  }
}

/** A fixed order and an amount taken are stated; what an amount makes at the start follows from more than itself. */
function isStated(part: string, fact: Readonly<Record<string, unknown>>): boolean {
  return (statedParts.has(part) && fact["start"] !== true) || (part === "orders" && fact["fixed"] === true);
}

function wordFact(id: string, key: string, value: string): Fact {
  const what = `${itemWords(id)}: ${keyWords[key] ?? key}`;
  return { what, stated: !found.has(key), text: value, numbers: new Map(), words: new Map([[key, value]]) };
}

const keyWords: Readonly<Record<string, string>> = {
  timeColumn: "column of the time",
  on: "what is fitted",
  uKind: "kind of uncertainty",
  stop: "how the fit ended",
};

function factOf(fact: Readonly<Record<string, unknown>>, stated: boolean): Fact {
  const numbers = new Map<string, Allowed>();
  const words = new Map<string, string>();
  const u = typeof fact["u"] === "number" ? fact["u"] : null;
  for (const [key, value] of Object.entries(fact)) {
    if (key === "what" || key === "text") continue;
    if (typeof value === "number") numbers.set(key, { value, within: allowance(key, value, u) });
    else if (key === "rows" && Array.isArray(value)) {
      for (const [name, entry] of covarianceNumbers(value, fact["with"])) numbers.set(name, entry);
    } else if (Array.isArray(value) && value.some((entry) => typeof entry === "number")) {
      for (const [index, entry] of value.entries()) {
        const name = `${key} ${index + 1}`;
        if (typeof entry === "number") numbers.set(name, { value: entry, within: allowance(key, entry, u) });
        else words.set(name, String(entry));
      }
    } else words.set(key, Array.isArray(value) ? value.join(", ") : String(value));
  }
  return { what: String(fact["what"]), stated, text: textOf(fact), numbers, words };
}

/** How far a number of a fact may move by rounding alone. */
function allowance(key: string, value: number, u: number | null): number {
  if (key === "value" || key === "interval95") return lastDigit(value, u);
  if (key === "u") return lastSignificant(value, "u");
  if (key.startsWith("u")) return lastDigit(value, u ?? value);
  if (["shares", "conversion", "aicc", "correlation", "weights", "statistics", "p"].includes(key)) return lastDecimal;
  if (["residual", "reducedChiSquare", "condition"].includes(key)) return lastSignificant(value, "measure");
  // The ends of a window have ten digits; what is counted may not move at all.
  return key === "from" || key === "to" ? lastDigit(value, null) : 0;
}

/** The entries of a covariance: each may move by the last digit of the product of the two uncertainties. */
function covarianceNumbers(rows: readonly unknown[], names: unknown): [string, Allowed][] {
  const matrix = rows.map((row) => (Array.isArray(row) ? row.map(Number) : []));
  const u = matrix.map((row, index) => Math.sqrt(row[index] ?? 0));
  const called = (index: number): string => String(Array.isArray(names) ? names[index] : index + 1);
  return matrix.flatMap((row, index) =>
    row.slice(index).map((value, behind): [string, Allowed] => {
      const column = index + behind;
      const within = lastDigit(value, (u[index] ?? 0) * (u[column] ?? 0));
      return [`${called(index)} with ${called(column)}`, { value, within }];
    }),
  );
}

/** A quantity as it is written; of anything else its parts by name, the first words of it left out. */
function textOf(fact: Readonly<Record<string, unknown>>): string {
  if (typeof fact["text"] === "string") return fact["text"];
  const parts = Object.entries(fact).filter(([key, value]) => !["what", "name"].includes(key) && value !== null);
  return parts.map(([key, value]) => `${key} ${Array.isArray(value) ? value.join(", ") : String(value)}`).join(", ");
}
