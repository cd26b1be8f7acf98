import { addRow } from "./addRow.js";
import { notTextAt } from "./decodeText.js";
import type { RowStore } from "./rowStore.js";

/** What is known of the layout when one line among plain numbers is not plain. */
export interface OddRowLayout {
  /** a blank means any run of blanks */
  readonly delimiter: string;
  readonly decimalComma: boolean;
  /** whether the decimal mark is certain; where it is not, the first number with a mark decides for the whole file */
  readonly markCertain: boolean;
}

const quote = 0x22;
const decoder = new TextDecoder("utf-8", { fatal: true, ignoreBOM: true });

/**
 * One line of UTF-8 without its end, without quotes: a comment, a row of separators alone, or a row with gaps or words.
 * False where only csv-parse and the whole text can tell what it is: a quote, another encoding, what is no text.
 */
export function addOddRow(store: RowStore, bytes: Uint8Array, layout: OddRowLayout, line: number): boolean {
  if (bytes.includes(quote)) return false;
  const content = decoded(bytes);
  if (content === null || notTextAt(content, 0, content.length) >= 0) return false;
  if (!layout.markCertain && /\d[.,]\d/.test(content)) return false;
  if (/^\s*#/.test(content)) return true;
  const byBlanks = layout.delimiter === " ";
  const split = content.split(byBlanks ? /[ \t]/ : layout.delimiter).map((cell) => cell.trim());
  const cells = byBlanks ? split.filter((cell) => cell !== "") : split;
  if (cells.some((cell) => cell !== "")) addRow(store, cells, layout.decimalComma, line);
  return true;
}

function decoded(bytes: Uint8Array): string | null {
  try {
    return decoder.decode(bytes);
  } catch {
    return null;
  }
}
