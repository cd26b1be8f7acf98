import type { Column, Columns } from "./columns.js";
import { type DataOptions, type DataReading, limitsOf, refused } from "./dataOptions.js";
import { type DecodedText, decodeText, notTextAt, withoutEndMark } from "./decodeText.js";
import { bareUnit, type HeaderRows, type HeaderUnitReader } from "./headerRows.js";
import { type BodyReading, irregularBody } from "./irregularBody.js";
import { type RowStore, trimmed } from "./rowStore.js";
import { type TableLayout, tableLayout } from "./tableLayout.js";
import { lineOf } from "./textLines.js";

/** As `readColumns`, with the reader of header units given. */
export function readTable(bytes: Uint8Array, options: DataOptions, readUnit: HeaderUnitReader): DataReading {
  if (options.stopped?.()) return { kind: "stopped" };
  const decoded = decodeText(bytes, options.encoding);
  if (decoded.kind === "refused") return decoded;
  const text = withoutEndMark(decoded.text);
  const strange = notTextAt(text, 0, text.length);
  if (strange >= 0) return refused("data-not-text", { line: lineOf(text, strange) });
  const layout = tableLayout(text, options, limitsOf(options), readUnit);
  if (layout.kind !== "layout") return layout;
  const body = bodyOf(bytes, { ...decoded, text }, layout, options);
  if (body.kind !== "rows") return body;
  return { kind: "columns", columns: columnsOf(layout, body.store, readUnit) };
}

function bodyOf(_bytes: Uint8Array, decoded: DecodedText, layout: TableLayout, options: DataOptions): BodyReading {
  return irregularBody(decoded.text, layout, limitsOf(options), options);
}

function columnsOf(layout: TableLayout, store: RowStore, readUnit: HeaderUnitReader): Columns {
  const { values, lines } = trimmed(store);
  return {
    columns: values.map((column, index) => ({ ...headerOf(layout.header, index, readUnit), values: column })),
    rows: store.rows,
    lines,
    faults: store.faults,
    faultCount: store.faultCount,
    delimiter: layout.delimiter,
    decimalComma: layout.decimalComma,
    headerLine: layout.header?.line ?? null,
  };
}

/** The header of a column; a unit in the header itself goes before one in the row of units. */
function headerOf(rows: HeaderRows | null, index: number, readUnit: HeaderUnitReader): Omit<Column, "values"> {
  const header = rows?.headers[index] ?? "";
  if (header === "") return { header, unit: null, unreadUnit: null };
  const own = readUnit(header);
  const below = bareUnit(rows?.units?.[index] ?? "");
  if (own.unit !== null || below === "") return { header, unit: own.unit, unreadUnit: own.unread };
  return { header, unit: readUnit(`x / ${below}`).unit, unreadUnit: own.unread };
}
