// The extension in a web worker: dist/extension.web.js.
import { type ExtensionContext, Uri, workspace } from "vscode";
import { type BaseLanguageClient, LanguageClient } from "vscode-languageclient/browser";
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
async function startWorker(script: Uri): Promise<Worker> {
  const text = await workspace.fs.readFile(script);
  const source = new Blob([new Uint8Array(text)], { type: "text/javascript" });
  return new Worker(URL.createObjectURL(source), { name: "ratewright language server" });
}

export async function deactivate(): Promise<void> {
  if (client?.isRunning()) await client.stop();
}
