import type { Part } from "../shape.js";
import type { StatementRow } from "../statements.js";

const remembered = new WeakMap<StatementRow, ReadonlyMap<string, Part>>();

/** What the table says of the field that a line holds under a label; of a list what it lists. */
export function partOfField(row: StatementRow, label: string): Part | null {
  let known = remembered.get(row);
  if (known === undefined) {
    const parts = new Map<string, Part>();
    collect(row.parts, parts);
    remembered.set(row, parts);
    known = parts;
  }
  return known.get(label) ?? null;
}

function collect(parts: readonly Part[], found: Map<string, Part>): void {
  for (const part of parts) {
    if (part.part === "optional") collect(part.parts, found);
    else if (part.part === "either" || part.part === "any") for (const option of part.options) collect(option, found);
    else if (part.part === "list") found.set(part.label, part.of);
    else if ("label" in part && (part.part !== "words" || !found.has(part.label))) found.set(part.label, part);
  }
}
