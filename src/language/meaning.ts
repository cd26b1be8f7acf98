import type { Study } from "../study/study.js";

/** Keys that say where and how something is written, not what it means. */
const notMeaning = new Set(["origin", "block", "id", "uri", "reactants", "products", "pathOrigin"]);

/**
 * The meaning of a study as one canonical text: units in SI, keys in order, no places, order only where order
 * matters. Two descriptions that differ in comments, spaces or the unit of a value have the same.
 */
export function meaningOf(study: Study): string {
  return JSON.stringify({ language: 1, study: canonical(study, "study") });
}

function canonical(value: unknown, key: string): unknown {
  if (typeof value === "number") return Number(value.toPrecision(12));
  if (value === null || typeof value !== "object") return value;
  if (value instanceof Map) return sorted([...value].map(([name, entry]) => [name, canonical(entry, key)]));
  if (Array.isArray(value)) {
    const entries = value.map((entry) => canonical(entry, key));
    return unordered.has(key) ? sorted(entries) : entries;
  }
  if (isUnit(value)) return { dimension: value["dimension"], factor: value["factor"], offset: value["offset"] };
  const kept: Record<string, unknown> = {};
  for (const name of Object.keys(value).sort()) {
    const entry = (value as Record<string, unknown>)[name];
    if (notMeaning.has(name) || (name === "unit" && isUnit(entry)) || (name === "text" && "reversible" in value))
      continue;
    kept[name] = canonical(entry, name);
  }
  return kept;
}

/** Lists whose order says nothing. */
const unordered = new Set(["taken", "columns", "species", "sources"]);

function sorted(entries: readonly unknown[]): unknown[] {
  const keyed = entries.map((entry) => ({ entry, key: JSON.stringify(entry) }));
  keyed.sort((a, b) => (a.key < b.key ? -1 : a.key > b.key ? 1 : 0));
  return keyed.map(({ entry }) => entry);
}

function isUnit(value: unknown): value is Record<string, unknown> {
  return typeof value === "object" && value !== null && "dimension" in value && "factor" in value && "parts" in value;
}
