import { commands, type Disposable, type LogOutputChannel } from "vscode";
import { type BaseLanguageClient, State } from "vscode-languageclient";

/** Name of the command. */
export const restartServer = "ratewright.restartServer";

/** The way back after a crash: ends the server, however it does, and starts a new one. */
export function registerRestartServer(client: BaseLanguageClient, log: LogOutputChannel): Disposable {
  return commands.registerCommand(restartServer, async () => {
    log.info("The language server is restarted.");
    try {
      if (client.state !== State.Stopped) await client.stop();
    } catch (error) {
      log.warn(`The old server did not end in order: ${error instanceof Error ? error.message : String(error)}`);
    }
    await client.start();
  });
}
