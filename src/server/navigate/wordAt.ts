import type { Span } from "../../contract/problem.js";
import { positionAt } from "../../language/lineIndex.js";
import { everyStatement } from "../../language/navigate/everyStatement.js";
import { type LineWord, lineWords } from "../../language/navigate/lineWords.js";
import type { Parsed } from "../../language/parse.js";
import type { Field, Statement } from "../../language/syntax.js";

/** A word of a description with the statement it stands in. */
export interface WordAt {
  readonly word: LineWord;
  readonly statement: Statement;
  /** place in the text */
  readonly span: Span;
}

/** The word at an offset; null in a comment and between words. */
export function wordAt({ text, index, statements }: Parsed, offset: number): WordAt | null {
  const line = positionAt(index, offset).line;
  const start = index.starts[line] ?? 0;
  const lineText = text.slice(start, index.starts[line + 1] ?? text.length).replace(/[\r\n]+$/, "");
  for (const statement of everyStatement(statements)) {
    if (statement.offset > offset) break;
    if (statement.offset !== start) continue;
    for (const word of lineWords(lineText, statement.line)) {
      const span = { start: start + word.start, end: start + word.end };
      if (span.start <= offset && offset < span.end) return { word, statement, span };
    }
  }
  return null;
}

/** The quantity of a statement that an offset lies in, with its place in the text. */
export function quantityAt(
  { line, offset: lineStart }: Statement,
  offset: number,
): { field: Field & { kind: "quantity" }; span: Span } | null {
  for (const field of line.fields.values()) {
    for (const one of field.kind === "list" ? field.items : [field]) {
      if (one.kind !== "quantity") continue;
      const span = { start: one.span.start + lineStart, end: one.span.end + lineStart };
      if (span.start <= offset && offset <= span.end) return { field: one, span };
    }
  }
  return null;
}
