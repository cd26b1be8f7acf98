import type { CancellationToken, InlayHint, Range } from "vscode-languageserver";
import type { TextDocument } from "vscode-languageserver-textdocument";
import type { Description } from "../../contract/findings.js";
import type { Feature, ServerContext } from "../context.js";
import { lineHints } from "../navigate/lineHints.js";

/** Findings of the text of one version, and whoever waits for those of the next. */
interface Known {
  version: number;
  description: Description | null;
  shown: string;
  waiting: (() => void)[];
}

/**
 * Behind the lines stands what follows from them. A request that comes while the text is being worked on waits for the
 * findings of that text, so that nothing is worked out for it and nothing flickers; the editor keeps the old hints meanwhile.
 */
export const inlayHints: Feature = {
  capabilities: { inlayHintProvider: { resolveProvider: false } },
  start(context) {
    const { connection, documents, loop } = context;
    const known = new Map<string, Known>();
    const of = (uri: string): Known => {
      const before = known.get(uri);
      if (before !== undefined) return before;
      const fresh: Known = { version: -1, description: null, shown: "", waiting: [] };
      known.set(uri, fresh);
      return fresh;
    };
    const release = (entry: Known): boolean => {
      const waiting = entry.waiting.splice(0);
      for (const go of waiting) go();
      return waiting.length > 0;
    };
    loop.onFindings((open, description) => {
      const entry = of(open.uri);
      entry.version = open.version;
      entry.description = description;
      const asked = release(entry);
      // What changed without a request, as a data file does, the editor would never ask about.
      const shown = JSON.stringify(hintsOf(context, open, description, null));
      if (shown !== entry.shown && !asked && context.client.abilities.hintRefresh) {
        void connection.languages.inlayHint.refresh();
      }
      entry.shown = shown;
    });
    loop.onStatus((uri, { state }) => {
      if (state === "failed") release(of(uri));
    });
    documents.onDidClose(({ document: { uri } }) => {
      release(of(uri));
      known.delete(uri);
    });
    connection.languages.inlayHint.on(async ({ textDocument: { uri }, range }, token) => {
      const wanted = await isEnabled(context, uri);
      const open = documents.get(uri);
      if (open === undefined || !wanted) return [];
      const entry = of(uri);
      if (entry.version < open.version) await nextFindings(entry, token);
      const { description, version } = entry;
      const now = documents.get(uri);
      if (description === null || now === undefined || version !== now.version || token.isCancellationRequested)
        return [];
      return hintsOf(context, now, description, range);
    });
  },
};

function nextFindings(entry: Known, token: CancellationToken): Promise<void> {
  return new Promise((done) => {
    entry.waiting.push(done);
    token.onCancellationRequested(() => done());
  });
}

function hintsOf(
  context: ServerContext,
  open: TextDocument,
  description: Description,
  range: Range | null,
): InlayHint[] {
  const bound = context.workspace().bound(context.document(open));
  const [from, to] =
    range === null ? [0, Number.POSITIVE_INFINITY] : [open.offsetAt(range.start), open.offsetAt(range.end)];
  return lineHints(bound, description)
    .filter(({ offset }) => from <= offset && offset <= to)
    .map(({ offset, label, tooltip }) => ({ position: open.positionAt(offset), label, tooltip, paddingLeft: true }));
}

/** The setting `ratewright.inlayHints.enabled` as it is for this description. */
async function isEnabled({ connection, client }: ServerContext, scopeUri: string): Promise<boolean> {
  if (!client.abilities.configuration) return true;
  const answer: unknown = await connection.workspace.getConfiguration({ scopeUri, section: "ratewright.inlayHints" });
  return !(typeof answer === "object" && answer !== null && "enabled" in answer && answer.enabled === false);
}
