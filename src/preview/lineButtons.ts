/** Makes the margin's line numbers buttons, and lets a click anywhere in a table's row count as one on its line. */
export function lineButtons(page: ParentNode): void {
  for (const span of page.querySelectorAll<HTMLElement>("span.line[data-line]")) {
    const button = document.createElement("button");
    button.type = "button";
    button.className = "line";
    button.dataset["line"] = span.dataset["line"] ?? "";
    button.textContent = span.textContent;
    button.title = "Go to this line of the description";
    span.replaceWith(button);
    button.closest("tr")?.classList.add("leads");
  }
}

/** The line that a click on this element leads to, from 1; null where it leads nowhere. */
export function lineAt(target: EventTarget | null): number | null {
  if (!(target instanceof Element)) return null;
  const button = target.closest("[data-line]") ?? target.closest("tr.leads")?.querySelector("[data-line]");
  const line = Number(button?.getAttribute("data-line"));
  return Number.isInteger(line) && line > 0 ? line : null;
}

/** Marks what came from the line of the cursor. */
export function markLine(page: ParentNode, line: number): void {
  for (const button of page.querySelectorAll("button.line")) {
    const here = button.getAttribute("data-line") === String(line);
    if (here) button.setAttribute("aria-current", "true");
    else button.removeAttribute("aria-current");
  }
}
