/** Heights of the picture and of the strip of residuals below it, px. */
const heights = { signal: 300, strip: 72 };

/** Shades and dashes of the first, second, third … fitted curve; shades are parameters that the page sets from its theme. */
const curveShades = [{ expr: "curve1" }, { expr: "curve2" }, { expr: "curve3" }];
const dashes = [
  [1, 0],
  [7, 4],
  [2, 3],
  [10, 3, 2, 3],
];

const byOrder = <T>(values: readonly T[], rest: T) => ({
  condition: values
    .slice(1)
    .map((value, index) => ({ test: `datum.order % ${values.length} === ${index + 1}`, value })),
  value: values[0] ?? rest,
});

/** A shade by the order of the curve. */
const shade = {
  condition: curveShades.slice(1).map(({ expr }, index) => ({
    test: `datum.order % ${curveShades.length} === ${index + 1}`,
    value: { expr },
  })),
  value: { expr: "curve1" },
};

const time = { field: "t", type: "quantitative" } as const;

/** One followed signal: readings, fitted curves with bands, chords and tangents; residuals under the same time axis. */
export function signalPlot(strip: boolean): unknown {
  const axis = {
    title: null,
    domain: false,
    grid: false,
    labelColor: { expr: "ink" },
    tickColor: { expr: "faint" },
    labelFontSize: 11,
    labelFont: { expr: "font" },
    labelOverlap: true,
    format: "f",
  };
  const scaleX = { zero: false, nice: false, padding: 12 };
  const x = (labels: boolean) => ({ ...time, scale: scaleX, axis: labels ? { ...axis, tickCount: 8 } : null });
  const y = {
    field: "y",
    type: "quantitative",
    scale: { zero: false, nice: false, padding: 10 },
    axis: { ...axis, tickCount: 6 },
  };
  const point = (kinds: string, mark: object) => ({
    data: { name: "readings" },
    transform: [{ filter: `indexof(${kinds}, datum.kind) >= 0` }],
    mark: { type: "point", size: { expr: "pointSize" }, opacity: 1, ...mark },
    encoding: { x: x(!strip), y },
  });
  /** Many readings, each stretch of time from its lowest to its highest. */
  const ribbon = (kind: string, opacity: number) => ({
    data: { name: "readings" },
    transform: [{ filter: `datum.kind === '${kind}'` }],
    mark: { type: "line", strokeWidth: 2, strokeJoin: "round", strokeCap: "round", opacity, color: { expr: "ink" } },
    encoding: { x: x(!strip), y, detail: { field: "piece" }, order: { field: "t" } },
  });
  const signal = {
    width: 400,
    height: heights.signal,
    view: { stroke: null },
    layer: [
      ribbon("outline", 0.45),
      ribbon("outline outside", 0.2),
      {
        data: { name: "curves" },
        mark: { type: "area", opacity: { expr: "band" }, clip: true },
        encoding: {
          x: x(!strip),
          y: { ...y, field: "low", scale: { ...y.scale } },
          y2: { field: "high" },
          detail: { field: "order" },
          color: shade,
        },
      },
      {
        data: { name: "curves" },
        mark: { type: "line", strokeWidth: 1.8, clip: true },
        encoding: { x: x(!strip), y, detail: { field: "order" }, color: shade, strokeDash: byOrder(dashes, [1, 0]) },
      },
      point("['used']", { filled: true, color: { expr: "ink" } }),
      point("['outside']", { filled: false, stroke: { expr: "ink" }, strokeWidth: 1.2 }),
      point("['left out']", { filled: false, stroke: { expr: "ink" }, strokeWidth: 1.2 }),
      point("['left out']", {
        shape: "M-.7-.7L.7.7M.7-.7L-.7.7",
        stroke: { expr: "ink" },
        strokeWidth: 1.2,
        filled: false,
      }),
      {
        data: { name: "marks" },
        mark: { type: "rule", clip: true, strokeWidth: 1.4, color: { expr: "mark" } },
        encoding: {
          x: x(!strip),
          y,
          x2: { field: "t2" },
          y2: { field: "y2" },
          strokeDash: { condition: { test: "datum.kind === 'chord'", value: [5, 3] }, value: [1, 0] },
        },
      },
      {
        data: { name: "touches" },
        mark: { type: "point", shape: "diamond", filled: true, size: 60, color: { expr: "mark" }, opacity: 1 },
        encoding: { x: x(!strip), y },
      },
      {
        data: { name: "numbers" },
        mark: {
          type: "text",
          dx: { expr: "datum.dx" },
          dy: { expr: "datum.dy" },
          fontSize: 11,
          font: { expr: "font" },
          color: { expr: "mark" },
        },
        encoding: { x: x(!strip), y, text: { field: "label" } },
      },
      {
        data: { name: "chosen" },
        mark: {
          type: "point",
          shape: "circle",
          filled: false,
          size: 160,
          strokeWidth: 2,
          stroke: { expr: "focus" },
          opacity: 1,
        },
        encoding: { x: x(!strip), y },
      },
    ],
  };
  const r = {
    field: "r",
    type: "quantitative",
    scale: { zero: true, nice: false, padding: 6 },
    axis: { ...axis, tickCount: 3 },
  };
  const residuals = {
    width: 400,
    height: heights.strip,
    view: { stroke: null },
    title: {
      text: "$residualTitle",
      anchor: "start",
      fontSize: 11,
      fontWeight: "normal",
      offset: 4,
      color: { expr: "ink" },
      font: { expr: "font" },
    },
    layer: [
      {
        data: { values: [{ zero: 0 }] },
        mark: { type: "rule", color: { expr: "faint" }, opacity: 0.6 },
        encoding: { y: { ...r, field: "zero" } },
      },
      {
        data: { name: "residuals" },
        mark: { type: "rule", opacity: 0.55 },
        encoding: { x: x(true), y: r, y2: { datum: 0 }, color: shade },
      },
      {
        data: { name: "residuals" },
        mark: { type: "point", filled: true, size: { expr: "residualSize" }, opacity: 1 },
        encoding: {
          x: x(true),
          y: r,
          color: shade,
          shape: byOrder(["circle", "square", "triangle-up"], "circle"),
        },
      },
    ],
  };
  return {
    $schema: "https://vega.github.io/schema/vega-lite/v6.json",
    config: { aria: false },
    background: "transparent",
    padding: { left: 2, right: 8, top: 6, bottom: 2 },
    params: [
      { name: "ink", value: "black" },
      { name: "faint", value: "black" },
      { name: "curve1", value: "black" },
      { name: "curve2", value: "black" },
      { name: "curve3", value: "black" },
      { name: "mark", value: "black" },
      { name: "focus", value: "black" },
      { name: "font", value: "sans-serif" },
      { name: "band", value: 0.17 },
      { name: "pointSize", value: 24 },
      { name: "residualSize", value: 14 },
      { name: "residualTitle", value: "" },
    ],
    ...(strip ? { vconcat: [signal, residuals], spacing: 14, resolve: { scale: { x: "shared" } } } : signal),
  };
}
