import type { Position, Range, TextDocumentIdentifier } from "vscode-languageserver";
import type { TextDocument } from "vscode-languageserver-textdocument";
import type { Span } from "../contract/problem.js";
import type { Bound } from "../language/bind/bind.js";
import { placeOf } from "../language/lineIndex.js";
import type { ServerContext } from "./context.js";
import { rangeOf } from "./places.js";

/** An open description as it stands, with its meaning. */
export interface OpenBound {
  readonly open: TextDocument;
  readonly bound: Bound;
}

/** Null where the document is not open here: it is no description. */
export function openBound(context: ServerContext, { uri }: TextDocumentIdentifier): OpenBound | null {
  const open = context.documents.get(uri);
  return open === undefined ? null : { open, bound: context.workspace().bound(context.document(open)) };
}

/** The same with the offset of a position in it. */
export function openBoundAt(
  context: ServerContext,
  { textDocument, position }: { textDocument: TextDocumentIdentifier; position: Position },
): (OpenBound & { readonly offset: number }) | null {
  const found = openBound(context, textDocument);
  return found === null ? null : { ...found, offset: found.open.offsetAt(position) };
}

/** The protocol's range of a stretch of a description's text. */
export function rangeIn({ parsed }: Bound, span: Span): Range {
  return rangeOf(placeOf(parsed.index, span));
}
