// What runs in the page of the preview: dist/preview.js. It computes nothing; it shows what it is sent and says what was
// done with it.
import type { ExportFormat, PreviewPage, ToPage } from "../contract/previewProtocol.js";
import { drawPng } from "./drawPng.js";
import { editor } from "./editor.js";
import { createFolds } from "./folds.js";
import { lineAt, lineButtons, markLine } from "./lineButtons.js";
import { morph } from "./morph.js";
import { onThemeChange } from "./plotColours.js";
import { createPlots } from "./plots.js";
import { showRuns } from "./runChoice.js";

document.addEventListener("securitypolicyviolation", ({ violatedDirective, blockedURI }) => {
  document.body.dataset["violations"] = `${document.body.dataset["violations"] ?? ""} ${violatedDirective}`;
  editor.postMessage({ kind: "violation", words: `${violatedDirective} ${blockedURI}` });
});

const before = editor.getState();
const page = element("page");
const plots = createPlots();
let shown: PreviewPage | null = null;
let cursor = 0;
let toScroll = before?.scroll ?? null;

const folds = createFolds(page, before?.folds ?? {}, keep);

function element(id: string): HTMLElement {
  const found = document.getElementById(id);
  if (found === null) throw new Error(`the page lacks #${id}`);
  return found;
}

function keep(): void {
  if (shown === null) return;
  editor.setState({ uri: shown.uri, run: shown.run, folds: folds.known(), scroll: window.scrollY });
}

function show(next: PreviewPage, name: string): void {
  const other = shown !== null && (shown.run !== next.run || shown.uri !== next.uri);
  const parsed = new DOMParser().parseFromString(next.markup, "text/html").body;
  lineButtons(parsed);
  morph(page, parsed);
  folds.apply(page);
  showRuns(element("runs"), next);
  element("name").textContent = name;
  plots.show(page, next.plots);
  shown = next;
  markLine(page, cursor);
  document.body.classList.add("filled");
  if (toScroll !== null) window.scrollTo(0, toScroll);
  else if (other) window.scrollTo(0, 0);
  toScroll = null;
  keep();
}

/** Time that what was done stays to be read, ms. */
const readingTime = 12_000;
let saying: ReturnType<typeof setTimeout> | undefined;

function say(words: string): void {
  element("said").textContent = words;
  clearTimeout(saying);
  saying = setTimeout(() => {
    element("said").textContent = "";
  }, readingTime);
}

async function take(message: ToPage): Promise<void> {
  switch (message.kind) {
    case "show":
      show(message.page, message.name);
      break;
    case "sign":
      element("sign").textContent = message.words;
      break;
    case "say":
      say(message.words);
      break;
    case "cursor":
      cursor = message.line;
      markLine(page, cursor);
      break;
    case "draw png":
      editor.postMessage({ kind: "png drawn", name: message.name, base64: await drawPng(message.svg) });
      break;
  }
}

window.addEventListener("message", ({ data }: MessageEvent<ToPage>) => void take(data));
page.addEventListener("click", ({ target }) => {
  // Words that were just selected are to be copied, not to lead away.
  if (target instanceof Element && target.closest("button") === null && window.getSelection()?.isCollapsed === false) {
    return;
  }
  const line = lineAt(target);
  if (line !== null) editor.postMessage({ kind: "go to line", line });
});
element("exports").addEventListener("click", ({ target }) => {
  const format = target instanceof Element ? target.closest("button")?.dataset["format"] : undefined;
  if (format !== undefined) editor.postMessage({ kind: "export", format: format as ExportFormat });
});
element("runs").addEventListener("change", ({ target }) => {
  if (target instanceof HTMLSelectElement) editor.postMessage({ kind: "choose run", run: target.value });
});
let resting: ReturnType<typeof setTimeout> | undefined;
window.addEventListener("scroll", () => {
  clearTimeout(resting);
  resting = setTimeout(keep, 150);
});
onThemeChange(() => plots.recolour());
editor.postMessage({ kind: "ready" });
