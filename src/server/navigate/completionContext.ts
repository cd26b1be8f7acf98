import type { Bound } from "../../language/bind/bind.js";
import { fieldOf, textOf } from "../../language/fields.js";
import { positionAt } from "../../language/lineIndex.js";
import { type OpenHeader, openAt } from "../../language/navigate/openAt.js";
import type { Statement } from "../../language/syntax.js";
import type { Run } from "../../study/run.js";

/** Where something is being written: the headers open there, the run, and the data file that is spoken of. */
export interface CompletionContext {
  readonly bound: Bound;
  readonly offset: number;
  readonly open: readonly OpenHeader[];
  /** the run whose line it is; above the first run, where lines hold for all, the first one */
  readonly run: Run | null;
  /** name of the run whose header or line it is; null elsewhere */
  readonly own: string | null;
  /** path of the data file, or of the table of runs; null where none is named */
  readonly path: string | null;
}

export function completionContext(bound: Bound, offset: number): CompletionContext {
  const open = openAt(bound.parsed, offset);
  const header = open.find(({ owner }) => owner === "run")?.statement ?? null;
  const name = header === null ? null : textOf(header, "run");
  const runs = bound.study.runs.flatMap((source) => (source.kind === "run" ? [source.run] : []));
  const run = (name === null ? runs[0] : runs.find((candidate) => candidate.name === name)) ?? null;
  const { index, statements } = bound.parsed;
  const lineStart = index.starts[positionAt(index, offset).line] ?? 0;
  const headed = statements.find(({ line, offset: at }) => at === lineStart && line.row?.opens === "run");
  const own = headed === undefined ? name : textOf(headed, "run");
  return { bound, offset, open, run, own, path: pathOf(open) ?? run?.data?.path ?? null };
}

/** The path of the innermost open line that has one: `data`, or `rows of`. */
function pathOf(open: readonly OpenHeader[]): string | null {
  const statements = open.flatMap(({ statement }) => statement ?? []);
  const holder = statements.findLast((statement: Statement) => fieldOf(statement, "path") !== null);
  return holder === undefined ? null : textOf(holder, "path");
}
