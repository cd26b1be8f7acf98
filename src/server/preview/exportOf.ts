import { method } from "../../analysis/analyse.js";
import type { Description, Findings } from "../../contract/findings.js";
import type { ExportAnswer, ExportQuestion } from "../../contract/previewProtocol.js";
import { version } from "../../contract/version.js";
import { curvesCsv } from "../../report/curvesCsv.js";
import { fileName } from "../../report/fileName.js";
import { htmlReport } from "../../report/htmlReport.js";
import { markdownReport } from "../../report/markdownReport.js";
import { standalonePicture } from "../../report/standalonePicture.js";

/** A run's pictures or curves, or the report of its description, as files. */
export function exportOf(description: Description, { run: id, format }: ExportQuestion): ExportAnswer {
  const findings: Findings = { ratewright: version, language: 1, method, descriptions: [description] };
  const name = fileName(description.path);
  if (format === "html") return [{ name: `${name}.html`, text: htmlReport(findings) }];
  if (format === "markdown") return [{ name: `${name}.md`, text: markdownReport(findings) }];
  const run = description.runs.find((one) => one.id === id);
  if (run === undefined) return null;
  const files = run.follow.flatMap((follow) => {
    const text = format === "svg" ? standalonePicture(run, follow) : curvesCsv(run, follow);
    const column = run.follow.length > 1 ? `-${follow.column}` : "";
    return text === null ? [] : [{ name: fileName(`${name}-${run.name}${column}.${format}`), text }];
  });
  return files.length === 0 ? null : files;
}
