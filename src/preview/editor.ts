import type { FromPage, PageState } from "../contract/previewProtocol.js";

/** What the editor gives to a page in a panel. */
interface PanelApi {
  postMessage(message: FromPage): void;
  getState(): PageState | undefined;
  setState(state: PageState): void;
}

declare function acquireVsCodeApi(): PanelApi;

/** The editor on the other side of the wall. */
export const editor: PanelApi = acquireVsCodeApi();
