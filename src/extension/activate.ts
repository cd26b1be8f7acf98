import { type ExtensionContext, type LogOutputChannel, Uri, window, workspace } from "vscode";
import type { BaseLanguageClient, LanguageClientOptions } from "vscode-languageclient";
import {
  type InitializationOptions,
  type ListFolderAnswer,
  listFolder,
  type ReadFileAnswer,
  readFile,
  statusChanged,
  type ThemeChanged,
  themeChanged,
  trustGranted,
} from "../contract/editorProtocol.js";
import { registerOpenSample } from "./commands/openSample.js";
import { registerRestartServer } from "./commands/restartServer.js";
import { registerShowLog } from "./commands/showLog.js";
import { listForServer } from "./listForServer.js";
import { registerPreview } from "./preview/registerPreview.js";
import { readForServer } from "./readForServer.js";
import { registerRecords } from "./records.js";
import { createStatusItem } from "./statusItem.js";
import { themeKind } from "./themeKind.js";

/** Makes the client with its server, not started; how differs between Node and the web. */
export type MakeClient = (options: LanguageClientOptions) => BaseLanguageClient;

/** Starts everything the extension is. Whatever goes wrong with the server is said in the log and the status item. */
export async function activateWith(context: ExtensionContext, make: MakeClient): Promise<BaseLanguageClient> {
  const log = window.createOutputChannel("Ratewright", { log: true });
  const client = make(clientOptions(context, log));
  const status = createStatusItem(client);
  const preview = registerPreview({ client, extension: context.extensionUri, log: (line) => log.info(line) });
  context.subscriptions.push(
    log,
    status,
    preview,
    registerShowLog(log),
    registerOpenSample(context.extensionUri),
    registerRestartServer(client, log),
    registerRecords(client),
    client.onNotification(statusChanged, (told) => {
      status.take(told);
      preview.status(told);
    }),
    client.onRequest<ReadFileAnswer, unknown>(readFile, readForServer),
    client.onRequest<ListFolderAnswer, unknown>(listFolder, listForServer),
    window.onDidChangeActiveColorTheme(() => {
      const message: ThemeChanged = { theme: themeKind() };
      return client.isRunning() ? client.sendNotification(themeChanged, message) : undefined;
    }),
    workspace.onDidGrantWorkspaceTrust(() => {
      return client.isRunning() ? client.sendNotification(trustGranted) : undefined;
    }),
  );
  try {
    await client.start();
  } catch (error) {
    log.error(`The language server did not start: ${error instanceof Error ? error.message : String(error)}`);
  }
  return client;
}

function clientOptions({ extensionUri }: ExtensionContext, log: LogOutputChannel): LanguageClientOptions {
  return {
    documentSelector: [{ language: "raterun" }],
    outputChannel: log,
    // Asked for at each start, so that a restarted server knows the theme and the trust of that moment.
    initializationOptions: (): InitializationOptions => ({
      theme: themeKind(),
      trusted: workspace.isTrusted,
      // The editor opens a link to a file of its own as it opens any file; on the web the address leads to the same page.
      docs: Uri.joinPath(extensionUri, "media", "docs").toString(),
    }),
    markdown: { isTrusted: false, supportHtml: false },
    diagnosticCollectionName: "ratewright",
  };
}
