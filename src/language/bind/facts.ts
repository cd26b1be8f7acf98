import type { Quantity } from "../../quantity/quantity.js";
import type { Fact } from "../../study/fact.js";
import { isBroken, numberOf, originOf, quantityOf, textOf } from "../fields.js";
import type { Statement } from "../syntax.js";

/** The sound lines with a first word, in order. */
export function linesWith(lines: readonly Statement[], head: string): Statement[] {
  return lines.filter((statement) => statement.line.row?.head === head && !isBroken(statement));
}

/** The sound line with a first word that stands once. */
export function lineWith(lines: readonly Statement[], head: string): Statement | null {
  return linesWith(lines, head)[0] ?? null;
}

/** The quantity of the line with a first word, with where it stands; null where there is none. */
export function quantityFact(
  uri: string,
  lines: readonly Statement[],
  head: string,
  label: string = head,
): Fact<Quantity> | null {
  const statement = lineWith(lines, head);
  const value = statement === null ? null : quantityOf(statement, label);
  return statement === null || value === null ? null : { value, origin: originOf(uri, statement, label) };
}

/** The text of the line with a first word, with where it stands. */
export function textFact(
  uri: string,
  lines: readonly Statement[],
  head: string,
  label: string = head,
): Fact<string> | null {
  const statement = lineWith(lines, head);
  const value = statement === null ? null : textOf(statement, label);
  return statement === null || value === null ? null : { value, origin: originOf(uri, statement, label) };
}

/** The number of the line with a first word. */
export function numberFact(lines: readonly Statement[], head: string, label: string = head): number | null {
  const statement = lineWith(lines, head);
  return statement === null ? null : numberOf(statement, label);
}

/** Whether there is a sound line with this first word. */
export function hasLine(lines: readonly Statement[], head: string): boolean {
  return lineWith(lines, head) !== null;
}
