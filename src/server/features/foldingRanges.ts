import { type FoldingRange, FoldingRangeKind } from "vscode-languageserver";
import { blockOf } from "../../language/fields.js";
import { positionAt } from "../../language/lineIndex.js";
import { everyStatement } from "../../language/navigate/everyStatement.js";
import type { Parsed } from "../../language/parse.js";
import type { Feature } from "../context.js";
import { openBound } from "../openBound.js";

/** Each header folds with the lines that belong to it, and so do comments of several lines. */
export const foldingRanges: Feature = {
  capabilities: { foldingRangeProvider: true },
  start(context) {
    context.connection.onFoldingRanges(({ textDocument }) => {
      const found = openBound(context, textDocument);
      return found === null ? [] : [...headerFolds(found.bound.parsed), ...commentFolds(found.bound.parsed)];
    });
  },
};

function headerFolds({ uri, index, statements }: Parsed): FoldingRange[] {
  const folds: FoldingRange[] = [];
  for (const statement of everyStatement(statements)) {
    if (statement.children.length === 0) continue;
    const block = blockOf(uri, statement);
    const [startLine, endLine] = [positionAt(index, block.start).line, positionAt(index, block.end).line];
    if (endLine > startLine) folds.push({ startLine, endLine });
  }
  return folds;
}

function commentFolds({ text, index }: Parsed): FoldingRange[] {
  const folds: FoldingRange[] = [];
  let first = -1;
  const end = (line: number): void => {
    if (first >= 0 && line - first > 1)
      folds.push({ startLine: first, endLine: line - 1, kind: FoldingRangeKind.Comment });
    first = -1;
  };
  index.starts.forEach((start, line) => {
    const isComment = /^\s*#/.test(text.slice(start, index.starts[line + 1] ?? text.length));
    if (!isComment) end(line);
    else if (first < 0) first = line;
  });
  end(index.starts.length);
  return folds;
}
