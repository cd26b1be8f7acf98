import type { Description, Diagnostic, Findings } from "../contract/findings.js";
import { createName, type Name } from "./names.js";
import { recordedRun } from "./recordedRun.js";
import { recordedMechanism, recordedSeries } from "./recordedSeries.js";
import { type RunRecord, recordForm } from "./recordShape.js";

/** Versions that a record states: of the program, of the language, of the way numbers are computed. */
export type Versions = Pick<Findings, "ratewright" | "language" | "method">;

/**
 * What is worth keeping of the findings of a description: no time, no machine, no path but those written in the
 * description, no line numbers, no words of messages, and no more digits of a number than are the same on every
 * machine. A description with errors has a record too: its diagnostics stand in it.
 */
export function recordOf(description: Description, { ratewright, language, method }: Versions): RunRecord {
  const name = createName();
  const { path, meaning, data, diagnostics, runs, series, mechanisms } = description;
  return {
    raterecord: recordForm,
    description: path.slice(path.lastIndexOf("/") + 1),
    ratewright,
    language,
    method,
    data: data.map((file) => ({
      what: name("data file", file.path),
      path: file.path,
      rows: file.rows,
      sha256: file.sha256,
    })),
    diagnostics: recordedDiagnostics(diagnostics, name),
    meaning,
    runs: runs.map((run) => recordedRun(run, name)),
    series: series.map((one) => recordedSeries(one, name)),
    mechanisms: mechanisms.map((one) => recordedMechanism(one, name)),
  };
}

/** Each code once for each item, with how often it stands; in an order that moved lines leave as it is. */
function recordedDiagnostics(diagnostics: readonly Diagnostic[], name: Name): RunRecord["diagnostics"] {
  const counted = new Map<
    string,
    { severity: Diagnostic["severity"]; code: string; item: string | null; times: number }
  >();
  for (const { severity, code, item } of diagnostics) {
    const key = JSON.stringify([item ?? "", code, severity]);
    const before = counted.get(key);
    counted.set(key, { severity, code, item, times: (before?.times ?? 0) + 1 });
  }
  return [...counted]
    .sort(([a], [b]) => (a < b ? -1 : 1))
    .map(([, found]) => ({ what: name(found.item ?? "description", `${found.severity} ${found.code}`), ...found }));
}
