import { type Hover, MarkupKind, type Position, type Range } from "vscode-languageserver";
import type { TextDocument } from "vscode-languageserver-textdocument";
import { URI } from "vscode-uri";
import type { Span } from "../../contract/problem.js";
import { columnHover } from "../../report/hover.js";
import { abortSignalOf } from "../abortSignal.js";
import { columnAt } from "../columnAt.js";
import type { Feature, ServerContext } from "../context.js";
import { columnsAtCell } from "../navigate/columnCells.js";
import { wordHover } from "../navigate/wordHover.js";

/** Runs shown in one hover where several share a column line. */
const mostRuns = 3;

/**
 * Resting on a column shows its readings with the fitted curve, k and its half-life, the rates; so does its header cell
 * in the data file. Resting on other words tells what they mean.
 */
export const hover: Feature = {
  capabilities: { hoverProvider: true },
  start(context) {
    context.connection.onHover(({ textDocument: { uri }, position }, token) => {
      const document = context.documents.get(uri);
      const signal = abortSignalOf(token);
      if (document === undefined) return hoverInData(context, uri, position, signal);
      const bound = context.workspace().bound(context.document(document));
      const offset = document.offsetAt(position);
      const column = columnAt(bound, offset);
      if (column !== null) return hoverOf(context, document, column, signal);
      const word = wordHover(bound, offset);
      return word === null ? null : { ...markdown(word.text), range: rangeOf(document, word.span) };
    });
  },
};

function markdown(value: string): Hover {
  return { contents: { kind: MarkupKind.Markdown, value } };
}

function rangeOf(document: TextDocument, { start, end }: Span): Range {
  return { start: document.positionAt(start), end: document.positionAt(end) };
}

interface ShownColumn {
  readonly name: string;
  readonly runs: readonly string[];
}

/** The findings of a column, run by run; null where the text changed meanwhile, or no run has findings. */
async function columnParts(
  context: ServerContext,
  document: TextDocument,
  columns: readonly ShownColumn[],
  signal: AbortSignal,
): Promise<string[] | null> {
  const { version } = document;
  const description = await context.workspace().describe(context.document(document), { curves: "thinned", signal });
  // An answer about a text that is no more would point at the wrong words.
  if (description === null || context.documents.get(document.uri)?.version !== version) return null;
  const theme = context.client.theme ?? "neutral";
  const shown = columns.flatMap(({ name, runs }) =>
    description.runs.filter((run) => runs.includes(run.name)).map((run) => ({ run, name })),
  );
  return shown.slice(0, mostRuns).map(({ run, name }) => columnHover(run, name, theme, description.diagnostics));
}

const rule = "\n\n---\n\n";

async function hoverOf(
  context: ServerContext,
  document: TextDocument,
  column: ShownColumn & { readonly span: Span },
  signal: AbortSignal,
): Promise<Hover | null> {
  const parts = await columnParts(context, document, [column], signal);
  if (parts === null || parts.length === 0) return null;
  return { ...markdown(parts.join(rule)), range: rangeOf(document, column.span) };
}

/** The same over a header cell of a data file that open descriptions use. */
async function hoverInData(
  context: ServerContext,
  uri: string,
  position: Position,
  signal: AbortSignal,
): Promise<Hover | null> {
  const found = await columnsAtCell(context, URI.parse(uri).toString(), position);
  const parts: string[] = [];
  for (const { open, cells } of found) {
    const columns = cells.map(({ column, run }) => ({ name: column.name, runs: [run] }));
    parts.push(...((await columnParts(context, open, columns, signal)) ?? []));
  }
  const span = found[0]?.cells[0]?.cell.span;
  if (parts.length === 0 || span == null) return null;
  const { line } = position;
  const range = { start: { line, character: span.start }, end: { line, character: span.end } };
  return { ...markdown(parts.slice(0, mostRuns).join(rule)), range };
}
