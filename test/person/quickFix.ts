import type { Session } from "./session.js";
import { goTo } from "./typing.js";

/** Opens the menu of quick fixes at a place by keyboard and answers with the titles it offers. */
export async function openQuickFixes(session: Session, line: number, column: number): Promise<string[]> {
  await goTo(session, line, column);
  const { page } = session;
  await page.keyboard.press("Control+.");
  const rows = page.locator(".action-widget .monaco-list-row.action");
  await rows.first().waitFor();
  return (await rows.allInnerTexts()).map((title) => title.trim());
}

/** Carries out the quick fix whose title begins with these words, by keyboard. */
export async function applyQuickFix(session: Session, line: number, column: number, title: string): Promise<void> {
  const titles = await openQuickFixes(session, line, column);
  const steps = titles.findIndex((offered) => offered.startsWith(title));
  if (steps < 0) throw new Error(`no quick fix begins with "${title}"; offered: ${titles.join(" | ") || "none"}`);
  const { page } = session;
  for (let step = 0; step < steps; step++) await page.keyboard.press("ArrowDown");
  await page.keyboard.press("Enter");
  await page.locator(".action-widget").waitFor({ state: "hidden" });
}
