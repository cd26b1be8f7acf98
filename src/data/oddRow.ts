import { addRow } from "./addRow.js";
import { notTextAt } from "./decodeText.js";
import { quotedCells } from "./quotedCells.js";
import type { RowStore } from "./rowStore.js";

/** What is known of the layout when one line among plain numbers is not plain. */
export interface OddRowLayout {
  /** a blank means any run of blanks */
  readonly delimiter: string;
  readonly decimalComma: boolean;
  /** whether the decimal mark is certain; where it is not, the first number with a mark decides for the whole file */
  readonly markCertain: boolean;
}

const decoder = new TextDecoder("utf-8", { fatal: true, ignoreBOM: true });

/**
 * One line of UTF-8 without its end: a comment, a row of separators alone, or a row with gaps, words, times or quotes
 * that open and close around whole cells. False where only csv-parse and the whole text can tell what it is: other
 * quotes, another encoding, what is no text.
 */
export function addOddRow(store: RowStore, bytes: Uint8Array, layout: OddRowLayout, line: number): boolean {
  const content = decoded(bytes);
  if (content === null || notTextAt(content, 0, content.length) >= 0) return false;
  if (!layout.markCertain && /\d[.,]\d/.test(content)) return false;
  const quoted = content.includes('"');
  if (/^\s*#/.test(content)) return !quoted;
  const cells = quoted ? quotedCells(content, layout.delimiter) : bareCells(content, layout.delimiter);
  if (cells === null) return false;
  if (cells.some((cell) => cell !== "")) addRow(store, cells, layout.decimalComma, line);
  return true;
}

function bareCells(content: string, delimiter: string): string[] {
  if (delimiter !== " ") return content.split(delimiter).map((cell) => cell.trim());
  return content
    .split(/[ \t]/)
    .map((cell) => cell.trim())
    .filter((cell) => cell !== "");
}

/** Longer lines go through the decoder, which takes long to start. */
const short = 256;

function decoded(bytes: Uint8Array): string | null {
  if (bytes.length <= short && isAscii(bytes)) return Reflect.apply(String.fromCharCode, null, bytes);
  try {
    return decoder.decode(bytes);
  } catch {
    return null;
  }
}

function isAscii(bytes: Uint8Array): boolean {
  for (let at = 0; at < bytes.length; at++) if (bytes[at]! >= 0x80) return false;
  return true;
}
