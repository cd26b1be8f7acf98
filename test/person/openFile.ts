import type { Session } from "./session.js";

/** Opens a file by double click in the list of files; `path` is relative to the opened folder, with forward slashes. */
export async function openFile({ page }: Session, path: string): Promise<void> {
  const names = path.split("/");
  const list = page.locator(".explorer-folders-view");
  for (const [depth, name] of names.entries()) {
    const row = list.locator(`.monaco-list-row[aria-level="${depth + 1}"]`).getByText(name, { exact: true });
    if (depth === names.length - 1) {
      await row.dblclick();
    } else {
      const open = await list.locator(`.monaco-list-row[aria-level="${depth + 1}"][aria-expanded="true"]`, {
        hasText: name,
      });
      if ((await open.count()) === 0) await row.click();
    }
  }
  const name = names.at(-1) ?? path;
  await page.locator(".tabs-container .tab.active", { hasText: name }).waitFor();
  await page.locator(".editor-group-container.active .monaco-editor .view-line").first().waitFor();
}
