import type { DocumentLink } from "vscode-languageserver";
import type { Span } from "../../contract/problem.js";
import { isInside, resolveUri } from "../../data/resolve.js";
import type { Bound } from "../../language/bind/bind.js";
import { fieldOf, itemsOf } from "../../language/fields.js";
import { everyStatement } from "../../language/navigate/everyStatement.js";
import type { FileAccess } from "../../workspace/loadFiles.js";
import type { Feature } from "../context.js";
import { openBound, rangeIn } from "../openBound.js";

/** Paths lead to their files: data, tables of runs, descriptions that a series names. */
export const documentLinks: Feature = {
  capabilities: { documentLinkProvider: { resolveProvider: false } },
  start(context) {
    context.connection.onDocumentLinks(({ textDocument }) => {
      const found = openBound(context, textDocument);
      return found === null ? [] : linksOf(found.bound, context.access());
    });
  },
};

/** Links of a description; a path that may not be read, or leads nowhere, is none. */
function linksOf(bound: Bound, access: FileAccess): DocumentLink[] {
  const { uri } = bound.parsed;
  const fence = access.within(uri);
  return pathsOf(bound).flatMap(({ path, span }) => {
    const place = resolveUri(uri, path);
    if (place.kind !== "uri" || (fence !== null && !isInside(fence, place.uri))) return [];
    return [{ range: rangeIn(bound, span), target: place.uri, tooltip: `Open ${path}` }];
  });
}

interface WrittenPath {
  readonly path: string;
  /** without the quotes */
  readonly span: Span;
}

function pathsOf({ parsed }: Bound): WrittenPath[] {
  const paths: WrittenPath[] = [];
  for (const statement of everyStatement(parsed.statements)) {
    const add = (path: string, start: number): void => {
      const from = statement.offset + start;
      if (path !== "" && !/[*?[\]{}]/.test(path)) paths.push({ path, span: { start: from, end: from + path.length } });
    };
    const path = fieldOf(statement, "path");
    const head = statement.line.row?.head;
    if (path !== null && (head === "data" || head === "rows")) add(path.text, path.span.start + 1);
    for (const { text, span } of itemsOf(statement, "runs")) {
      const quoted = span.end - span.start > text.length ? 1 : 0;
      const file = /^(.+\.raterun)(:[^:/\\]+)?$/.exec(text)?.[1];
      if (file !== undefined) add(file, span.start + quoted);
    }
  }
  return paths;
}
