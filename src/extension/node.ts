// The extension in Node: dist/extension.cjs.
import type { ExtensionContext } from "vscode";
import { type BaseLanguageClient, LanguageClient, TransportKind } from "vscode-languageclient/node";
import { activateWith } from "./activate.js";

let client: BaseLanguageClient | undefined;

export async function activate(context: ExtensionContext): Promise<void> {
  const module = context.asAbsolutePath("dist/server.cjs");
  const run = { module, transport: TransportKind.ipc };
  client = await activateWith(context, (options) => {
    return new LanguageClient("ratewright", "Ratewright", { run, debug: run }, options);
  });
}

export async function deactivate(): Promise<void> {
  if (client?.isRunning()) await client.stop();
}
