import type { HeaderRows } from "./headerRows.js";
import type { Block } from "./numericBlocks.js";
import type { TextLine } from "./textLines.js";

/** A table as one delimiter makes it. */
export interface Table {
  readonly delimiter: string;
  readonly header: HeaderRows | null;
  /** the line the body begins on */
  readonly start: Pick<TextLine, "start" | "number">;
  /** the rows of numbers it was recognised by; null where there are none */
  readonly block: Block | null;
}
