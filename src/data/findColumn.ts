import { type Origin, type Problem, problem, replacement } from "../contract/problem.js";
import { failure, type Result, success } from "../contract/result.js";
import { nearest } from "../quantity/nearest.js";
import type { Columns } from "./columns.js";

/**
 * The index of the column that a description asks for, by its header or by its number (from 1). `file` is the path as
 * the description writes it; `origin` the header in its quotes, or the number, which a mend replaces. A header is found
 * as written or, where none is, with blanks and letter case apart. Refuses a header that is not there or there more than
 * once, a number that is not there, a header where the file has no header row, and a file without rows.
 */
export function findColumn(columns: Columns, wanted: string | number, file: string, origin: Origin): Result<number> {
  if (typeof wanted === "number") return byNumber(columns, wanted, file, origin);
  const line = columns.headerLine;
  if (line === null) return failure(problem("data-no-header", { file, header: wanted }, origin));
  const exact = indicesWhere(columns, (header) => header === wanted);
  const found = exact.length > 0 ? exact : indicesWhere(columns, (header) => loose(header) === loose(wanted));
  const [first] = found;
  if (first === undefined) return failure(missing(columns, wanted, file, line, origin));
  if (found.length === 1) return withRows(columns, first, file, origin);
  const numbers = listed(found.map((index) => String(index + 1)));
  const mends = found.map((index) => replacement(origin, String(index + 1)));
  return failure(problem("data-column-twice", { file, header: wanted, line, numbers }, origin, mends));
}

function byNumber(columns: Columns, wanted: number, file: string, origin: Origin): Result<number> {
  const count = columns.columns.length;
  if (Number.isInteger(wanted) && wanted >= 1 && wanted <= count) return withRows(columns, wanted - 1, file, origin);
  return failure(problem("data-column-number", { file, number: wanted, columns: count }, origin));
}

function withRows(columns: Columns, index: number, file: string, origin: Origin): Result<number> {
  if (columns.rows > 0) return success(index);
  return failure(problem("data-no-rows", { file, line: columns.headerLine ?? 1 }, origin));
}

function missing(columns: Columns, wanted: string, file: string, line: number, origin: Origin): Problem {
  const headers = columns.columns.map((column) => column.header).filter((header) => header !== "");
  const mend = likely(wanted, headers).map((header) => replacement(origin, `"${header}"`));
  const args = { file, header: wanted, headers: listed(headers.map((header) => `“${header}”`)), line };
  return problem("data-column-missing", args, origin, mend);
}

/** Headers that may be meant: those a slip or two away, then those that go on where `wanted` ends (`t`, `t / s`). */
function likely(wanted: string, headers: readonly string[]): string[] {
  const plain = headers.filter((header) => !/["\n]/.test(header));
  const near = nearest(loose(wanted), plain.map(loose));
  const longer = plain.filter((header) => wanted !== "" && loose(header).startsWith(`${loose(wanted)} `));
  return [...new Set([...plain.filter((header) => near.includes(loose(header))), ...longer])].slice(0, 3);
}

function indicesWhere(columns: Columns, holds: (header: string) => boolean): number[] {
  return columns.columns.flatMap((column, index) => (holds(column.header) ? [index] : []));
}

function loose(header: string): string {
  return header.replace(/\s+/g, " ").trim().toLowerCase();
}

/** `a, b and c`; of more than eight the first eight. */
function listed(items: readonly string[]): string {
  if (items.length > 8) return `${items.slice(0, 8).join(", ")} and ${items.length - 8} more`;
  return items.length < 2 ? items.join("") : `${items.slice(0, -1).join(", ")} and ${items.at(-1)}`;
}
