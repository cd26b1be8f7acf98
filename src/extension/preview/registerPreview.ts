import {
  commands,
  type Disposable,
  type TextDocument,
  type TextEditor,
  ViewColumn,
  type WebviewPanel,
  window,
} from "vscode";
import { State } from "vscode-languageclient";
import type { StatusChanged } from "../../contract/editorProtocol.js";
import type { PageState } from "../../contract/previewProtocol.js";
import { createPreviewPanel, type PanelTools, type PreviewPanel } from "./previewPanel.js";

/** Name of the command. */
export const openPreview = "ratewright.openPreview";
/** Kind of the panel, by which the editor brings it back. */
const viewType = "ratewright.preview";
/** Time the cursor must rest before the preview follows, ms. */
const rest = 80;

/** The preview: its command, its way back after a reload, and what it follows. */
export interface Preview extends Disposable {
  status(status: StatusChanged): void;
}

export function registerPreview(tools: PanelTools): Preview {
  let open: { readonly panel: WebviewPanel; readonly preview: PreviewPanel } | null = null;
  let resting: ReturnType<typeof setTimeout> | undefined;

  const adopt = (panel: WebviewPanel): PreviewPanel => {
    open?.panel.dispose();
    const preview = createPreviewPanel(panel, tools);
    open = { panel, preview };
    panel.onDidDispose(() => {
      if (open?.panel === panel) open = null;
    });
    return preview;
  };
  const follow = (editor: TextEditor): void => {
    open?.preview.look({
      uri: editor.document.uri.toString(),
      run: null,
      line: editor.selection.active.line + 1,
    });
  };
  const command = (): void => {
    const editor = [window.activeTextEditor, ...window.visibleTextEditors].find(
      (one) => one !== undefined && isDescription(one.document),
    );
    if (editor === undefined) {
      void window.showInformationMessage("Open a run description first; the preview shows the run under the cursor.");
      return;
    }
    if (open === null) {
      adopt(
        window.createWebviewPanel(
          viewType,
          "Preview",
          { viewColumn: ViewColumn.Beside, preserveFocus: true },
          { enableFindWidget: true },
        ),
      );
    } else open.panel.reveal(undefined, true);
    follow(editor);
  };

  const parts: Disposable[] = [
    commands.registerCommand(openPreview, command),
    window.registerWebviewPanelSerializer(viewType, {
      async deserializeWebviewPanel(panel: WebviewPanel, state: PageState | undefined) {
        const preview = adopt(panel);
        if (typeof state?.uri === "string") preview.look({ uri: state.uri, run: state.run, line: null });
      },
    }),
    window.onDidChangeTextEditorSelection(({ textEditor }) => {
      if (open === null || textEditor !== window.activeTextEditor || !isDescription(textEditor.document)) return;
      clearTimeout(resting);
      resting = setTimeout(() => follow(textEditor), rest);
    }),
    window.onDidChangeActiveTextEditor((editor) => {
      if (editor !== undefined && isDescription(editor.document)) follow(editor);
    }),
    tools.client.onDidChangeState(({ newState }) => {
      if (newState === State.Running) open?.preview.refresh();
      if (newState === State.Stopped) open?.preview.sign("The last good picture; the language server does not run.");
    }),
  ];
  return {
    status: (status) => open?.preview.status(status),
    dispose() {
      clearTimeout(resting);
      for (const part of parts) part.dispose();
    },
  };
}

function isDescription({ languageId }: TextDocument): boolean {
  return languageId === "raterun";
}
