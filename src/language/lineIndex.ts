import type { Place } from "../contract/findings.js";
import type { Span } from "../contract/problem.js";

/** Where each line of a text begins, in UTF-16 units. LF, CRLF and a lone CR end a line. */
export interface LineIndex {
  readonly starts: readonly number[];
  readonly length: number;
}

export function lineIndex(text: string): LineIndex {
  const starts = [0];
  for (let at = 0; at < text.length; at++) {
    const code = text.charCodeAt(at);
    if (code === 0x0a) starts.push(at + 1);
    else if (code === 0x0d && text.charCodeAt(at + 1) !== 0x0a) starts.push(at + 1);
  }
  return { starts, length: text.length };
}

/** Line and column of an offset, both from 0, column in UTF-16 units. */
export function positionAt(index: LineIndex, offset: number): { line: number; column: number } {
  const bounded = Math.max(0, Math.min(offset, index.length));
  let low = 0;
  let high = index.starts.length - 1;
  while (low < high) {
    const middle = (low + high + 1) >> 1;
    if ((index.starts[middle] ?? 0) <= bounded) low = middle;
    else high = middle - 1;
  }
  return { line: low, column: bounded - (index.starts[low] ?? 0) };
}

/** The place of a span as findings give it: lines and columns from 1. */
export function placeOf(index: LineIndex, span: Span): Place {
  const from = positionAt(index, span.start);
  const to = positionAt(index, span.end);
  return { line: from.line + 1, column: from.column + 1, endLine: to.line + 1, endColumn: to.column + 1 };
}
