import type { Run } from "../contract/findings.js";
import { residualTimes } from "./pictureContent.js";

type Follow = Run["follow"][number];

/**
 * Readings, fitted curves with their 95 % bands, and residuals of a follow line as one comma-separated table, one value a
 * line, all readings and full digits. Null where the findings hold no curves.
 */
export function curvesCsv(run: Run, follow: Follow): string | null {
  const { time, signal, lines, leftOut } = follow;
  if (time === undefined || signal === undefined) return null;
  const rows: Row[] = [];
  for (const [index, t] of time.values.entries())
    rows.push(["reading", t, signal.values[index], null, null, lines?.[index]]);
  for (const [index, t] of (leftOut?.time.values ?? []).entries()) {
    rows.push(["left out", t, leftOut?.signal.values[index], null, null, leftOut?.lines[index]]);
  }
  for (const [number, fit] of run.fits.entries()) {
    if (fit.follow !== follow.id) continue;
    const { curve, residuals } = fit;
    for (const [index, t] of (curve?.time.values ?? []).entries()) {
      const [low, high] = [curve?.low.values[index], curve?.high.values[index]];
      rows.push([`fit ${number + 1}`, t, curve?.signal.values[index], low, high, null]);
    }
    for (const [index, t] of residualTimes(follow, fit).entries()) {
      rows.push([`residual of fit ${number + 1}`, t, residuals?.values[index], null, null, null]);
    }
  }
  const unit = signal.unit === "" ? "" : ` / ${signal.unit}`;
  const head = [
    "what",
    `t / ${time.unit}`,
    `${follow.column}${unit}`,
    `low${unit}`,
    `high${unit}`,
    "line of the data file",
  ];
  return [head.map(cell).join(","), ...rows.map((row) => row.map(cell).join(",")), ""].join("\n");
}

type Row = readonly (string | number | null | undefined)[];

/** RFC 4180: quotes where a comma, a quote or a line break stands in it. */
function cell(value: string | number | null | undefined): string {
  const text = value === null || value === undefined ? "" : String(value);
  return /[",\r\n]/.test(text) ? `"${text.replaceAll('"', '""')}"` : text;
}
