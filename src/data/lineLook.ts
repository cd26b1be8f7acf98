import { lookOf } from "./numberCell.js";

/**
 * What one line looks like under a delimiter: `data` when every cell is a number, a time or a gap and one at least is
 * no gap; `mixed` when the first cell is a number or a time and others are words; `text` otherwise.
 */
export interface LineLook {
  readonly kind: "data" | "mixed" | "text";
  /** cells */
  readonly count: number;
  /** cells, without empty ones at the end */
  readonly width: number;
  /** cells with a decimal comma and with a decimal point */
  readonly commas: number;
  readonly points: number;
}

const textLine: LineLook = { kind: "text", count: 0, width: 0, commas: 0, points: 0 };

/** Looks at a line; stops at the first sign of a text, and counts one with more than `maximumCells` as such. */
export function lineLook(line: string, delimiter: string, maximumCells: number): LineLook {
  let width = 0;
  let count = 0;
  let readings = 0;
  let words = 0;
  let commas = 0;
  let points = 0;
  for (const cell of cellsOf(line, delimiter)) {
    count++;
    if (count > maximumCells) return textLine;
    const look = lookOf(cell);
    if (look.kind === "word") {
      if (readings === 0) return textLine;
      words++;
    } else if (look.kind !== "gap") readings++;
    if (look.mark === ",") commas++;
    else if (look.mark === ".") points++;
    if (cell !== "") width = count;
  }
  if (readings === 0) return textLine;
  return { kind: words > 0 ? "mixed" : "data", count, width, commas, points };
}

/**
 * The cells of one line by themselves, good enough to find out how a file is laid out: quotes are known, cells that go
 * over several lines are not. What is read of the file afterwards is split by csv-parse.
 */
export function* cellsOf(line: string, delimiter: string): Generator<string> {
  if (delimiter === " ") {
    for (const match of line.matchAll(/"([^"]*)"|[^\s]+/g)) yield match[1] ?? match[0];
    return;
  }
  for (let at = 0; at <= line.length; ) {
    const quoted = quotedFrom(line, at);
    const from = quoted?.end ?? at;
    const stop = line.indexOf(delimiter, from);
    const end = stop < 0 ? line.length : stop;
    yield quoted !== null && line.slice(from, end).trim() === "" ? quoted.text : line.slice(at, end).trim();
    at = end + delimiter.length;
    if (stop < 0) return;
  }
}

/** A quoted cell that begins at `at`, blanks before it left out; `end` is behind its closing quote. */
function quotedFrom(line: string, at: number): { text: string; end: number } | null {
  let open = at;
  while (line.charCodeAt(open) === 0x20) open++;
  if (line.charCodeAt(open) !== 0x22) return null;
  for (let close = line.indexOf('"', open + 1); close >= 0; close = line.indexOf('"', close + 2)) {
    if (line.charCodeAt(close + 1) !== 0x22) {
      return {
        text: line
          .slice(open + 1, close)
          .replaceAll('""', '"')
          .trim(),
        end: close + 1,
      };
    }
  }
  return null;
}

/** A blank line, one of separators alone, or a comment. */
export function isBlankLine(line: string, delimiter: string): boolean {
  if (/^\s*(?:#|$)/.test(line)) return true;
  return delimiter !== " " && line.replaceAll(delimiter, "").trim() === "";
}
