import { lexLine } from "../lexer.js";
import type { SheetLine } from "./sheet.js";

/**
 * How deep each comment that has a line of its own stands; null for every other line. It belongs to the line below it
 * and is as deep as that one. One that a blank line, or the end of the file, parts from what follows belongs to what
 * stands above it: there it keeps its own depth, if that is no deeper than a line there could be.
 */
export function commentDepths(lines: readonly SheetLine[]): (number | null)[] {
  const depths: (number | null)[] = lines.map(() => null);
  let below: number | null = null;
  let near = false;
  for (let at = lines.length - 1; at >= 0; at--) {
    const { text, place } = lines[at] as SheetLine;
    if (place !== null) {
      below = place.depth;
      near = true;
    } else if (isBlank(text)) {
      near = false;
    } else if (isComment(text)) {
      const above = near ? null : depthAbove(lines, at);
      depths[at] = above === null ? (below ?? 0) : Math.min(above, Math.round(indentOf(text) / 2));
    }
  }
  return depths;
}

export function isBlank(text: string): boolean {
  return lexLine(text).length === 0;
}

/** Whether nothing but a comment stands on a line. */
function isComment(text: string): boolean {
  return lexLine(text)[0]?.kind === "comment";
}

/** How deep a comment may stand below the line above it; null where there is none, or a blank line between. */
function depthAbove(lines: readonly SheetLine[], from: number): number | null {
  for (let at = from - 1; at >= 0; at--) {
    const line = lines[at] as SheetLine;
    if (line.place !== null) return line.place.depth + (line.place.row.opens === undefined ? 0 : 1);
    if (isBlank(line.text)) return null;
  }
  return null;
}

/** Columns before the first word; a tab counts as one level. */
function indentOf(text: string): number {
  const white = text.slice(0, text.length - text.trimStart().length);
  return [...white].reduce((sum, space) => sum + (space === "\t" ? 2 : 1), 0);
}
