import { positionAt } from "../lineIndex.js";
import type { Parsed } from "../parse.js";
import { headsBelow, type Owner, type StatementRow, statementByHead } from "../statements.js";
import type { Statement } from "../syntax.js";

/** A header that is open at some line: which lines it may hold and those it holds already. */
export interface OpenHeader {
  readonly owner: Owner;
  /** null for the file itself */
  readonly statement: Statement | null;
  readonly lines: readonly Statement[];
}

/** The headers open where a line at `offset` begins, the file first, the innermost last. */
export function openAt({ index, statements }: Parsed, offset: number): OpenHeader[] {
  const lineStart = index.starts[positionAt(index, offset).line] ?? 0;
  const open: OpenHeader[] = [{ owner: "file", statement: null, lines: statements }];
  for (;;) {
    const { lines } = open[open.length - 1] as OpenHeader;
    const last = lines.findLast((line) => line.offset < lineStart);
    const opens = last?.line.row?.opens;
    if (last === undefined || opens === undefined) return open;
    open.push({ owner: opens, statement: last, lines: last.children });
  }
}

/** A first word that may stand on a line, with the header its line would belong to: depth 0 is the file. */
export interface AllowedHead {
  readonly row: StatementRow;
  readonly depth: number;
}

/**
 * The first words a line at `offset` may begin with, the innermost header's first. What may stand once and does is
 * left out, and so are lines of a run directly in the file below the first run.
 */
export function headsAt(parsed: Parsed, offset: number): AllowedHead[] {
  const open = openAt(parsed, offset);
  const runAbove = parsed.statements.some(({ line, offset: at }) => line.row?.opens === "run" && at < offset);
  const lineStart = parsed.index.starts[positionAt(parsed.index, offset).line] ?? 0;
  const found = new Map<string, AllowedHead>();
  for (let depth = open.length - 1; depth >= 0; depth--) {
    const { owner, lines } = open[depth] as OpenHeader;
    for (const head of headsBelow(owner)) {
      const row = statementByHead.get(head) as StatementRow;
      if (found.has(head) || (owner === "file" && runAbove && row.owners.includes("run"))) continue;
      const others = lines.filter(({ line, offset: at }) => line.row === row && at !== lineStart);
      if (row.repeats.repeat === "once" && others.length > 0) continue;
      if (head === "ratewright" && lineStart > 0) continue;
      found.set(head, { row, depth });
    }
  }
  return [...found.values()];
}
