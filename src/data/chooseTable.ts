import { type HeaderUnitReader, headerAbove } from "./headerRows.js";
import type { Block } from "./numericBlocks.js";
import type { Table } from "./table.js";

/**
 * The block that is the table: the longest, or an earlier one of the same width whose header fits where that of the
 * longest does not (a line of words in the middle of the readings).
 */
export function bestTable(
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
export function better(best: Table | null, other: Table | null): Table | null {
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
