import type { Session } from "./session.js";

/** One row of the panel of problems. */
export interface ShownProblem {
  severity: "error" | "warning" | "information";
  /** The row as it reads on screen, in one line: message, source, code, place. */
  text: string;
}

/** The rows of the panel of problems as they stand now, opening the panel if it is closed. */
export async function shownProblems({ page }: Session): Promise<ShownProblem[]> {
  const panel = page.locator(".markers-panel");
  if (!(await panel.isVisible())) {
    await page.keyboard.press("Control+Shift+m");
    await panel.waitFor();
  }
  return panel.locator(".monaco-list-row").evaluateAll((rows) => {
    return rows.flatMap((row) => {
      const icon = row.querySelector(".codicon-error, .codicon-warning, .codicon-info");
      if (icon === null || row.querySelector(".resource-label-container, .monaco-icon-label-container")) return [];
      const severity = icon.classList.contains("codicon-error")
        ? ("error" as const)
        : icon.classList.contains("codicon-warning")
          ? ("warning" as const)
          : ("information" as const);
      const text = (row.textContent ?? "").replace(/\s+/g, " ").trim();
      return [{ severity, text }];
    });
  });
}

/** Number of squiggles on screen in the active editor, by severity. */
export async function squiggles({ page }: Session): Promise<{ error: number; warning: number; information: number }> {
  const editor = page.locator(".editor-group-container.active .monaco-editor");
  const count = (name: string) => editor.locator(`.${name}`).count();
  return {
    error: await count("squiggly-error"),
    warning: await count("squiggly-warning"),
    information: await count("squiggly-info"),
  };
}
