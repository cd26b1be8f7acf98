import type { Origin, Span } from "../contract/problem.js";
import type { Quantity } from "../quantity/quantity.js";
import type { Unit } from "../quantity/unit.js";
import type { Field, OrderTerm, Statement } from "./syntax.js";

/** The field a line holds under a label, or null where the line has none. */
export function fieldOf(statement: Statement, label: string): Field | null {
  return statement.line.fields.get(label) ?? null;
}

export function textOf(statement: Statement, label: string): string | null {
  return fieldOf(statement, label)?.text ?? null;
}

export function quantityOf(statement: Statement, label: string): Quantity | null {
  const field = fieldOf(statement, label);
  return field?.kind === "quantity" ? field.quantity : null;
}

export function numberOf(statement: Statement, label: string): number | null {
  const field = fieldOf(statement, label);
  return field?.kind === "number" ? field.value : null;
}

/** The items of a list, none where the line has no such list. */
export function itemsOf(statement: Statement, label: string): readonly Field[] {
  const field = fieldOf(statement, label);
  return field?.kind === "list" ? field.items : [];
}

export function ordersOf(statement: Statement, label: string): readonly OrderTerm[] {
  const field = fieldOf(statement, label);
  return field?.kind === "orders" ? field.items : [];
}

export function unitOf(statement: Statement, label: string): Unit | null {
  const field = fieldOf(statement, label);
  return field?.kind === "unit" ? field.unit : null;
}

/** Where a field stands in the text; the whole line where it has none under that label. */
export function spanOf(statement: Statement, label?: string): Span {
  const span = (label === undefined ? null : fieldOf(statement, label)?.span) ?? statement.line.span;
  return { start: span.start + statement.offset, end: span.end + statement.offset };
}

/** Where a piece of a line stands in the text, from its place in the line. */
export function originIn(uri: string, statement: Statement, span: Span): Origin {
  return { uri, start: span.start + statement.offset, end: span.end + statement.offset };
}

export function originOf(uri: string, statement: Statement, label?: string): Origin {
  return { uri, ...spanOf(statement, label) };
}

/** From the line's first word to the end of the last line that belongs to it. */
export function blockOf(uri: string, statement: Statement): Origin {
  const own = spanOf(statement);
  const end = statement.children.reduce((latest, child) => Math.max(latest, blockOf(uri, child).end), own.end);
  return { uri, start: own.start, end };
}

/** Whether the line has a syntax fault, so that it means nothing. */
export function isBroken(statement: Statement): boolean {
  return statement.line.fault !== null;
}
