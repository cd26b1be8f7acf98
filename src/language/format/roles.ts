import type { Part } from "../shape.js";
import type { StatementRow } from "../statements.js";

/** What a field of a line is to the formatter: how it may be respelled, and whether it is a fixed phrase. */
export type Role = "quantity" | "species" | "equation" | "phrase" | "other";

const remembered = new WeakMap<StatementRow, ReadonlyMap<string, Role>>();

/** The role of each field of a kind of line by its label; in a list, that of what it lists. */
export function rolesOf(row: StatementRow): ReadonlyMap<string, Role> {
  const known = remembered.get(row);
  if (known !== undefined) return known;
  const roles = new Map<string, Role>();
  collect(row.parts, roles);
  remembered.set(row, roles);
  return roles;
}

function collect(parts: readonly Part[], roles: Map<string, Role>): void {
  for (const part of parts) {
    for (const inner of innerParts(part)) collect(inner, roles);
    if (!("label" in part)) continue;
    const role = roleOf(part);
    // A label that is a phrase in one reading of the line and a value in another is spaced as a phrase in both.
    if (roles.get(part.label) !== "phrase") roles.set(part.label, role);
  }
}

function roleOf(part: object): Role {
  if ("of" in part && isPart(part.of)) return roleOf(part.of);
  const kind = "part" in part ? part.part : null;
  if (kind === "quantity" || kind === "unit") return "quantity";
  if (kind === "species" || kind === "formula") return "species";
  if (kind === "equation") return "equation";
  return kind === "words" ? "phrase" : "other";
}

/** The parts that a part is made of, whatever it is called. */
function innerParts(part: Part): (readonly Part[])[] {
  const inner: (readonly Part[])[] = [];
  if ("parts" in part) inner.push(part.parts);
  if ("options" in part) inner.push(...part.options);
  if ("of" in part && isPart(part.of)) inner.push([part.of]);
  return inner;
}

function isPart(value: unknown): value is Part {
  return typeof value === "object" && value !== null && "part" in value;
}
