import { readFileSync } from "node:fs";
import { join } from "node:path";
import type { Session } from "./session.js";

/** Sets the cursor in the active editor; line and column count from 1, columns in UTF-16 units. */
export async function goTo({ page }: Session, line: number, column: number): Promise<void> {
  await page.locator(".editor-group-container.active .monaco-editor .view-lines").click();
  await page.keyboard.press("Control+g");
  const box = page.locator(".quick-input-widget .quick-input-box input");
  await box.waitFor();
  await box.fill(`:${line}:${column}`);
  await page.keyboard.press("Enter");
  await box.waitFor({ state: "hidden" });
}

/** Types at the cursor, key by key. */
export async function type({ page }: Session, text: string): Promise<void> {
  await page.keyboard.type(text, { delay: 5 });
}

/** Selects from one place to another on a line, so that what is typed next takes its place. Columns count from 1. */
export async function select(session: Session, line: number, column: number, length: number): Promise<void> {
  await goTo(session, line, column);
  for (let step = 0; step < length; step++) await session.page.keyboard.press("Shift+ArrowRight");
}

/** Saves the active file and answers with its text on disk. */
export async function save({ page, workspace }: Session, path: string): Promise<string> {
  await page.keyboard.press("Control+s");
  await page.locator(".tabs-container .tab.active:not(.dirty)").waitFor();
  return readFileSync(join(workspace, path), "utf8");
}
