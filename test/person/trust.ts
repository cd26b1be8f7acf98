import type { Page } from "playwright-core";

/** Answers the question whether the authors of the files are trusted; without trust the editor is in Restricted Mode. */
export async function answerTrust(page: Page, trust: boolean): Promise<void> {
  const question = page.locator(".monaco-dialog-box", { hasText: "Do you trust the authors" });
  await question.waitFor();
  await question.getByRole("button", { name: trust ? /^Yes/ : /^No/ }).click();
  await question.waitFor({ state: "detached" });
}
