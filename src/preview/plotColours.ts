/** Signals of a plot with the names of the style sheet's properties they follow. */
const properties = {
  ink: "--ink",
  faint: "--faint",
  curve1: "--curve-1",
  curve2: "--curve-2",
  curve3: "--curve-3",
  mark: "--mark",
  focus: "--focus",
} as const;

/** The colours of the editor's theme, as the style sheet has them now. */
export function plotColours(): Readonly<Record<string, string | number>> {
  const style = getComputedStyle(document.body);
  const colours = Object.entries(properties).map(([signal, property]) => [
    signal,
    style.getPropertyValue(property).trim() || "currentcolor",
  ]);
  const contrast = document.body.classList.contains("vscode-high-contrast");
  return { ...Object.fromEntries(colours), font: style.fontFamily, band: contrast ? 0.32 : 0.18 };
}

/** Calls back whenever the theme changed: the editor then writes its colours anew. */
export function onThemeChange(listener: () => void): void {
  const observer = new MutationObserver(listener);
  observer.observe(document.body, { attributes: true, attributeFilter: ["class"] });
  observer.observe(document.documentElement, { attributes: true, attributeFilter: ["style"] });
}
