import { parse, View } from "vega";
import { expressionInterpreter } from "vega-interpreter";
import type { Plot, PlotReading } from "../contract/previewProtocol.js";
import { plotColours } from "./plotColours.js";
import type { PlotPlaces } from "./plotPlaces.js";

/** A drawn plot that takes new data without being drawn anew from nothing. */
export interface PlotView {
  readonly hasStrip: boolean;
  show(plot: Plot): void;
  /** Rings a reading; null: none. */
  choose(reading: PlotReading | null): void;
  recolour(): void;
  places(): PlotPlaces;
  end(): void;
}

/** The parts of a linear scale that are used here. */
interface LinearScale {
  (value: number): number;
  invert(place: number): number;
  domain(): number[];
  range(): number[];
}

/** Draws in the element, as wide as it is. Expressions are walked as trees: no code is made of text. */
export function createPlotView(frame: HTMLElement, hasStrip: boolean): PlotView {
  const canvas = document.createElement("div");
  canvas.className = "canvas";
  // What it shows stands in words in its frame's label.
  canvas.setAttribute("aria-hidden", "true");
  frame.append(canvas);
  const spec = hasStrip ? plotSpecs.withStrip : plotSpecs.withoutStrip;
  const view = new View(parse(spec, undefined, { ast: true }), {
    expr: expressionInterpreter,
    renderer: "canvas",
    container: canvas,
    hover: false,
  });
  let finalized = false;
  const draw = (): void => {
    if (!finalized) void view.runAsync();
  };
  const recolour = (): void => {
    for (const [name, value] of Object.entries(plotColours())) view.signal(name, value);
    draw();
  };
  const fillWidth = (): void => {
    const room = frame.clientWidth;
    if (room === 0) return;
    // Axis and padding take their part; what they take is known only once drawn.
    const beside = Math.max(40, view.origin()[0] + 12);
    view.width(Math.max(120, room - beside));
    draw();
  };
  const sizes = new ResizeObserver(fillWidth);
  sizes.observe(frame);
  recolour();

  const scale = (name: string): LinearScale => view.scale(name) as LinearScale;
  return {
    hasStrip,
    show(plot) {
      view.signal("residualTitle", plot.residualTitle);
      if (hasStrip) view.signal("residualSize", plot.residuals.length > 300 ? 3 : 14);
      view.signal("pointSize", plot.readings.length > 300 ? 8 : plot.readings.length > 80 ? 14 : 26);
      view.data(
        "readings",
        plot.readings.map((one) => ({ ...one })),
      );
      view.data(
        "curves",
        plot.curves.map((one) => ({ ...one })),
      );
      view.data(
        "marks",
        plot.marks.map((one) => ({ ...one })),
      );
      view.data(
        "touches",
        plot.marks.flatMap(({ at }) => (at === null ? [] : [{ ...at }])),
      );
      view.data(
        "numbers",
        plot.marks.map(({ number, label }) => ({ ...number, label })),
      );
      if (hasStrip)
        view.data(
          "residuals",
          plot.residuals.map((one) => ({ ...one })),
        );
      view.data("chosen", []);
      if (!finalized) void view.runAsync().then(fillWidth);
    },
    choose(reading) {
      view.data("chosen", reading === null ? [] : [{ t: reading.t, y: reading.y }]);
      draw();
    },
    recolour,
    places() {
      const [left, top] = view.origin();
      const across = scale("x");
      const up = scale(hasStrip ? "concat_0_y" : "y");
      const [from = 0, to = 0] = across.range();
      const [low = 0, high = 0] = across.domain();
      return {
        left: left + Math.min(from, to),
        right: left + Math.max(from, to),
        top,
        bottom: top + Math.max(...up.range()),
        x: (t) => left + across(t),
        y: (signal) => top + up(signal),
        time: (x) => Math.min(high, Math.max(low, across.invert(x - left))),
      };
    },
    end() {
      finalized = true;
      sizes.disconnect();
      view.finalize();
      canvas.remove();
    },
  };
}
