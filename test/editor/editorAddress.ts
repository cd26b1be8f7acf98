/** What a page of the editor shows and which extension it runs from source. Paths are absolute, of this machine. */
export interface EditorPage {
  /** Folder to open. */
  workspace: string;
  /** Folder of the extension to run. */
  extensionDevelopmentPath?: string;
  /** Module with `run(): Promise<void>` to run inside the extension host; the page ends when it has ended. */
  extensionTestsPath?: string;
}

/** The address of an editor's page at a server on 127.0.0.1. The server's files are named by their remote URI. */
export function editorAddress(port: number, page: EditorPage): string {
  const remote = (path: string) => `vscode-remote://127.0.0.1:${port}${urlPath(path)}`;
  const payload: [string, string][] = [["skipWelcome", "true"]];
  if (page.extensionDevelopmentPath !== undefined) {
    payload.push(["extensionDevelopmentPath", remote(page.extensionDevelopmentPath)]);
  }
  if (page.extensionTestsPath !== undefined) payload.push(["extensionTestsPath", remote(page.extensionTestsPath)]);
  const query = new URLSearchParams({ folder: urlPath(page.workspace), payload: JSON.stringify(payload) });
  return `http://127.0.0.1:${port}/?${query}`;
}

/** A path as it stands in a URI: forward slashes, starting with one (`/c:/…` on Windows). */
function urlPath(path: string): string {
  const forward = path.replaceAll("\\", "/");
  return forward.startsWith("/") ? forward : `/${forward}`;
}
