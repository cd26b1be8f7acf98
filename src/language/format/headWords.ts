import type { StatementRow } from "../statements.js";

/** Words that tie a value to its line and stand with the value: `order  in KI`, not `order in  KI`. */
const joining = new Set("in from as at to of is by like using and with after".split(" "));

/** The words that say what a line is: `volume`, `molar mass`. */
export function headText(row: StatementRow): string {
  const words = [row.head];
  for (const part of row.parts) {
    if (part.part !== "keyword" || joining.has(part.word)) break;
    words.push(part.word);
  }
  return words.join(" ");
}

/** How many of a line's `words` say what it is. */
export function headWords(row: StatementRow | null, words: number): number {
  return row === null ? 1 : Math.min(headText(row).split(" ").length, words);
}
