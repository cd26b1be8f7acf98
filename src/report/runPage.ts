import type { Description } from "../contract/findings.js";
import type { Plot } from "../contract/previewProtocol.js";
import { html, nothing } from "./html.js";
import { provenance } from "./htmlReport.js";
import { plotData } from "./plotData.js";
import { plotFigure } from "./plotFigure.js";
import { runPart } from "./runPart.js";
import { belongsTo, diagnosticList } from "./runWatch.js";

/** The page of one run for a view that draws plots itself: markup, and what is to be drawn in it. */
export interface RunPage {
  readonly markup: string;
  readonly plots: readonly Plot[];
}

/**
 * The page of the run with this id; of none, what is wrong with the description. `file`: URI of the run's data file, null
 * where it may not be opened. The findings should hold curves, or there are no plots.
 */
export function runPage(description: Description, id: string | null, file: string | null): RunPage {
  const { runs, diagnostics } = description;
  const run = runs.find((one) => one.id === id);
  const others = diagnostics.filter((diagnostic) => !runs.some((one) => belongsTo(one, diagnostic)));
  const beside =
    others.length === 0
      ? nothing
      : html`<section><h3>On the description as a whole</h3>${diagnosticList(others)}</section>`;
  if (run === undefined) {
    return {
      markup: html`<section><h3>No run yet</h3><p>This description has no run.</p></section>${beside}`.markup,
      plots: [],
    };
  }
  return {
    markup: html`${runPart(run, description, plotFigure)}${beside}${provenance(description)}`.markup,
    plots: run.follow.flatMap((follow) => plotData(run, follow, file) ?? []),
  };
}
