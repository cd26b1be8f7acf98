import { compile, type TopLevelSpec } from "vega-lite";
import { signalPlot } from "./signalPlot.js";

/** The plots of the preview as Vega, ready to take data: with and without the strip of residuals. */
export function plotSpecs(): { readonly withStrip: unknown; readonly withoutStrip: unknown } {
  return { withStrip: compiled(signalPlot(true)), withoutStrip: compiled(signalPlot(false)) };
}

/** Text that begins with $ becomes the signal of that name: Vega-Lite lets titles be plain text only. */
function compiled(spec: unknown): unknown {
  const { spec: vega } = compile(spec as TopLevelSpec);
  const { $schema: _schema, ...bare } = vega;
  return JSON.parse(JSON.stringify(bare), (_, value: unknown) =>
    typeof value === "string" && value.startsWith("$") ? { signal: value.slice(1) } : value,
  );
}
