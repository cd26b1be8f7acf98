import type { Session } from "./session.js";
import { type ThemeKind, themes } from "./themes.js";

/** Changes the theme by the setting and waits until the page has it. */
export async function changeTheme(session: Session, kind: ThemeKind): Promise<void> {
  const { name, mark } = themes[kind];
  session.changeSettings({ "workbench.colorTheme": name });
  await session.page.locator(`.monaco-workbench.${mark}`).waitFor({ state: "attached" });
}
