import type { Plot } from "../contract/previewProtocol.js";
import { plotHands } from "./plotHands.js";
import { createPlotView, type PlotView } from "./plotView.js";

interface Drawn {
  /** another one where the strip of residuals came or went */
  view: PlotView;
  /** what is drawn now */
  plot: Plot;
}

/** The plots of the page: drawn in their frames, given new data as they come, ended with their frames. */
export interface Plots {
  show(page: ParentNode, plots: readonly Plot[]): void;
  recolour(): void;
}

export function createPlots(): Plots {
  const drawn = new Map<HTMLElement, Drawn>();
  return {
    show(page, plots) {
      for (const [frame, { view }] of drawn) {
        if (frame.isConnected) continue;
        view.end();
        drawn.delete(frame);
      }
      for (const frame of page.querySelectorAll<HTMLElement>("[data-plot]")) {
        const plot = plots.find(({ id }) => id === frame.dataset["plot"]);
        if (plot === undefined) continue;
        const known = drawn.get(frame);
        if (known === undefined) {
          const begun: Drawn = { view: createPlotView(frame, plot.residuals.length > 0), plot };
          drawn.set(frame, begun);
          plotHands(frame, begun);
          begun.view.show(plot);
          continue;
        }
        if (JSON.stringify(known.plot) === JSON.stringify(plot)) continue;
        known.plot = plot;
        if (known.view.hasStrip !== plot.residuals.length > 0) {
          known.view.end();
          known.view = createPlotView(frame, plot.residuals.length > 0);
        }
        known.view.show(plot);
      }
    },
    recolour() {
      for (const { view } of drawn.values()) view.recolour();
    },
  };
}
