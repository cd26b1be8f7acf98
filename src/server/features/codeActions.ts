import { type CodeAction, CodeActionKind, type TextEdit, type WorkspaceEdit } from "vscode-languageserver";
import type { TextDocument } from "vscode-languageserver-textdocument";
import type { Diagnostic } from "../../contract/findings.js";
import type { Feature, ServerContext } from "../context.js";
import { rangeOf, touches } from "../places.js";
import { protocolDiagnostic } from "./diagnostics.js";

/** Quick fixes: the mends of what is shown at the place, likeliest first; the first of each is the preferred one. */
export const codeActions: Feature = {
  capabilities: { codeActionProvider: { codeActionKinds: [CodeActionKind.QuickFix] } },
  start(context) {
    context.connection.onCodeAction(({ textDocument, range, context: { only } }) => {
      const document = context.documents.get(textDocument.uri);
      const wanted = only === undefined || only.some(includesQuickFix);
      if (document === undefined || !wanted) return [];
      const here = context.shown.current(document.uri).filter((shown) => touches(rangeOf(shown), range));
      return here.flatMap((diagnostic) => actionsOf(context, document, diagnostic));
    });
  },
};

function includesQuickFix(kind: string): boolean {
  return kind === "" || kind === CodeActionKind.QuickFix;
}

function actionsOf(context: ServerContext, document: TextDocument, diagnostic: Diagnostic): CodeAction[] {
  return diagnostic.mends.map(({ title, edits }, index) => ({
    title,
    kind: CodeActionKind.QuickFix,
    diagnostics: [protocolDiagnostic(diagnostic, context.client.docs)],
    isPreferred: index === 0,
    edit: workspaceEdit(
      context,
      document,
      edits.map((edit) => ({ range: rangeOf(edit), newText: edit.text })),
    ),
  }));
}

/** Where the client can check it, the edit is for this version of the text only. */
function workspaceEdit(context: ServerContext, { uri, version }: TextDocument, edits: TextEdit[]): WorkspaceEdit {
  if (!context.client.abilities.versionedEdits) return { changes: { [uri]: edits } };
  return { documentChanges: [{ textDocument: { uri, version }, edits }] };
}
