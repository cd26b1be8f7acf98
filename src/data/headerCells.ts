import { parseHeaderUnit } from "../quantity/headerUnit.js";
import type { Unit } from "../quantity/unit.js";
import { type DataOptions, limitsOf } from "./dataOptions.js";
import { decodeText, notTextAt } from "./decodeText.js";
import { bareUnit } from "./headerRows.js";
import { tableLayout } from "./tableLayout.js";
import { linesFrom } from "./textLines.js";

/** A cell of the header row of a data file, and where it stands. */
export interface HeaderCell {
  /** as written, without the quotes of the file */
  readonly header: string;
  /** stated in the cell or in the row of units below it; null where none is that can be read */
  readonly unit: Unit | null;
  /** line of the header row, from 1 */
  readonly line: number;
  /** UTF-16 units from the start of that line, without quotes; null where the cell is not on it as it is written */
  readonly span: { readonly start: number; readonly end: number } | null;
}

/** Bytes that are looked at: the header stands within them. */
const headLength = 131_072;

/**
 * The header cells of a delimited file, left to right, found as `readColumns` finds them but from the first lines alone,
 * so that a file of any size takes a few milliseconds. Null where the file is no table or has no header row.
 */
export function headerCells(bytes: Uint8Array, options: DataOptions = {}): HeaderCell[] | null {
  const decoded = decodeText(firstLines(bytes), options.encoding);
  if (decoded.kind === "refused" || notTextAt(decoded.text, 0, decoded.text.length) >= 0) return null;
  const layout = tableLayout(decoded.text, options, limitsOf(options), parseHeaderUnit);
  if (layout.kind !== "layout" || layout.header === null) return null;
  const { headers, units, line } = layout.header;
  const text = lineText(decoded.text, line);
  let from = 0;
  return headers.map((header, index) => {
    const span = cellSpan(text, header, from, layout.delimiter);
    if (span !== null) from = span.end;
    const below = bareUnit(units?.[index] ?? "");
    const own = parseHeaderUnit(header).unit;
    return { header, unit: own ?? (below === "" ? null : parseHeaderUnit(`x / ${below}`).unit), line, span };
  });
}

/** UTF-16 has two bytes a letter; elsewhere a cut behind a line break cuts no letter. */
function firstLines(bytes: Uint8Array): Uint8Array {
  if (bytes.length <= headLength) return bytes;
  const wide = bytes[0] === 0xff || bytes[0] === 0xfe;
  const end = wide ? headLength : bytes.lastIndexOf(10, headLength) + 1;
  return bytes.subarray(0, end);
}

function lineText(text: string, number: number): string {
  for (const line of linesFrom(text, 0, 1)) if (line.number === number) return text.slice(line.start, line.end);
  return "";
}

/** Between two cells stand nothing but the delimiter, quotes and blanks. */
function cellSpan(text: string, header: string, from: number, delimiter: string): HeaderCell["span"] {
  const start = header === "" ? -1 : text.indexOf(header, from);
  if (start < 0 || text.slice(from, start).replaceAll(delimiter, "").replace(/["\s]/g, "") !== "") return null;
  return { start, end: start + header.length };
}

/** The cell that a column line names, by its header (blanks and case apart where none is the same) or its number. */
export function headerCellOf(
  cells: readonly HeaderCell[],
  by: { readonly header: string } | { readonly number: number },
): HeaderCell | null {
  if ("number" in by) return cells[by.number - 1] ?? null;
  const exact = cells.find(({ header }) => header === by.header);
  return exact ?? cells.find(({ header }) => loose(header) === loose(by.header)) ?? null;
}

function loose(header: string): string {
  return header.replace(/\s+/g, " ").trim().toLowerCase();
}
