import { type DocumentSymbol, SymbolKind, type WorkspaceSymbol } from "vscode-languageserver";
import { abortSignalOf } from "../abortSignal.js";
import type { Feature } from "../context.js";
import { shownPath } from "../folders.js";
import { allDescriptions } from "../navigate/descriptions.js";
import { outlineOf } from "./documentSymbols.js";

/** Symbols answered at most. */
const most = 500;

/** Finds runs, series, columns and whatever else has a name, in every description of the opened folders. */
export const workspaceSymbols: Feature = {
  capabilities: { workspaceSymbolProvider: true },
  start(context) {
    context.connection.onWorkspaceSymbol(async ({ query }, token) => {
      const found: WorkspaceSymbol[] = [];
      for (const bound of await allDescriptions(context, abortSignalOf(token))) {
        const { uri } = bound.parsed;
        const path = shownPath(uri, context.client.folders);
        for (const { symbol, below } of flat(outlineOf(bound, bound.parsed.statements), [])) {
          const { name, kind, detail, selectionRange: range } = symbol;
          if (!listed.has(kind) || !holdsInOrder(`${name} ${detail ?? ""}`, query)) continue;
          found.push({ name, kind, containerName: [path, ...below].join(" · "), location: { uri, range } });
        }
      }
      return found.slice(0, most);
    });
  },
};

/** What is worth finding from afar; rates and fits are found in their run. */
const listed = new Set<SymbolKind>([SymbolKind.Class, SymbolKind.Namespace, SymbolKind.Constant, SymbolKind.Variable]);

function flat(
  symbols: readonly DocumentSymbol[],
  below: readonly string[],
): { symbol: DocumentSymbol; below: readonly string[] }[] {
  return symbols.flatMap((symbol) => [
    { symbol, below },
    ...flat(symbol.children ?? [], symbol.kind === SymbolKind.Class ? [...below, symbol.name] : below),
  ]);
}

/** Whether the letters of the query stand in the text in this order, as the editor's own lists take it. */
function holdsInOrder(text: string, query: string): boolean {
  let at = 0;
  const letters = text.toLowerCase();
  for (const letter of query.toLowerCase().replace(/\s+/g, "")) {
    at = letters.indexOf(letter, at) + 1;
    if (at === 0) return false;
  }
  return true;
}
