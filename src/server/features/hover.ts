import { type Hover, MarkupKind } from "vscode-languageserver";
import type { TextDocument } from "vscode-languageserver-textdocument";
import { columnHover } from "../../report/hover.js";
import { abortSignalOf } from "../abortSignal.js";
import { type ColumnAt, columnAt } from "../columnAt.js";
import type { Feature, ServerContext } from "../context.js";

/** Runs shown in one hover where several share a column line. */
const mostRuns = 3;

/** Resting on a column shows its readings with the fitted curve, k and its half-life, the rates. */
export const hover: Feature = {
  capabilities: { hoverProvider: true },
  start(context) {
    context.connection.onHover(({ textDocument, position }, token) => {
      const document = context.documents.get(textDocument.uri);
      if (document === undefined) return null;
      const bound = context.workspace().bound(context.document(document));
      const column = columnAt(bound, document.offsetAt(position));
      return column === null ? null : hoverOf(context, document, column, abortSignalOf(token));
    });
  },
};

async function hoverOf(
  context: ServerContext,
  document: TextDocument,
  column: ColumnAt,
  signal: AbortSignal,
): Promise<Hover | null> {
  const { version } = document;
  const description = await context.workspace().describe(context.document(document), { curves: true, signal });
  // An answer about a text that is no more would point at the wrong words.
  if (description === null || context.documents.get(document.uri)?.version !== version) return null;
  const runs = description.runs.filter(({ name }) => column.runs.includes(name)).slice(0, mostRuns);
  if (runs.length === 0) return null;
  const theme = context.client.theme ?? "neutral";
  const parts = runs.map((run) => columnHover(run, column.name, theme, description.diagnostics));
  const { start, end } = column.span;
  return {
    contents: { kind: MarkupKind.Markdown, value: parts.join("\n\n---\n\n") },
    range: { start: document.positionAt(start), end: document.positionAt(end) },
  };
}
