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
const statedParts = new Set(["conditions", "taken", "sources"]);
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

/** What the keys of a record are called in a sentence. */
const keyWords: Readonly<Record<string, string>> = {
  degreesOfFreedom: "degrees of freedom",
  interval95: "95 % interval",
  uRandom: "random part of u",
  uCommon: "common part of u",
  uCorrelated: "u of dependent readings",
  reducedChiSquare: "reduced chi²",
  aicc: "AICc",
  condition: "condition number",
  correlation: "correlation of neighbouring residuals",
  residual: "residual standard deviation",
  sha256: "SHA-256",
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
    const called = keyWords[key] ?? key;
    if (typeof value === "number") numbers.set(called, { value, within: allowance(key, value, u) });
    else if (key === "rows" && Array.isArray(value)) {
      for (const [name, entry] of covarianceNumbers(value, fact["with"])) numbers.set(name, entry);
    } else if (Array.isArray(value) && value.some((entry) => typeof entry === "number")) {
      for (const [index, entry] of value.entries()) {
        const name = entryName(fact, key, index);
        if (typeof entry === "number") numbers.set(name, { value: entry, within: allowance(key, entry, u) });
        else words.set(name, String(entry));
      }
    } else words.set(called, Array.isArray(value) ? value.join(", ") : String(value));
  }
  return { what: String(fact["what"]), stated, text: textOf(fact), numbers, words };
}

/** Lists that say of each entry of another list what it is. */
const namedBy: Readonly<Record<string, readonly [words: string, list: string]>> = {
  shares: ["share of ", "sources"],
  statistics: ["", "tests"],
  p: ["p of the ", "tests"],
  weights: ["weight of ", "fits"],
};

/** One entry of a list of numbers, in words. */
function entryName(fact: Readonly<Record<string, unknown>>, key: string, index: number): string {
  const [words, list] = namedBy[key] ?? ["", ""];
  const names = fact[list];
  const name: unknown = Array.isArray(names) ? names[index] : undefined;
  if (typeof name === "string") return words + name;
  return key === "interval95" ? `${index === 0 ? "lower" : "upper"} end of the 95 % interval` : `${key} ${index + 1}`;
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

/** A quantity as it is written; of anything else its parts by name, where they are not in its words already. */
function textOf(fact: Readonly<Record<string, unknown>>): string {
  if (typeof fact["text"] === "string") return fact["text"];
  if ("code" in fact) return typeof fact["times"] === "number" && fact["times"] > 1 ? `${fact["times"]} times` : "";
  const parts = Object.entries(fact).filter(([key, value]) => !["what", "name"].includes(key) && value !== null);
  const words = (value: unknown): string => (Array.isArray(value) ? value.map(words).join(", ") : String(value));
  return parts.map(([key, value]) => `${keyWords[key] ?? key} ${words(value)}`).join(", ");
}
