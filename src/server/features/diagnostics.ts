import { DiagnosticSeverity, type Diagnostic as LspDiagnostic } from "vscode-languageserver";
import type { TextDocument } from "vscode-languageserver-textdocument";
import type { Diagnostic } from "../../contract/findings.js";
import type { Feature, ServerContext } from "../context.js";
import { rangeOf } from "../places.js";

const severities = {
  error: DiagnosticSeverity.Error,
  warning: DiagnosticSeverity.Warning,
  information: DiagnosticSeverity.Information,
} as const;

/** A diagnostic as the protocol has it. `docs` is the URI of the folder of pages, one of which explains the code. */
export function protocolDiagnostic(diagnostic: Diagnostic, docs: string | null): LspDiagnostic {
  const { severity, code, message } = diagnostic;
  const bare = { range: rangeOf(diagnostic), severity: severities[severity], code, source: "ratewright", message };
  return docs === null ? bare : { ...bare, codeDescription: { href: `${docs}/codes/${code}.md` } };
}

/**
 * What is wrong, as one types: the text's own problems at once, what data and fits show after a pause. Nothing is sent
 * that stands there already, so that nothing flickers.
 */
export const diagnostics: Feature = {
  capabilities: {},
  start(context) {
    const sent = new Map<string, string>();
    const send = ({ uri, version }: TextDocument, all: readonly Diagnostic[]): void => {
      const shown = all.map((one) => protocolDiagnostic(one, context.client.docs));
      const words = JSON.stringify(shown);
      if (sent.get(uri) === words) return;
      sent.set(uri, words);
      void context.connection.sendDiagnostics({ uri, version, diagnostics: shown });
    };
    context.documents.onDidChangeContent(({ document }) => {
      send(document, context.shown.text(document, boundOf(context, document)));
    });
    context.loop.onFindings((document, description) => {
      send(document, context.shown.findings(document, boundOf(context, document), description));
    });
    context.documents.onDidClose(({ document: { uri } }) => {
      sent.delete(uri);
      context.shown.close(uri);
      void context.connection.sendDiagnostics({ uri, diagnostics: [] });
    });
  },
};

function boundOf(context: ServerContext, document: TextDocument) {
  return context.workspace().bound(context.document(document));
}
