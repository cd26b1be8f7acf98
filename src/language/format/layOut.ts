import type { Parsed } from "../parse.js";
import { blocksOf } from "./blocks.js";
import { commentDepths, isBlank } from "./commentDepths.js";
import { declaredSpecies } from "./declaredSpecies.js";
import { headText } from "./headWords.js";
import { type LineCells, lineCells } from "./lineCells.js";
import { sameLine } from "./lineMeaning.js";
import type { Signs } from "./quantitySigns.js";
import { type SheetLine, sheetOf } from "./sheet.js";
import type { IsDeclared } from "./speciesSigns.js";
import { columnWidths, padded, widthOf } from "./widths.js";

/** What becomes of a line: its text without its line break, or null where the line goes. */
export interface LaidOutLine {
  readonly line: SheetLine;
  readonly text: string | null;
}

const step = 2;
const gap = 2;
/** Where the values of a section begin at least, from 0: most sections then look alike, and a line more moves none. */
const leastColumn = 15;

/**
 * Lays out every line of a text: two spaces a level, the values of a block in one column, the cells of neighbouring
 * lines of a kind below each other, comments two spaces behind or as deep as the line they stand above; of several
 * blank lines one stays, at the beginning and end of the file none. Broken lines, and lines that nothing takes, are left
 * alone.
 */
export function layOut(parsed: Parsed, signs: Signs): LaidOutLine[] {
  const lines = sheetOf(parsed);
  const isDeclared = declaredSpecies(parsed);
  const cells = lines.map((line) => safeCells(line, signs, isDeclared));
  const blocks = blocksOf(lines);
  const columns = valueColumns(lines, cells, blocks);
  const widths = columnWidths(
    lines.map(({ place }, at) => ({ group: place?.group ?? -1, cells: cells[at]?.cells ?? [] })),
  );
  const depths = commentDepths(lines);
  const blank = lines.map(({ text, place }) => place === null && isBlank(text));
  return lines.map((line, at): LaidOutLine => {
    if (blank[at] === true) return { line, text: keepsBlank(blank, at) ? "" : null };
    const taken = cells[at];
    if (taken === null || taken === undefined || line.place === null) {
      const depth = depths[at];
      return { line, text: depth === null || depth === undefined ? line.text : commentLine(line.text, depth) };
    }
    const block = blocks[at];
    const column = block === null || block === undefined ? null : (columns.get(block) ?? null);
    const columnsOfGroup = block === null ? [] : (widths.get(line.place.group) ?? []);
    return { line, text: lineText(taken, line.place.depth * step, column, columnsOfGroup) };
  });
}

/** A line's cells in the signs that are asked for, or as written where that would say something else. */
function safeCells(line: SheetLine, signs: Signs, isDeclared: IsDeclared): LineCells | null {
  const statement = line.place?.line ?? null;
  if (statement === null) return null;
  for (const chosen of signs === "as written" ? [signs] : [signs, "as written" as const]) {
    const cells = lineCells(line.text, statement, chosen, isDeclared);
    const words = [cells.head, ...cells.cells].join(" ");
    if (onlySpaced(line.text, words) || sameLine(line.text, words, isDeclared)) return cells;
  }
  return null;
}

/** Whether a line has these words, with plain spaces where they have them; a comment may follow. */
function onlySpaced(line: string, words: string): boolean {
  const single = line.trim().replace(/[ \t]+/g, " ");
  return single.startsWith(words) && /^$|^ #/.test(single.slice(words.length));
}

/** The column in which the values of each block begin, from 0. A broken line counts: it will be mended. */
function valueColumns(
  lines: readonly SheetLine[],
  cells: readonly (LineCells | null)[],
  blocks: readonly (number | null)[],
): Map<number, number> {
  const columns = new Map<number, number>();
  lines.forEach(({ place }, at) => {
    const block = blocks[at] ?? null;
    if (block === null || place === null || cells[at]?.cells.length === 0) return;
    const least = columns.get(block) ?? (place.inSection ? leastColumn : 0);
    columns.set(block, Math.max(least, place.depth * step + widthOf(headText(place.row)) + gap));
  });
  return columns;
}

function lineText(
  { head, cells, comment }: LineCells,
  indent: number,
  column: number | null,
  widths: number[],
): string {
  const begin = " ".repeat(indent) + head;
  const separator = " ".repeat(column === null ? 1 : gap);
  const values = cells.map((cell, at) => (at < cells.length - 1 ? padded(cell, widths[at] ?? 0) : cell));
  const value = values.join(separator);
  const words = value === "" ? begin : `${column === null ? `${begin} ` : padded(begin, column)}${value}`;
  return comment === "" ? words : `${words}${" ".repeat(gap)}${comment}`;
}

function commentLine(text: string, depth: number): string {
  return " ".repeat(depth * step) + text.slice(text.indexOf("#")).trimEnd();
}

/** A blank line stays where it is the first of its kind between two lines. */
function keepsBlank(blank: readonly boolean[], at: number): boolean {
  return at > 0 && blank[at - 1] === false && blank.indexOf(false, at) >= 0;
}
