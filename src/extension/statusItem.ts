import { type Disposable, StatusBarAlignment, window } from "vscode";
import { type BaseLanguageClient, State } from "vscode-languageclient";
import type { StatusChanged } from "../contract/editorProtocol.js";
import { showLog } from "./commands/showLog.js";

/** Time a description may be behind before the item says so, ms: it would only flicker with every keystroke. */
const patience = 500;

/** Says beside a description where the server stands with it, in words. */
export interface StatusItem extends Disposable {
  take(status: StatusChanged): void;
}

/** The item shows while a description is in the active editor; it is quiet otherwise. */
export function createStatusItem(client: BaseLanguageClient): StatusItem {
  const item = window.createStatusBarItem("ratewright.status", StatusBarAlignment.Right, 100);
  item.name = "Ratewright";
  item.command = showLog;
  const known = new Map<string, StatusChanged>();
  const behind = new Map<string, ReturnType<typeof setTimeout>>();

  const show = (): void => {
    const active = window.activeTextEditor?.document;
    if (active?.languageId !== "raterun") {
      item.hide();
      return;
    }
    const status = known.get(active.uri.toString());
    const words =
      client.state === State.Stopped ? stopped : client.state === State.Starting ? starting : wordsOf(status);
    item.text = `Ratewright: ${words.state}`;
    item.tooltip = `${words.detail} Select to show the log.`;
    item.show();
  };

  const parts: Disposable[] = [
    item,
    window.onDidChangeActiveTextEditor(show),
    client.onDidChangeState(({ newState }) => {
      // Whatever a server said before it ended holds no longer.
      if (newState !== State.Running) known.clear();
      show();
    }),
  ];
  show();
  return {
    take(status) {
      const { uri, state } = status;
      if (state === "working" && behind.has(uri)) return;
      clearTimeout(behind.get(uri));
      behind.delete(uri);
      const tell = (): void => {
        known.set(uri, status);
        show();
      };
      if (state === "working") behind.set(uri, setTimeout(tell, patience));
      else tell();
    },
    dispose() {
      for (const timer of behind.values()) clearTimeout(timer);
      for (const part of parts) part.dispose();
    },
  };
}

interface Words {
  readonly state: string;
  readonly detail: string;
}

const stopped: Words = {
  state: "stopped",
  detail: "The language server does not run; the command “Ratewright: Restart Language Server” starts it.",
};
const starting: Words = { state: "starting", detail: "The language server starts." };

function wordsOf(status: StatusChanged | undefined): Words {
  if (status?.state === "up to date") {
    return { state: "up to date", detail: `Findings worked out in ${status.milliseconds ?? 0} ms.` };
  }
  if (status?.state === "failed") return { state: "stopped", detail: "The findings could not be worked out." };
  return { state: "working", detail: "Findings are being worked out." };
}
