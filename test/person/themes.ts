/** The kinds of themes; to each the editor's own theme of that kind and the class the page has when it is loaded. */
export const themes = {
  light: { name: "Default Light Modern", mark: "vscode-theme-defaults-themes-light_modern-json" },
  dark: { name: "Default Dark Modern", mark: "vscode-theme-defaults-themes-dark_modern-json" },
  "high-contrast": { name: "Default High Contrast", mark: "vscode-theme-defaults-themes-hc_black-json" },
  "high-contrast-light": { name: "Default High Contrast Light", mark: "vscode-theme-defaults-themes-hc_light-json" },
} as const;

export type ThemeKind = keyof typeof themes;
