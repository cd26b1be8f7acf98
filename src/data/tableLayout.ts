import { bestTable, better } from "./chooseTable.js";
import { type DataOptions, type DataRefusal, type Limits, refused } from "./dataOptions.js";
import { headedTable, wordTable } from "./headedTable.js";
import type { HeaderRows, HeaderUnitReader } from "./headerRows.js";
import { collectBlocks } from "./numericBlocks.js";
import type { Table } from "./table.js";
import { type TimeColumns, timeColumns } from "./timeColumns.js";

/** How a delimited text is laid out: what stands between its cells, and where its header and its body are. */
export interface TableLayout {
  readonly kind: "layout";
  readonly delimiter: string;
  readonly decimalComma: boolean;
  readonly header: HeaderRows | null;
  /** columns of the body */
  readonly width: number;
  /** where the body begins: offset in the text, and the line, from 1 */
  readonly bodyStart: number;
  readonly bodyLine: number;
  /** whether the decimal mark is stated, shown by the first rows, or cannot be a comma */
  readonly markCertain: boolean;
  /** which columns hold dates or clock times, length `width` */
  readonly times: TimeColumns["kinds"];
  /** the header of each column and the unit under it, as one text */
  readonly headerWords: readonly string[];
  /** whether the text up to here decided it, so that more text would change nothing but the decimal mark */
  readonly settled: boolean;
}

/**
 * Finds out the layout. The table is the first block of lines that are rows of numbers under one delimiter; the header
 * is the row above it, whatever stands before that (settings of an instrument) is passed over. What the options state
 * is taken as it is. Refuses a text without any filled line and lines or rows beyond the limits.
 */
export function tableLayout(
  text: string,
  options: DataOptions,
  limits: Limits,
  readUnit: HeaderUnitReader,
): TableLayout | DataRefusal | { readonly kind: "stopped" } {
  const delimiters = usableDelimiter(options.delimiter);
  const collected = collectBlocks(text, options, delimiters, limits);
  if (collected.kind !== "blocks") return collected;
  if (collected.firstLine === null) return refused("data-empty", {});
  const tables = collected.blocks.map((blocks, index) => bestTable(text, blocks, delimiters[index] ?? ",", readUnit));
  const best = tables.filter((table) => table !== null).reduce<Table | null>(better, null);
  const stated = options.skip !== undefined;
  const found =
    best === null
      ? wordTable(text, collected.firstLine, delimiters, stated, readUnit)
      : stated
        ? headedTable(text, collected.firstLine, best, readUnit)
        : best;
  const width = Math.max(found.header?.headers.length ?? 0, found.block?.width ?? 0, 1);
  if (width > limits.columns) {
    return refused("data-too-many-columns", { line: found.header?.line ?? found.start.number, limit: limits.columns });
  }
  const marks = found.block === null ? 0 : found.block.commas + found.block.points;
  const markCertain = options.decimalComma !== undefined || marks > 0 || found.delimiter === ",";
  const decimalComma = options.decimalComma ?? hasDecimalComma(text, found);
  const { delimiter, header, start } = found;
  const times = timeColumns(text, start, delimiter, width);
  return {
    kind: "layout",
    delimiter,
    decimalComma,
    header,
    width,
    bodyStart: start.start,
    bodyLine: start.number,
    markCertain,
    times: times.kinds,
    headerWords: Array.from({ length: width }, (_, index) => wordsAbove(header, index)),
    settled: collected.settled && times.complete,
  };
}

function wordsAbove(header: HeaderRows | null, index: number): string {
  return `${header?.headers[index] ?? ""} ${header?.units?.[index] ?? ""}`.trim();
}

const usualDelimiters = ["\t", ";", ",", " "];

/** The stated delimiter alone, or the usual ones where none is stated that could stand between cells. */
function usableDelimiter(stated: string | undefined): readonly string[] {
  return stated === undefined || stated === "" || /["\r\n]/.test(stated) ? usualDelimiters : [statedDelimiter(stated)];
}

/** `tab` and `space` are understood as words, because neither can be seen in a description. */
function statedDelimiter(delimiter: string): string {
  if (/^(\\t|tab)$/i.test(delimiter)) return "\t";
  return /^( +|spaces?|blanks?)$/i.test(delimiter) ? " " : delimiter;
}

/** The mark that most cells of the block show; where none shows one, the first that the rest of the text does. */
function hasDecimalComma(text: string, table: Table): boolean {
  const { block, delimiter } = table;
  if (block !== null && block.commas + block.points > 0) return block.commas > block.points;
  if (delimiter === ",") return false;
  // neither the points of a date nor what follows a colon
  const mark = /(?<![\d.:/])\d+([.,])\d+(?!\d*[.:/]\d)/g;
  mark.lastIndex = table.start.start;
  return mark.exec(text)?.[1] === ",";
}
