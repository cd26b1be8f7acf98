import { Range, Uri, type WebviewPanel, WorkspaceEdit, workspace } from "vscode";
import { type BaseLanguageClient, CancellationTokenSource } from "vscode-languageclient";
import type { StatusChanged } from "../../contract/editorProtocol.js";
import {
  type ExportAnswer,
  type ExportFormat,
  type ExportQuestion,
  type FromPage,
  type PreviewLeft,
  type PreviewPage,
  type PreviewQuestion,
  previewExport,
  previewLeft,
  previewPage,
  type ToPage,
  type WindowAnswer,
  type WindowQuestion,
  windowEdit,
} from "../../contract/previewProtocol.js";
import { openAt, openRow } from "./openAt.js";
import { createPageChoice } from "./pageChoice.js";
import { panelPage } from "./panelPage.js";
import { bytesOf, saveExport } from "./saveExport.js";

/** Time the page may be behind the text before its sign says so, ms: it would only flicker with every keystroke. */
const patience = 600;

/** What a panel needs from the extension. */
export interface PanelTools {
  readonly client: BaseLanguageClient;
  readonly extension: Uri;
  readonly log: (line: string) => void;
}

/** What is looked at: a description, and the run that is wanted or the cursor's line, from 1. */
export interface Look {
  readonly uri: string;
  readonly run: string | null;
  readonly line: number | null;
}

/** The preview in its panel, until that is closed. */
export interface PreviewPanel {
  look(at: Look): void;
  /** Where the server stands with a description. */
  status(status: StatusChanged): void;
  /** Asks anew: the server is another one. */
  refresh(): void;
  /** Says quietly what stands in the way. */
  sign(words: string): void;
}

export function createPreviewPanel(panel: WebviewPanel, { client, extension, log }: PanelTools): PreviewPanel {
  const { webview } = panel;
  const choice = createPageChoice();
  let look: Look | null = null;
  let page: PreviewPage | null = null;
  let signWords = "";
  let ready = false;
  let sent = "";
  let asking: CancellationTokenSource | null = null;
  let again = false;
  let behind: ReturnType<typeof setTimeout> | undefined;

  const post = (message: ToPage): void => {
    if (ready) void webview.postMessage(message);
  };
  const sign = (words: string): void => {
    signWords = words;
    post({ kind: "sign", words });
  };
  const name = (uri: string): string => workspace.asRelativePath(Uri.parse(uri, true));
  const show = (): void => {
    if (page === null) return;
    // A page that stands there already is not sent again, so that nothing flickers and nothing is worked through twice.
    const words = JSON.stringify({ ...page, version: 0 });
    if (words !== sent) post({ kind: "show", page, name: name(page.uri) });
    sent = ready ? words : "";
  };

  const ask = async (): Promise<void> => {
    if (look === null) return;
    if (asking !== null) {
      again = true;
      asking.cancel();
      return;
    }
    const cancel = new CancellationTokenSource();
    asking = cancel;
    const asked = look;
    try {
      const document = await workspace.openTextDocument(Uri.parse(asked.uri, true));
      const question: PreviewQuestion = { uri: document.uri.toString(), line: asked.line, run: asked.run };
      const answer = await client.sendRequest<PreviewPage | null>(previewPage, question, cancel.token);
      if (answer !== null && look === asked && answer.version === document.version) {
        clearTimeout(behind);
        behind = undefined;
        const found = choice.take(answer, page?.uri === answer.uri ? page.run : null);
        page = found.page;
        panel.title = `Preview: ${name(answer.uri).split("/").at(-1)}`;
        show();
        sign(found.sign);
      }
    } catch (error) {
      if (!cancel.token.isCancellationRequested) {
        const words = error instanceof Error ? error.message : String(error);
        sign(`The last good picture; it cannot be brought up to date. ${words}`);
        log(`The preview has no answer: ${words}`);
      }
    } finally {
      cancel.dispose();
      asking = null;
      if (again) {
        again = false;
        void ask();
      }
    }
  };

  const leave = (uri: string): void => {
    const left: PreviewLeft = { uri };
    if (client.isRunning()) void client.sendNotification(previewLeft, left);
  };

  const writeWindow = async (plotId: string, from: number, to: number): Promise<void> => {
    const plot = page?.plots.find(({ id }) => id === plotId);
    if (page === null || plot === undefined || page.run === null) return;
    const { uri, version, run } = page;
    const document = await workspace.openTextDocument(Uri.parse(uri, true));
    const question: WindowQuestion = { uri, version, run, fits: plot.fits, from, to, unit: plot.timeUnit };
    const answer = document.version === version ? await client.sendRequest<WindowAnswer>(windowEdit, question) : null;
    if (answer === null || document.version !== version) {
      post({ kind: "say", words: "The text is another one by now: wait until the picture is up to date." });
      return;
    }
    const edit = new WorkspaceEdit();
    for (const { line, character, endLine, endCharacter, text } of answer) {
      edit.replace(document.uri, new Range(line, character, endLine, endCharacter), text);
    }
    const done = await workspace.applyEdit(edit);
    post({
      kind: "say",
      words: done ? "The window is written. Undo in the text takes it back." : "The edit was refused.",
    });
  };

  const exportAs = async (format: ExportFormat): Promise<void> => {
    if (page === null) return;
    const { uri, run } = page;
    const question: ExportQuestion = { uri, run, format: format === "png" ? "svg" : format };
    const files = await client.sendRequest<ExportAnswer>(previewExport, question);
    if (files === null) {
      post({ kind: "say", words: "There is nothing to export: no readings, or the text has changed meanwhile." });
      return;
    }
    for (const { name: file, text } of files) {
      if (format === "png") post({ kind: "draw png", name: file.replace(/\.svg$/, ".png"), svg: text });
      else await save(uri, file, text);
    }
  };
  const save = async (uri: string, file: string, content: string | Uint8Array): Promise<void> => {
    const where = await saveExport(uri, { name: file, content });
    if (where !== null) post({ kind: "say", words: `${where} is written.` });
  };

  const take = async (message: FromPage): Promise<void> => {
    switch (message.kind) {
      case "ready":
        ready = true;
        sent = "";
        show();
        if (signWords !== "") sign(signWords);
        if (look?.line !== null && look !== null) post({ kind: "cursor", line: look.line });
        break;
      case "choose run":
        if (look !== null) api.look({ ...look, run: message.run });
        break;
      case "go to line":
        if (page !== null) await openAt(page.uri, message.line);
        break;
      case "open reading":
        await openRow(message.file, message.line);
        break;
      case "write window":
        await writeWindow(message.plot, message.from, message.to);
        break;
      case "export":
        await exportAs(message.format);
        break;
      case "png drawn":
        if (page !== null) await save(page.uri, message.name, bytesOf(message.base64));
        break;
      case "violation":
        log(`The preview's page was refused something: ${message.words}`);
        break;
    }
  };

  const api: PreviewPanel = {
    look(at) {
      if (look !== null && look.uri !== at.uri) leave(look.uri);
      look = at;
      if (at.line !== null) post({ kind: "cursor", line: at.line });
      void ask();
    },
    status({ uri, state }) {
      if (look === null || uri !== look.uri) return;
      if (state === "up to date") void ask();
      else if (state === "failed")
        sign("The last good picture; the findings could not be worked out. The log says why.");
      else behind ??= setTimeout(() => sign("Behind the text"), patience);
    },
    refresh: () => void ask(),
    sign,
  };

  webview.options = { enableScripts: true, localResourceRoots: [Uri.joinPath(extension, "dist")] };
  webview.onDidReceiveMessage((message: FromPage) => {
    take(message).catch((error: unknown) => {
      const words = error instanceof Error ? error.message : String(error);
      post({ kind: "say", words });
      log(`The preview: ${words}`);
    });
  });
  const icon = (kind: string): Uri => Uri.joinPath(extension, "media", "icons", `raterun-${kind}.svg`);
  panel.iconPath = { light: icon("light"), dark: icon("dark") };
  const script = webview.asWebviewUri(Uri.joinPath(extension, "dist", "preview.js")).toString();
  webview.html = panelPage({ script });
  panel.onDidChangeViewState(() => {
    // A page that was hidden is made anew when it is shown, and says so.
    if (!panel.visible) ready = false;
  });
  panel.onDidDispose(() => {
    clearTimeout(behind);
    asking?.cancel();
    if (look !== null) leave(look.uri);
    look = null;
    ready = false;
  });
  return api;
}
