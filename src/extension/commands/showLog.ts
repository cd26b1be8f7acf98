import { commands, type Disposable, type LogOutputChannel } from "vscode";

/** Name of the command. */
export const showLog = "ratewright.showLog";

export function registerShowLog(log: LogOutputChannel): Disposable {
  return commands.registerCommand(showLog, () => log.show(true));
}
