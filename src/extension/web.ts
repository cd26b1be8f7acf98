// The extension in a web worker: dist/extension.web.js.
import { type ExtensionContext, Uri, workspace } from "vscode";
import {
  type BaseLanguageClient,
  BrowserMessageReader,
  BrowserMessageWriter,
  LanguageClient,
  type MessageTransports,
} from "vscode-languageclient/browser";
import { activateWith } from "./activate.js";

let client: BaseLanguageClient | undefined;

export async function activate(context: ExtensionContext): Promise<void> {
  const script = Uri.joinPath(context.extensionUri, "dist", "server.web.js");
  client = await activateWith(context, (options) => {
    return new LanguageClient("ratewright", "Ratewright", () => startWorker(script), options);
  });
}

/**
 * A worker may only run a script of its own origin, and the extension's files have another: the script is read through
 * the editor and run from memory. Its address stays valid, since the server starts a worker of its own from it.
 */
async function startWorker(script: Uri): Promise<MessageTransports> {
  const text = await workspace.fs.readFile(script);
  const source = new Blob([new Uint8Array(text)], { type: "text/javascript" });
  const worker = new Worker(URL.createObjectURL(source), { name: "ratewright language server" });
  // The ends of the wire are made here: the client knows a worker by its class, and the editor has one of its own.
  return { reader: new BrowserMessageReader(worker), writer: new BrowserMessageWriter(worker) };
}

export async function deactivate(): Promise<void> {
  if (client?.isRunning()) await client.stop();
}
