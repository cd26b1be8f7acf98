import { fileRows } from "./table/fileRows.js";
import { followRows } from "./table/followRows.js";
import type { Owner, StatementRow } from "./table/row.js";
import { runRows } from "./table/runRows.js";
import { seriesRows } from "./table/seriesRows.js";
import { wishRows } from "./table/wishRows.js";

export type { Owner, Repeat, StatementRow } from "./table/row.js";
export { orderInWords } from "./table/wishRows.js";

/** Every kind of line. This table is the language: parsing, ownership, `like`, suggestions and pages read it. */
export const statements: readonly StatementRow[] = [...fileRows, ...runRows, ...followRows, ...wishRows, ...seriesRows];

export const statementByHead: ReadonlyMap<string, StatementRow> = new Map(statements.map((row) => [row.head, row]));

const heads = new Map<Owner, string[]>();

/** First words of the lines that may stand below a header, in the order of the table. */
export function headsBelow(owner: Owner): string[] {
  const known = heads.get(owner);
  if (known !== undefined) return known;
  const found = statements.filter((row) => row.owners.includes(owner)).map((row) => row.head);
  heads.set(owner, found);
  return found;
}
