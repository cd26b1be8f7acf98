import type { Session } from "./session.js";

/** The four kinds of themes, each with the editor's own theme of that kind and the class its page then carries. */
export const themes = {
  light: { name: "Default Light Modern", mark: "vs" },
  dark: { name: "Default Dark Modern", mark: "vs-dark" },
  "high-contrast": { name: "Default High Contrast", mark: "hc-black" },
  "high-contrast-light": { name: "Default High Contrast Light", mark: "hc-light" },
} as const;

export type ThemeKind = keyof typeof themes;

/** Changes the theme by the setting and waits until the page has it. */
export async function changeTheme(session: Session, kind: ThemeKind): Promise<void> {
  const { name, mark } = themes[kind];
  session.changeSettings({ "workbench.colorTheme": name });
  await session.page.locator(`.monaco-workbench.${mark}`).waitFor({ state: "attached" });
}
