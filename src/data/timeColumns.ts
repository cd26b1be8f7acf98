import { type ElapsedTime, elapsedTime } from "./elapsedTime.js";
import { cellsOf, isBlankLine } from "./lineLook.js";
import { lookOf } from "./numberCell.js";
import { linesFrom, type TextLine } from "./textLines.js";
import { type TwoParts, timeShape } from "./timeText.js";

/** Which columns hold dates or clock times; index from 0, null for one that does not. */
export interface TimeColumns {
  readonly kinds: readonly (ElapsedTime["kind"] | null)[];
  /** whether as many rows were looked at as ever are, so that more text would change nothing */
  readonly complete: boolean;
}

/** Rows looked at. */
const sample = 100;

/**
 * Looks at the first rows of a body: a column holds times where more of its cells are times than numbers. `start` is
 * where the body begins.
 */
export function timeColumns(
  text: string,
  start: Pick<TextLine, "start" | "number">,
  delimiter: string,
  width: number,
): TimeColumns {
  const rows = firstRows(text, start, delimiter);
  const kinds = Array.from({ length: width }, () => null as ElapsedTime["kind"] | null);
  if (rows.some((row) => /\d[-/.:]\d/.test(row))) {
    const cells = rows.map((row) => [...cellsOf(row, delimiter)]);
    for (let column = 0; column < width; column++) kinds[column] = kindOf(cells.map((row) => row[column] ?? ""));
  }
  return { kinds, complete: rows.length === sample };
}

function firstRows(text: string, start: Pick<TextLine, "start" | "number">, delimiter: string): string[] {
  const rows: string[] = [];
  for (const line of linesFrom(text, start.start, start.number)) {
    const content = text.slice(line.start, line.end);
    if (!isBlankLine(content, delimiter)) rows.push(content);
    if (rows.length === sample) break;
  }
  return rows;
}

function kindOf(cells: readonly string[]): ElapsedTime["kind"] | null {
  let numbers = 0;
  const times = { "date-time": 0, clock: 0 };
  for (const cell of cells) {
    const { kind } = lookOf(cell);
    const shape = kind === "time" ? timeShape(cell) : null;
    if (shape !== null) times[shape]++;
    else if (kind === "number") numbers++;
  }
  if (times["date-time"] + times.clock <= numbers) return null;
  return times.clock > times["date-time"] ? "clock" : "date-time";
}

/** Readers of the time columns, by column; null where all columns hold numbers. `headers` are the words above each. */
export function timeReaders(
  kinds: readonly (ElapsedTime["kind"] | null)[],
  headers: readonly string[],
): readonly (ElapsedTime | null)[] | null {
  if (kinds.every((kind) => kind === null)) return null;
  return kinds.map((kind, index) => (kind === null ? null : elapsedTime(kind, twoPartsIn(headers[index] ?? ""))));
}

/** What a header such as `time (mm:ss)` or `t [h:min]` says of times with two numbers. */
function twoPartsIn(header: string): TwoParts {
  if (/(?<![\w:])(?:mm?|min):(?:ss?|sec)(?![\w:])/i.test(header)) return "minutes";
  return /(?<![\w:])(?:hh?|hr?s?):(?:mm?|min)(?![\w:])/i.test(header) ? "hours" : null;
}
