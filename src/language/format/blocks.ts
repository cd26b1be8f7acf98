import { isBlank } from "./commentDepths.js";
import { standsAlone } from "./sections.js";
import type { SheetLine } from "./sheet.js";

/**
 * For each line the number of the block whose values begin in one column; null for a line that stands by itself. The
 * lines below a section header are one block, at all depths; lines at the margin are one as long as no blank line
 * parts them.
 */
export function blocksOf(lines: readonly SheetLine[]): (number | null)[] {
  let block = 0;
  let blank = false;
  return lines.map(({ text, place }) => {
    if (place === null) {
      blank = blank || isBlank(text);
      return null;
    }
    const marginal = place.depth === 0;
    if (marginal && blank) block++;
    blank = false;
    if (!marginal || !standsAlone(place.row)) return block;
    block++;
    return null;
  });
}
