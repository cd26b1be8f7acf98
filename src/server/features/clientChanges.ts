import { DidChangeConfigurationNotification } from "vscode-languageserver";
import { type ThemeChanged, themeChanged, trustGranted } from "../../contract/editorProtocol.js";
import { version } from "../../contract/version.js";
import { readSettings } from "../clientState.js";
import type { Feature, ServerContext } from "../context.js";

/** Follows what the person changes beside the text: settings, trust, opened folders, theme. */
export const clientChanges: Feature = {
  capabilities: { workspace: { workspaceFolders: { supported: true, changeNotifications: true } } },
  start(context) {
    const { connection, client } = context;
    connection.onInitialized(async () => {
      context.log(`The language server of Ratewright ${version} runs.`);
      if (client.abilities.configurationEvents) {
        await connection.client.register(DidChangeConfigurationNotification.type, { section: "ratewright" });
      }
      if (client.abilities.folderEvents) {
        connection.workspace.onDidChangeWorkspaceFolders(({ added, removed }) => {
          const gone = new Set(removed.map(({ uri }) => uri));
          client.folders = [...client.folders.filter((uri) => !gone.has(uri)), ...added.map(({ uri }) => uri)];
          context.renew();
        });
      }
      await takeSettings(context);
    });
    connection.onDidChangeConfiguration(async () => {
      await takeSettings(context);
      // Their switch is read when hints are asked for.
      if (client.abilities.hintRefresh) await connection.languages.inlayHint.refresh();
    });
    connection.onNotification(themeChanged, ({ theme }: ThemeChanged) => {
      client.theme = theme;
    });
    connection.onNotification(trustGranted, () => {
      client.trusted = true;
      context.renew();
    });
  },
};

async function takeSettings(context: ServerContext): Promise<void> {
  const { connection, client } = context;
  if (!client.abilities.configuration) return;
  const before = client.settings;
  client.settings = readSettings(await connection.workspace.getConfiguration("ratewright"));
  if (client.settings.data.maximumSize !== before.data.maximumSize) context.renew();
}
