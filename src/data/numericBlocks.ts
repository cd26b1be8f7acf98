import type { Polling } from "../contract/polling.js";
import { type DataRefusal, type Limits, refused } from "./dataOptions.js";
import { isBlankLine, type LineLook, lineLook } from "./lineLook.js";
import { linesFrom, type TextLine } from "./textLines.js";

/** Lines one under the other that are rows of numbers under one delimiter; blank lines and comments do not end it. */
export interface Block {
  readonly first: TextLine;
  /** the lines above it, at most `context` of them, in order */
  readonly before: readonly TextLine[];
  /** rows looked at */
  readonly rows: number;
  /** the number of cells that most rows have */
  readonly width: number;
  /** cells with a decimal comma and with a decimal point */
  readonly commas: number;
  readonly points: number;
}

export type Collected =
  | {
      readonly kind: "blocks";
      /** for each delimiter, in order */
      readonly blocks: readonly (readonly Block[])[];
      /** the first line with anything in it, null where there is none */
      readonly firstLine: TextLine | null;
      /** whether the table was found before the end of the text, so that more text would change nothing */
      readonly settled: boolean;
    }
  | { readonly kind: "stopped" }
  | DataRefusal;

/** Lines kept above a block: a header that goes over several lines, and a row of units. */
const context = 64;
/** Rows after which a block of several columns is surely the table, and one of a single column. */
const enough = 100;
const enoughSingle = 1_000;

/**
 * Goes through the lines once, with all delimiters side by side, until one of them has found a table or the text ends.
 * A block needs one row at least whose cells are all numbers; one of three rows and two columns is taken for the table.
 */
export function collectBlocks(
  text: string,
  options: Polling & { readonly skip?: number },
  delimiters: readonly string[],
  limits: Limits,
): Collected {
  const tracks = delimiters.map((delimiter) => new BlockTrack(delimiter, limits.columns));
  let recent: TextLine[] = [];
  let firstLine: TextLine | null = null;
  let settled = false;
  for (const line of linesFrom(text, 0, 1)) {
    if (line.end - line.start > limits.lineLength) {
      return refused("data-line-too-long", { line: line.number, limit: limits.lineLength });
    }
    if (line.number <= (options.skip ?? 0)) continue;
    if (line.number % 1024 === 0 && options.stopped?.()) return { kind: "stopped" };
    const content = text.slice(line.start, line.end);
    if (!isBlankLine(content, " ")) {
      firstLine ??= line;
      for (const track of tracks) track.take(content, line, recent);
      settled = tracks.some((track) => track.settled());
      if (settled) break;
    }
    recent.push(line);
    if (recent.length >= 2 * context) recent = recent.slice(-context);
  }
  return { kind: "blocks", blocks: tracks.map((track) => track.finish()), firstLine, settled };
}

/** The blocks of one delimiter so far, and the one that is growing. */
class BlockTrack {
  private readonly blocks: Block[] = [];
  private growing: GrowingBlock | null = null;

  constructor(
    private readonly delimiter: string,
    private readonly maximumCells: number,
  ) {}

  take(content: string, line: TextLine, recent: readonly TextLine[]): void {
    const look = lineLook(content, this.delimiter, this.maximumCells);
    if (look.kind === "text") {
      if (!isBlankLine(content, this.delimiter)) this.close();
      return;
    }
    this.growing ??= { first: line, before: recent.slice(-context), looks: [] };
    if (this.growing.looks.length < enoughSingle) this.growing.looks.push(look);
  }

  /** Whether the table is found, so that nobody need look further. */
  settled(): boolean {
    const closed = this.blocks.at(-1);
    if (closed !== undefined && closed.rows >= 3 && closed.width > 1) return true;
    const rows = this.growing?.looks.length ?? 0;
    if (rows < enough || this.growing === null) return false;
    return rows >= enoughSingle || usualWidth(this.growing.looks) > 1;
  }

  finish(): readonly Block[] {
    this.close();
    return this.blocks;
  }

  private close(): void {
    const block = this.growing;
    this.growing = null;
    if (block === null || !block.looks.some((look) => look.kind === "data") || this.blocks.length >= 1_000) return;
    const { first, before, looks } = block;
    const sum = (count: (look: LineLook) => number): number => looks.reduce((total, look) => total + count(look), 0);
    this.blocks.push({
      first,
      before,
      rows: looks.length,
      width: usualWidth(looks),
      commas: sum((look) => look.commas),
      points: sum((look) => look.points),
    });
  }
}

interface GrowingBlock {
  readonly first: TextLine;
  readonly before: readonly TextLine[];
  readonly looks: LineLook[];
}

/**
 * The number of cells that most rows of numbers alone have, the larger of two equally frequent; without those at the
 * end that are empty in all of these rows (a separator at the end of each row).
 */
function usualWidth(looks: readonly LineLook[]): number {
  const rows = looks.filter((look) => look.kind === "data");
  const counts = new Map<number, number>();
  for (const { count } of rows) counts.set(count, (counts.get(count) ?? 0) + 1);
  let usual = 1;
  let most = 0;
  for (const [count, times] of counts) {
    if (times > most || (times === most && count > usual)) [usual, most] = [count, times];
  }
  return Math.max(1, ...rows.filter((look) => look.count === usual).map((look) => look.width));
}
