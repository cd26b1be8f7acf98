import { type DataOptions, type DataRefusal, type Limits, refused } from "./dataOptions.js";
import { type HeaderRows, type HeaderUnitReader, headerAbove, headerAt } from "./headerRows.js";
import { cellsOf, isBlankLine, lineLook } from "./lineLook.js";
import { type Block, collectBlocks } from "./numericBlocks.js";
import { linesFrom, type TextLine } from "./textLines.js";

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
  /** false where no row of numbers was found, so that only csv-parse can say what the rows are */
  readonly numeric: boolean;
  /** whether the decimal mark is stated, shown by the first rows, or cannot be a comma */
  readonly markCertain: boolean;
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
      ? wordLayout(text, collected.firstLine, delimiters, stated, readUnit)
      : stated
        ? statedLayout(text, collected.firstLine, best, readUnit)
        : best;
  const width = Math.max(found.header?.headers.length ?? 0, found.block?.width ?? 0, 1);
  if (width > limits.columns) {
    return refused("data-too-many-columns", { line: found.header?.line ?? found.start.number, limit: limits.columns });
  }
  const marks = found.block === null ? 0 : found.block.commas + found.block.points;
  const markCertain = options.decimalComma !== undefined || marks > 0 || found.delimiter === ",";
  const decimalComma = options.decimalComma ?? hasDecimalComma(text, found);
  const { delimiter, header, start } = found;
  const numeric = found.block !== null;
  return {
    kind: "layout",
    delimiter,
    decimalComma,
    header,
    width,
    bodyStart: start.start,
    bodyLine: start.number,
    numeric,
    markCertain,
    settled: collected.settled,
  };
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

interface Table {
  readonly delimiter: string;
  readonly header: HeaderRows | null;
  readonly start: Pick<TextLine, "start" | "number">;
  readonly block: Block | null;
}

/**
 * The block that is the table: the longest, or an earlier one of the same width whose header fits where that of the
 * longest does not (a line of words in the middle of the readings).
 */
function bestTable(
  text: string,
  blocks: readonly Block[],
  delimiter: string,
  readUnit: HeaderUnitReader,
): Table | null {
  const longest = blocks.reduce<Block | null>((best, block) => (best && best.rows >= block.rows ? best : block), null);
  if (longest === null) return null;
  const table = (block: Block): Table => {
    const { rows, start } = headerAbove(text, block.before, delimiter, block.width, readUnit);
    return { delimiter, block, header: rows, start: start ?? block.first };
  };
  const chosen = table(longest);
  if (chosen.header !== null && headerFits(chosen)) return chosen;
  const earlier = blocks.filter((block) => block.width === longest.width && block.first.start < longest.first.start);
  return earlier.map(table).find((candidate) => candidate.header !== null && headerFits(candidate)) ?? chosen;
}

function headerFits(table: Table): boolean {
  return table.header === null || table.header.headers.length === table.block?.width;
}

/** The likelier of two tables read with different delimiters; the earlier delimiter of the list where nothing decides. */
function better(best: Table | null, other: Table | null): Table | null {
  if (best === null || other === null) return best ?? other;
  const a = merits(best);
  const b = merits(other);
  for (let index = 0; index < a.length; index++) {
    const difference = (b[index] ?? 0) - (a[index] ?? 0);
    if (difference !== 0) return difference > 0 ? other : best;
  }
  return best;
}

function merits(table: Table): readonly number[] {
  const { block, header } = table;
  const width = block?.width ?? 0;
  const covers = header === null ? 1 : Number(header.headers.length >= width);
  return [covers, Number(width > 1), block?.rows ?? 0, Number(headerFits(table)), width];
}

/** The layout with the header in the first filled line, for files that state how many lines stand before it. */
function statedLayout(text: string, first: TextLine, best: Table, readUnit: HeaderUnitReader): Table {
  const { delimiter, block } = best;
  const line = text.slice(first.start, first.end);
  if (lineLook(line, delimiter, Number.MAX_SAFE_INTEGER).kind === "data") {
    return { delimiter, header: null, start: first, block };
  }
  return headedAt(text, first, delimiter, block, readUnit);
}

/**
 * The layout of a file without a row of numbers alone (names in the first column, words in every row): the delimiter
 * that cuts most of the first lines into equally many cells, the header in the first of these lines.
 */
function wordLayout(
  text: string,
  first: TextLine,
  delimiters: readonly string[],
  stated: boolean,
  readUnit: HeaderUnitReader,
): Table {
  const lines = firstLines(text, first, 200);
  let chosen = { delimiter: delimiters.includes(",") ? "," : (delimiters[0] ?? ","), header: first, steady: 0 };
  for (const delimiter of delimiters) {
    const rows = lines.filter((line) => !isBlankLine(text.slice(line.start, line.end), delimiter));
    const counts = rows.map((line) => [...cellsOf(text.slice(line.start, line.end), delimiter)].length);
    const usual = mostFrequent(counts.filter((count) => count > 1));
    const steady = counts.filter((count) => count === usual).length;
    const header = rows[counts.indexOf(usual)];
    if (steady > chosen.steady && header !== undefined) chosen = { delimiter, header, steady };
  }
  return headedAt(text, stated ? first : chosen.header, chosen.delimiter, null, readUnit);
}

function mostFrequent(counts: readonly number[]): number {
  const times = (count: number): number => counts.filter((other) => other === count).length;
  return counts.reduce((best, count) => (times(count) > times(best) ? count : best), counts[0] ?? 0);
}

/** The table whose header is the row that begins with line `first`. */
function headedAt(
  text: string,
  first: TextLine,
  delimiter: string,
  block: Block | null,
  readUnit: HeaderUnitReader,
): Table {
  const lines = firstLines(text, first, 64);
  const width = block?.width ?? [...cellsOf(text.slice(first.start, first.end), delimiter)].length;
  const found = headerAt(text, lines, delimiter, width, readUnit);
  const last = lines.at(-1) ?? first;
  const start = lines[found?.next ?? 0] ?? { start: last.next, number: last.number + 1 };
  return { delimiter, header: found?.rows ?? null, start, block };
}

function firstLines(text: string, first: TextLine, count: number): TextLine[] {
  const lines: TextLine[] = [];
  for (const line of linesFrom(text, first.start, first.number)) {
    lines.push(line);
    if (lines.length === count) break;
  }
  return lines;
}

/** The mark that most cells of the block show; where none shows one, the first that the rest of the text does. */
function hasDecimalComma(text: string, table: Table): boolean {
  const { block, delimiter } = table;
  if (block !== null && block.commas + block.points > 0) return block.commas > block.points;
  if (delimiter === ",") return false;
  const mark = /\d([.,])\d/g;
  mark.lastIndex = table.start.start;
  return mark.exec(text)?.[1] === ",";
}
