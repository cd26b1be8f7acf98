import { commands, Disposable, EventEmitter, Uri, window, workspace } from "vscode";
import type { BaseLanguageClient } from "vscode-languageclient";
import {
  type RecordDifferenceAnswer,
  type RecordQuestion,
  recordDifference,
  type WriteFileAnswer,
  type WriteRecordAnswer,
  writeFile,
  writeRecord,
} from "../contract/recordProtocol.js";
import { writeForServer } from "./writeForServer.js";

/** Time the words about a written record stay in the status bar, ms. */
const saidFor = 6_000;
/** Scheme of the read-only text that says how a description differs from its record. */
const scheme = "ratewright-record";

/** The commands about records: write one, show in words what differs from it. */
export function registerRecords(client: BaseLanguageClient): Disposable {
  const renewed = new EventEmitter<Uri>();
  const ask = <Answer>(method: string, uri: Uri): Promise<Answer> => {
    const question: RecordQuestion = { uri: client.code2ProtocolConverter.asUri(uri) };
    return client.sendRequest<Answer>(method, question);
  };
  return Disposable.from(
    renewed,
    commands.registerCommand("ratewright.writeRecord", async (argument: unknown) => {
      const uri = descriptionOf(argument);
      if (uri === null) return;
      // The record is one of the text on disk: what stands there is what somebody else verifies.
      const document = await workspace.openTextDocument(uri);
      if (document.isDirty && !(await document.save())) return;
      const { done, words } = await ask<WriteRecordAnswer>(writeRecord, uri);
      if (done) window.setStatusBarMessage(words, saidFor);
      else void window.showWarningMessage(words);
    }),
    commands.registerCommand("ratewright.showRecordDifference", async (argument: unknown) => {
      const uri = descriptionOf(argument);
      if (uri === null) return;
      const { record } = await ask<RecordDifferenceAnswer>(recordDifference, uri);
      const shown = Uri.from({ scheme, path: `/${record} — what moved`, query: uri.toString() });
      const document = await workspace.openTextDocument(shown);
      renewed.fire(shown);
      await window.showTextDocument(document, { preview: true });
    }),
    workspace.registerTextDocumentContentProvider(scheme, {
      onDidChange: renewed.event,
      provideTextDocumentContent: async ({ query }) => {
        return (await ask<RecordDifferenceAnswer>(recordDifference, Uri.parse(query))).text;
      },
    }),
    client.onRequest<WriteFileAnswer, unknown>(writeFile, writeForServer),
  );
}

/** The description a command is about: the one it was called with, else the one in the active editor. */
function descriptionOf(argument: unknown): Uri | null {
  if (typeof argument === "string") return Uri.parse(argument, true);
  if (argument instanceof Uri) return argument;
  const active = window.activeTextEditor?.document;
  return active?.languageId === "raterun" ? active.uri : null;
}
