import type { Plot, PlotReading } from "../contract/previewProtocol.js";
import { editor } from "./editor.js";
import { type PlotPlaces, readingNear } from "./plotPlaces.js";
import type { PlotView } from "./plotView.js";

/** Way of the pointer from which on pressing and moving is dragging, px. */
const dragFrom = 5;

/** What a hand can do with a plot: rest on a reading, open its row, step along by keys, drag over a span of time. */
export function plotHands(frame: HTMLElement, drawn: { readonly view: PlotView; readonly plot: Plot }): void {
  const span = document.createElement("div");
  span.className = "span";
  span.hidden = true;
  frame.append(span);
  let pressed: number | null = null;
  let chosen = -1;

  const placeOf = (event: MouseEvent): [number, number] => {
    const box = frame.getBoundingClientRect();
    return [event.clientX - box.left, event.clientY - box.top];
  };
  const say = (reading: PlotReading | null): void => {
    const line = frame.parentElement?.querySelector("[data-reading]");
    if (line !== null && line !== undefined) line.textContent = reading === null ? "" : reading.words;
  };
  const open = (reading: PlotReading | null | undefined): void => {
    const { file } = drawn.plot;
    if (reading?.line === undefined || reading.line === null || file === null) return;
    editor.postMessage({ kind: "open reading", file, line: reading.line });
  };
  const inside = ({ left, right, top, bottom }: PlotPlaces, [x, y]: readonly [number, number]): boolean =>
    x >= left - 8 && x <= right + 8 && y >= top - 8 && y <= bottom + 8;

  frame.addEventListener("pointerdown", (event) => {
    const place = placeOf(event);
    if (event.button !== 0 || !inside(drawn.view.places(), place)) return;
    pressed = place[0];
    frame.setPointerCapture(event.pointerId);
  });
  frame.addEventListener("pointermove", (event) => {
    const place = placeOf(event);
    const places = drawn.view.places();
    if (pressed === null) {
      const near = readingNear(drawn.plot.readings, places, place);
      frame.classList.toggle("points", near !== null && drawn.plot.file !== null);
      drawn.view.choose(near);
      say(near);
      return;
    }
    if (span.hidden && Math.abs(place[0] - pressed) < dragFrom) return;
    if (drawn.plot.fits.length === 0) return;
    const ends = [pressed, place[0]].map((x) => Math.min(places.right, Math.max(places.left, x)));
    span.hidden = false;
    span.style.left = `${Math.min(...ends)}px`;
    span.style.width = `${Math.max(...ends) - Math.min(...ends)}px`;
    span.style.top = `${places.top}px`;
    span.style.height = `${places.bottom - places.top}px`;
    fillWindow(
      frame,
      drawn.plot,
      ends.map((x) => places.time(x)),
    );
  });
  frame.addEventListener("pointerup", (event) => {
    if (pressed === null) return;
    pressed = null;
    if (span.hidden) {
      open(readingNear(drawn.plot.readings, drawn.view.places(), placeOf(event)));
      return;
    }
    windowForm(frame)?.querySelector("button")?.focus({ preventScroll: true });
  });
  frame.addEventListener("pointercancel", () => {
    pressed = null;
    span.hidden = true;
  });
  frame.addEventListener("pointerleave", () => {
    if (pressed === null && chosen < 0) drawn.view.choose(null);
  });
  frame.addEventListener("keydown", (event) => {
    const readings = [...drawn.plot.readings].sort((a, b) => a.t - b.t);
    const step = { ArrowRight: 1, ArrowLeft: -1, Home: -readings.length, End: readings.length }[event.key];
    if (step !== undefined) {
      chosen = Math.min(readings.length - 1, Math.max(0, chosen + step));
      const reading = readings[chosen] ?? null;
      drawn.view.choose(reading);
      say(reading);
      event.preventDefault();
    } else if (event.key === "Enter") {
      open(readings[chosen]);
      event.preventDefault();
    } else if (event.key === "Escape") {
      chosen = -1;
      span.hidden = true;
      drawn.view.choose(null);
      say(null);
    }
  });
  frame.addEventListener("blur", () => {
    chosen = -1;
  });
  // Heard on the figure: the form comes and goes with the fits.
  frame.parentElement?.addEventListener("submit", (event) => {
    event.preventDefault();
    const form = event.target;
    if (!(form instanceof HTMLFormElement)) return;
    const [from, to] = ["from", "to"].map((name) => {
      const text = form.querySelector<HTMLInputElement>(`input[name=${name}]`)?.value.trim() ?? "";
      return text === "" ? Number.NaN : Number(text.replace(",", ".").replace("\u2212", "-"));
    });
    if (from === undefined || to === undefined || !(from < to)) {
      const line = frame.parentElement?.querySelector("[data-reading]");
      if (line) line.textContent = "A window needs two times, the first before the last.";
      return;
    }
    span.hidden = true;
    say(null);
    editor.postMessage({ kind: "write window", plot: drawn.plot.id, from, to });
  });
}

function windowForm(frame: HTMLElement): HTMLFormElement | null {
  return frame.parentElement?.querySelector<HTMLFormElement>("form.window") ?? null;
}

/** Puts the span into the two fields, to a hundredth of its own length: finer than a hand drags. */
function fillWindow(frame: HTMLElement, { timeFactor }: Plot, times: readonly number[]): void {
  const [from, to] = [Math.min(...times), Math.max(...times)].map((t) => t * timeFactor) as [number, number];
  const decimals = Math.max(0, Math.min(12, 2 - Math.floor(Math.log10(Math.max(to - from, 1e-12)))));
  for (const [name, time] of [
    ["from", from],
    ["to", to],
  ] as const) {
    const field = windowForm(frame)?.querySelector<HTMLInputElement>(`input[name=${name}]`);
    if (field) field.value = String(Number(time.toFixed(decimals)));
  }
}
