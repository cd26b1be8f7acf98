import { CsvError, parse } from "csv-parse/browser/esm/sync";

/** A record as csv-parse gives it: its cells, blanks around them taken off, and the line it ends on, from 1. */
export type RecordVisitor = (cells: string[], endLine: number) => "go on" | "stop";

/** How the splitting ended; `line` is where csv-parse noticed the fault, `lastEnd` where the last whole record ended. */
export type RecordsEnd =
  | { readonly kind: "all" }
  | { readonly kind: "stopped" }
  | { readonly kind: "open quote"; readonly lastEnd: number }
  | { readonly kind: "stray quote"; readonly line: number };

/**
 * Splits `text`, whose lines end in LF, with csv-parse. Lines that begin with `#` and empty ones are no records. A quote
 * inside an unquoted cell stands for itself. A blank as delimiter means any run of blanks.
 */
export function eachRecord(text: string, delimiter: string, visit: RecordVisitor): RecordsEnd {
  let lastEnd = 0;
  let stopped = false;
  try {
    parse(new TextEncoder().encode(text), {
      ...common,
      delimiter: delimiter === " " ? [" ", "\t"] : delimiter,
      // csv-parse takes a tab for a blank to trim even where it stands between cells, unless it is the delimiter
      trim: true,
      relax_quotes: true,
      on_record: (record: string[], context) => {
        lastEnd = context.lines;
        const cells = delimiter === " " ? record.filter((cell) => cell !== "") : record;
        if (visit(cells, context.lines) === "go on") return null;
        stopped = true;
        throw new Error("stopped");
      },
    });
    return { kind: "all" };
  } catch (error) {
    if (stopped) return { kind: "stopped" };
    if (error instanceof CsvError && error.code === "CSV_QUOTE_NOT_CLOSED") return { kind: "open quote", lastEnd };
    const line = error instanceof CsvError && typeof error["lines"] === "number" ? error["lines"] : lastEnd + 1;
    return { kind: "stray quote", line };
  }
}

/** The cells of `text` if it is exactly one record with every quote in its place; else null. */
export function singleRecord(text: string, delimiter: string): string[] | null {
  try {
    const records = parse(text.replace(/\r\n?/g, "\n"), { ...common, comment: null, delimiter, trim: true });
    return records.length === 1 ? (records[0] ?? null) : null;
  } catch {
    return null;
  }
}

/** The cells of one line in which quotes mean nothing. */
export function literalCells(line: string, delimiter: string): string[] {
  return line.split(delimiter).map((cell) => cell.trim());
}

const common = {
  comment: "#",
  comment_no_infix: true,
  record_delimiter: "\n",
  relax_column_count: true,
  skip_empty_lines: true,
} as const;
