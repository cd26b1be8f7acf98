import { type DocumentSymbol, SymbolKind } from "vscode-languageserver";
import type { Span } from "../../contract/problem.js";
import type { Bound } from "../../language/bind/bind.js";
import { blockOf, fieldOf, spanOf, textOf } from "../../language/fields.js";
import type { Statement } from "../../language/syntax.js";
import type { Feature } from "../context.js";
import { openBound, rangeIn } from "../openBound.js";

/** The outline of a description: reactions, species, runs with what was followed and what is wanted, series. */
export const documentSymbols: Feature = {
  capabilities: { documentSymbolProvider: { label: "Ratewright" } },
  start(context) {
    context.connection.onDocumentSymbol(({ textDocument }) => {
      const found = openBound(context, textDocument);
      return found === null ? [] : outlineOf(found.bound, found.bound.parsed.statements);
    });
  },
};

/** Kinds of lines that stand in the outline. */
const kinds: Readonly<Record<string, SymbolKind>> = {
  reaction: SymbolKind.Event,
  species: SymbolKind.Constant,
  calibration: SymbolKind.Constant,
  run: SymbolKind.Class,
  rows: SymbolKind.Array,
  data: SymbolKind.File,
  column: SymbolKind.Variable,
  follow: SymbolKind.Field,
  observed: SymbolKind.Event,
  rate: SymbolKind.Property,
  fit: SymbolKind.Function,
  series: SymbolKind.Namespace,
  mechanism: SymbolKind.Namespace,
  step: SymbolKind.Event,
};

/** The field that names a line in the outline; the words behind its first one stand there where it has none. */
const naming: Readonly<Record<string, string>> = {
  species: "species",
  calibration: "calibration",
  run: "run",
  column: "column",
  series: "series",
  mechanism: "mechanism",
  step: "step",
};

/** Outline of a set of lines; what belongs to one stands below it. */
export function outlineOf(bound: Bound, statements: readonly Statement[]): DocumentSymbol[] {
  const { uri } = bound.parsed;
  return statements.flatMap((statement): DocumentSymbol[] => {
    const head = statement.line.row?.head ?? "";
    const kind = kinds[head];
    if (kind === undefined) return [];
    const label = naming[head];
    const field = label === undefined ? null : fieldOf(statement, label);
    const line = spanOf(statement);
    const behind: Span = { start: statement.offset + statement.line.head.end, end: line.end };
    const words = bound.parsed.text.slice(behind.start, behind.end).trim().replace(/\s+/g, " ");
    const named = field !== null && field.text !== "";
    const name = named ? `${head} ${field.text}` : `${head} ${words}`.trim();
    const title = textOf(statement, "title") ?? (head === "column" ? textOf(statement, "header") : null);
    return [
      {
        name,
        kind,
        ...(title === null ? {} : { detail: title }),
        range: rangeIn(bound, blockOf(uri, statement)),
        selectionRange: rangeIn(bound, named && label !== undefined ? spanOf(statement, label) : line),
        children: outlineOf(bound, statement.children),
      },
    ];
  });
}
