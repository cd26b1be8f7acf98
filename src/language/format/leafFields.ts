import type { LineStatement } from "../syntax.js";
import { type Role, rolesOf } from "./roles.js";

/** A value on a line: where it stands, from the start of the line, and how it may be respelled. */
export interface Leaf {
  readonly start: number;
  readonly end: number;
  readonly role: Role;
}

/** The values of a line from left to right; those of a list one by one. */
export function leafFields(line: LineStatement): Leaf[] {
  if (line.row === null) return [];
  const roles = rolesOf(line.row);
  const leaves: Leaf[] = [];
  for (const [label, field] of line.fields) collect(field, roles.get(label) ?? "other", leaves);
  leaves.sort((a, b) => a.start - b.start || b.end - a.end);
  return leaves.filter((leaf, index) => index === 0 || leaf.start >= (leaves[index - 1]?.end ?? 0));
}

interface Placed {
  readonly span: { readonly start: number; readonly end: number };
}

/** A value that holds others is a list: they are collected in its place. */
function collect(value: Placed, role: Role, leaves: Leaf[]): void {
  const items = Object.values(value).flatMap((inner: unknown) => (Array.isArray(inner) ? inner.flatMap(placedIn) : []));
  if (items.length > 0) for (const item of items) collect(item.value, item.role ?? role, leaves);
  else leaves.push({ start: value.span.start, end: value.span.end, role: certain(value, role) });
}

/** An item of a list: a value, or a record of values under names that say what they are. */
function placedIn(item: unknown): { value: Placed; role: Role | null }[] {
  if (isPlaced(item)) return [{ value: item, role: null }];
  if (typeof item !== "object" || item === null) return [];
  return Object.entries(item).flatMap(([name, value]: [string, unknown]) =>
    isPlaced(value) ? [{ value, role: name === "species" ? "species" : "other" }] : [],
  );
}

function isPlaced(value: unknown): value is Placed {
  if (typeof value !== "object" || value === null || !("span" in value)) return false;
  const { span } = value;
  return typeof span === "object" && span !== null && "start" in span && "end" in span;
}

/** Only what was read as a quantity is respelled as one: in its place a text in quotes may stand. */
function certain(value: Placed, role: Role): Role {
  const kind = "kind" in value ? value.kind : null;
  if (kind === "quantity" || kind === "unit") return "quantity";
  return role === "quantity" ? "other" : role;
}
