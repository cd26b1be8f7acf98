import { ColorThemeKind, window } from "vscode";
import type { ThemeKind } from "../contract/editorProtocol.js";

const kinds: Readonly<Record<ColorThemeKind, ThemeKind>> = {
  [ColorThemeKind.Light]: "light",
  [ColorThemeKind.Dark]: "dark",
  [ColorThemeKind.HighContrast]: "highContrast",
  [ColorThemeKind.HighContrastLight]: "highContrastLight",
};

/** The kind of colour theme in use now. */
export function themeKind(): ThemeKind {
  return kinds[window.activeColorTheme.kind];
}
