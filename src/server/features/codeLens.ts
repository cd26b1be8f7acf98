import { type CodeLens, CodeLensRefreshRequest } from "vscode-languageserver";
import type { Verdict } from "../../workspace/verify.js";
import type { Feature, ServerContext } from "../context.js";
import { recordVerdict, writeRefusal } from "../recordFiles.js";

/** A line above the text: its words, and the command behind them. */
interface Line {
  readonly title: string;
  readonly command: "ratewright.writeRecord" | "ratewright.showRecordDifference";
}

/** Above the first line: whether the record of the description is up to date, stale and why, or not there. */
export const codeLens: Feature = {
  capabilities: { codeLensProvider: {} },
  start(context) {
    const shown = new Map<string, readonly Line[]>();
    context.loop.onFindings(({ uri }, description) => {
      if (uri.startsWith("untitled:")) return;
      void recordVerdict(context, uri, description).then((verdict) => {
        const lines = linesOf(context, uri, verdict);
        if (JSON.stringify(lines) === JSON.stringify(shown.get(uri))) return;
        shown.set(uri, lines);
        if (!context.client.abilities.codeLensRefresh) return;
        context.connection
          .sendRequest(CodeLensRefreshRequest.type)
          .catch((error: unknown) => context.log(`The line about the record is not renewed: ${String(error)}`));
      });
    });
    context.documents.onDidClose(({ document: { uri } }) => void shown.delete(uri));
    // What was last found out stays until findings of the new text are there: it does not flicker while a person types.
    context.connection.onCodeLens(({ textDocument: { uri } }): CodeLens[] =>
      (context.client.settings.codeLens.enabled ? (shown.get(uri) ?? []) : []).map(({ title, command }) => ({
        range: { start: { line: 0, character: 0 }, end: { line: 0, character: 0 } },
        command: { title, command, arguments: [uri] },
      })),
    );
  },
};

function linesOf(context: ServerContext, uri: string, verdict: Verdict | string): Line[] {
  const write = (title: string): Line[] =>
    writeRefusal(context, uri) === null ? [{ title, command: "ratewright.writeRecord" }] : [];
  const difference = (title: string): Line => ({ title, command: "ratewright.showRecordDifference" });
  if (typeof verdict === "string") return [difference("record cannot be read")];
  switch (verdict.kind) {
    case "none":
      return write("no record yet: write it");
    case "same":
      return [difference("record up to date")];
    case "unreadable":
      return [
        difference("record cannot be read"),
        ...(["record-foreign", "record-newer"].includes(verdict.problem.code) ? [] : write("write it anew")),
      ];
    case "moved":
      return [difference(`record stale: ${staleWords(verdict.moved)}`), ...write("write it anew")];
  }
}

/** What changed, and how many results moved with it. */
function staleWords(moved: Extract<Verdict, { kind: "moved" }>["moved"]): string {
  const files = [...new Set(moved.filter(({ cause }) => cause === "data").map(({ what }) => what))];
  const changed = [
    ...(files.length === 0 ? [] : [files.length === 1 ? `${files[0]} changed` : `${files.length} data files changed`]),
    ...(moved.some(({ cause }) => cause === "description") ? ["the description changed"] : []),
    ...(moved.some(({ cause }) => cause === "method") ? ["numbers are computed in another way"] : []),
    ...(moved.some(({ cause }) => cause === "record") ? ["the record itself was changed"] : []),
  ];
  const results = moved.filter(({ cause }) => cause === "result").length;
  return [...changed, ...(results === 0 ? [] : [`${results} ${results === 1 ? "result" : "results"} moved`])].join(
    ", ",
  );
}
