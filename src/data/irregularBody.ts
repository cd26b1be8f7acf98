import type { Polling } from "../contract/polling.js";
import { addRow } from "./addRow.js";
import { eachRecord, type RecordsEnd } from "./csvRecords.js";
import { type DataRefusal, type Limits, refused } from "./dataOptions.js";
import { type RowStore, rowStore } from "./rowStore.js";
import type { TableLayout } from "./tableLayout.js";
import { linesFrom } from "./textLines.js";
import { timeReaders } from "./timeColumns.js";

export type BodyReading =
  | { readonly kind: "rows"; readonly store: RowStore }
  | DataRefusal
  | { readonly kind: "stopped" };

/**
 * The rows of any body through csv-parse: quotes, comments, empty cells, words, rows too short or too long. A row of
 * empty cells alone counts as a blank line. A cell that is no number becomes NaN and a fault.
 */
export function irregularBody(text: string, layout: TableLayout, limits: Limits, polling: Polling): BodyReading {
  const body = text.slice(layout.bodyStart).replace(/\r\n?/g, "\n");
  const long = lineBeyond(body, limits.lineLength);
  const line = (inBody: number): number => layout.bodyLine + inBody - 1;
  if (long !== null) return refused("data-line-too-long", { line: line(long), limit: limits.lineLength });
  const store = rowStore(layout.width, 256, timeReaders(layout.times, layout.headerWords));
  let tooMany = false;
  const end = eachRecord(body, layout.delimiter, (cells, endLine) => {
    if (cells.every((cell) => cell === "")) return "go on";
    if (store.rows >= limits.rows) {
      tooMany = true;
      return "stop";
    }
    if (store.rows % 1024 === 1023 && polling.stopped?.()) return "stop";
    addRow(store, cells, layout.decimalComma, line(endLine - lineEndsIn(cells)));
    return "go on";
  });
  if (tooMany) return refused("data-too-many-rows", { limit: limits.rows });
  return outcome(end, store, body, line);
}

function outcome(end: RecordsEnd, store: RowStore, body: string, line: (inBody: number) => number): BodyReading {
  switch (end.kind) {
    case "all":
      return { kind: "rows", store };
    case "stopped":
      return { kind: "stopped" };
    case "open quote":
      return refused("data-quote-open", { line: line(quoteLineAfter(body, end.lastEnd)) });
    case "stray quote":
      return refused("data-quote-stray", { line: line(end.line) });
  }
}

/** Line ends inside quoted cells: a record with them begins that many lines above the one it ends on. */
function lineEndsIn(cells: readonly string[]): number {
  let count = 0;
  for (const cell of cells) {
    for (let at = cell.indexOf("\n"); at >= 0; at = cell.indexOf("\n", at + 1)) count++;
  }
  return count;
}

/** The first line after line `after`, both from 1, that holds a quote and is no comment: there the open record begins. */
function quoteLineAfter(body: string, after: number): number {
  for (const { number, start, end } of linesFrom(body, 0, 1)) {
    const content = number > after ? body.slice(start, end) : "";
    if (content.includes('"') && !/^\s*#/.test(content)) return number;
  }
  return after + 1;
}

/** The first line longer than `limit`, from 1; null where there is none. */
function lineBeyond(body: string, limit: number): number | null {
  for (let start = 0, line = 1; start < body.length; line++) {
    const next = body.indexOf("\n", start);
    const end = next < 0 ? body.length : next;
    if (end - start > limit) return line;
    start = end + 1;
  }
  return null;
}
