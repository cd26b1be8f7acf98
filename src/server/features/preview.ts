import type { CancellationToken } from "vscode-languageserver";
import type { TextDocument } from "vscode-languageserver-textdocument";
import type { Description } from "../../contract/findings.js";
import {
  type ExportAnswer,
  type ExportQuestion,
  type PreviewLeft,
  type PreviewPage,
  type PreviewQuestion,
  previewExport,
  previewLeft,
  previewPage,
  type WindowAnswer,
  type WindowQuestion,
  windowEdit,
} from "../../contract/previewProtocol.js";
import type { Curves } from "../../workspace/computer.js";
import { abortSignalOf } from "../abortSignal.js";
import type { Feature, ServerContext } from "../context.js";
import { exportOf } from "../preview/exportOf.js";
import { pageOf } from "../preview/pageOf.js";
import { windowEdits } from "../preview/windowEdit.js";

/** Answers the preview: the page of a run, the edit that writes a window, a run in other forms. */
export const preview: Feature = {
  capabilities: {},
  start(context) {
    const { connection, documents } = context;
    connection.onRequest(previewPage, async (question: PreviewQuestion, token): Promise<PreviewPage | null> => {
      if (documents.get(question.uri) !== undefined) context.previewed.add(question.uri);
      const found = await findingsOf(context, question.uri, "thinned", token);
      if (found === null) return null;
      const { document, description } = found;
      const bound = context.workspace().bound(context.document(document));
      return pageOf({ document, bound, description, access: context.access() }, question);
    });
    connection.onNotification(previewLeft, ({ uri }: PreviewLeft) => void context.previewed.delete(uri));
    documents.onDidClose(({ document }) => void context.previewed.delete(document.uri));
    connection.onRequest(windowEdit, ({ uri, version, run, fits, ...span }: WindowQuestion): WindowAnswer => {
      const document = documents.get(uri);
      if (document === undefined || document.version !== version) return null;
      return windowEdits(context.workspace().bound(context.document(document)), run, fits, span);
    });
    connection.onRequest(previewExport, async (question: ExportQuestion, token): Promise<ExportAnswer> => {
      const found = await findingsOf(context, question.uri, true, token);
      return found === null ? null : exportOf(found.description, question);
    });
  },
};

/** Findings with curves of a text as it stands; null where it is not open, or changed meanwhile. */
async function findingsOf(
  context: ServerContext,
  uri: string,
  curves: Curves,
  token: CancellationToken,
): Promise<{ document: TextDocument; description: Description } | null> {
  const document = context.documents.get(uri);
  if (document === undefined) return null;
  const { version } = document;
  const signal = abortSignalOf(token);
  const description = await context.workspace().describe(context.document(document), { curves, signal });
  if (description === null || context.documents.get(uri)?.version !== version) return null;
  return { document, description };
}
