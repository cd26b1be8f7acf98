import type { PreviewPage } from "../contract/previewProtocol.js";

/** The choice among the runs of a description; none where there is but one. */
export function showRuns(place: HTMLElement, { runs, run }: PreviewPage): void {
  place.hidden = runs.length < 2;
  const choice = place.querySelector("select");
  if (choice === null) return;
  const names = runs.map(({ id, name }) => `${id} ${name}`).join("\n");
  if (choice.dataset["names"] !== names) {
    choice.dataset["names"] = names;
    choice.replaceChildren(...runs.map(({ id, name }) => new Option(`Run ${name}`, id)));
  }
  choice.value = run ?? "";
}
