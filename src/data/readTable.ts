import type { Column, Columns } from "./columns.js";
import { type DataOptions, type DataReading, limitsOf, refused } from "./dataOptions.js";
import { decodeText, notTextAt, withoutEndMark } from "./decodeText.js";
import { columnTime } from "./elapsedTime.js";
import { bareUnit, type HeaderRows, type HeaderUnitReader } from "./headerRows.js";
import { irregularBody } from "./irregularBody.js";
import { plainBody } from "./plainBody.js";
import { type RowStore, trimmed } from "./rowStore.js";
import { type TableLayout, tableLayout } from "./tableLayout.js";
import { lineOf } from "./textLines.js";

/** As `readColumns`, with the reader of header units given. */
export function readTable(bytes: Uint8Array, options: DataOptions, readUnit: HeaderUnitReader): DataReading {
  if (options.stopped?.()) return { kind: "stopped" };
  return readPlainTable(bytes, options, readUnit) ?? readAnyTable(bytes, options, readUnit);
}

/** Bytes that must show how the file is laid out, for the byte loop to read the rest undecoded. */
const headLength = 131_072;

/**
 * A file whose rows each stand on a line of their own: the layout from its first lines, the body by the byte loop. Null for
 * every other file. The body needs no decoding, because what the loop takes as numbers is ASCII. Where the first lines show no decimal mark,
 * a comma further down ends the loop, so that a layout from the whole text would not have been another.
 */
export function readPlainTable(
  bytes: Uint8Array,
  options: DataOptions,
  readUnit: HeaderUnitReader,
): DataReading | null {
  const head = bytes.length <= headLength ? bytes : bytes.subarray(0, bytes.lastIndexOf(lineFeed, headLength) + 1);
  const decoded = decodeText(head, options.encoding);
  if (decoded.kind === "refused" || decoded.utf8Start === null) return null;
  const { text, utf8Start } = decoded;
  const limits = limitsOf(options);
  const layout = tableLayout(text, options, limits, readUnit);
  if (layout.kind !== "layout" || layout.width < 2) return null;
  if (!layout.settled && head.length < bytes.length) return null;
  if (notTextAt(text, 0, layout.bodyStart) >= 0) return null;
  const bodyStart = utf8Start + new TextEncoder().encode(text.slice(0, layout.bodyStart)).length;
  const body = plainBody(bytes, bodyStart, layout, limits, options);
  if (body.kind === "irregular") return null;
  if (body.kind !== "rows") return body;
  return { kind: "columns", columns: columnsOf(layout, body.store, readUnit) };
}

const lineFeed = 10;

/** Any file, its body through csv-parse. */
export function readAnyTable(bytes: Uint8Array, options: DataOptions, readUnit: HeaderUnitReader): DataReading {
  const decoded = decodeText(bytes, options.encoding);
  if (decoded.kind === "refused") return decoded;
  const text = withoutEndMark(decoded.text);
  const strange = notTextAt(text, 0, text.length);
  if (strange >= 0) return refused("data-not-text", { line: lineOf(text, strange) });
  const limits = limitsOf(options);
  const layout = tableLayout(text, options, limits, readUnit);
  if (layout.kind !== "layout") return layout;
  const body = irregularBody(text, layout, limits, options);
  if (body.kind !== "rows") return body;
  return { kind: "columns", columns: columnsOf(layout, body.store, readUnit) };
}

function columnsOf(layout: TableLayout, store: RowStore, readUnit: HeaderUnitReader): Columns {
  const { values, lines } = trimmed(store);
  return {
    columns: values.map((column, index) => columnOf(layout, store, index, column, readUnit)),
    rows: store.rows,
    lines,
    faults: store.faults,
    faultCount: store.faultCount,
    tallies: store.tallies,
    delimiter: layout.delimiter,
    decimalComma: layout.decimalComma,
    headerLine: layout.header?.line ?? null,
  };
}

function columnOf(
  layout: TableLayout,
  store: RowStore,
  index: number,
  values: Float64Array,
  readUnit: HeaderUnitReader,
): Column {
  const header = headerOf(layout.header, index, readUnit);
  const time = store.times?.[index] ?? null;
  if (time === null) return { kind: "number", ...header, values, time: null };
  // whatever the header says of the unit, such as (hh:mm:ss): elapsed times are in seconds
  const inSeconds = { header: header.header, unit: readUnit("t / s").unit, unreadUnit: null };
  return { kind: time.kind, ...inSeconds, values, time: columnTime(time) };
}

/** The header of a column; a unit in the header itself goes before one in the row of units. */
function headerOf(
  rows: HeaderRows | null,
  index: number,
  readUnit: HeaderUnitReader,
): Pick<Column, "header" | "unit" | "unreadUnit"> {
  const header = rows?.headers[index] ?? "";
  if (header === "") return { header, unit: null, unreadUnit: null };
  const own = readUnit(header);
  const below = bareUnit(rows?.units?.[index] ?? "");
  if (own.unit !== null || below === "") return { header, unit: own.unit, unreadUnit: own.unread };
  return { header, unit: readUnit(`x / ${below}`).unit, unreadUnit: own.unread };
}
