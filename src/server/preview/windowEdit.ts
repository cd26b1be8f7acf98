import type { WindowAnswer } from "../../contract/previewProtocol.js";
import type { Bound } from "../../language/bind/bind.js";
import { fieldOf, isBroken, spanOf } from "../../language/fields.js";
import { positionAt } from "../../language/lineIndex.js";
import type { Statement } from "../../language/syntax.js";
import { formatNumber } from "../../quantity/formatNumber.js";

/** A time span in a unit as the language writes it. */
export interface WindowSpan {
  readonly from: number;
  readonly to: number;
  readonly unit: string;
}

/**
 * The edits that give fits of a run this window: the `window` line of each is replaced, or written below it. A fit that
 * several runs share is changed once, where it is written. Null where there is no such fit, or no span.
 */
export function windowEdits(bound: Bound, runId: string, fits: readonly string[], span: WindowSpan): WindowAnswer {
  if (!(span.to > span.from)) return null;
  const source = bound.study.runs.find((one) => one.kind === "run" && one.run.id === runId);
  const wishes = source?.kind === "run" ? source.run.fits.filter(({ id }) => fits.includes(id)) : [];
  const starts = new Set(wishes.map(({ origin }) => origin.start));
  const statements = [...starts].flatMap((start) => statementAt(bound.parsed.statements, start) ?? []);
  if (statements.length === 0) return null;
  return statements.map((fit) => windowEdit(bound, fit, timesOf(span)));
}

function windowEdit(bound: Bound, fit: Statement, times: string): NonNullable<WindowAnswer>[number] {
  const { index, text } = bound.parsed;
  const there = fit.children.find((child) => child.line.row?.head === "window");
  if (there !== undefined) {
    // The times alone, so that the line keeps its alignment; a line that is broken is written anew.
    const whole = isBroken(there) || fieldOf(there, "from") === null || fieldOf(there, "to") === null;
    const { start } = whole ? spanOf(there) : spanOf(there, "from");
    const { end } = whole ? spanOf(there) : spanOf(there, "to");
    return { ...placed(bound, start, end), text: whole ? `window ${times}` : times };
  }
  const { start } = spanOf(fit);
  const lineStart = index.starts[positionAt(index, start).line] ?? 0;
  const indent = text.slice(lineStart, start);
  const rest = /\r\n|\r|\n/.exec(text.slice(start));
  const end = rest === null ? text.length : start + rest.index;
  // The times begin below the law, where there is room.
  const law = /^\S+\s+/.exec(text.slice(start))?.[0].length ?? 0;
  return { ...placed(bound, end, end), text: `${rest?.[0] ?? "\n"}${indent}  ${"window".padEnd(law - 3)} ${times}` };
}

function placed({ parsed: { index } }: Bound, start: number, end: number) {
  const from = positionAt(index, start);
  const to = positionAt(index, end);
  return { line: from.line, character: from.column, endLine: to.line, endCharacter: to.column };
}

/** Four digits of each end: finer than a hand drags. */
function timesOf({ from, to, unit }: WindowSpan): string {
  const [first, last] = [from, to].map((time) => formatNumber(Number(time.toPrecision(4)), null));
  return `${first} ${unit} to ${last} ${unit}`;
}

function statementAt(statements: readonly Statement[], start: number): Statement | null {
  for (const statement of statements) {
    if (spanOf(statement).start === start && statement.line.row?.head === "fit") return statement;
    const inner = statementAt(statement.children, start);
    if (inner !== null) return inner;
  }
  return null;
}
