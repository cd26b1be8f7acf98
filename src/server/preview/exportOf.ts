import { method } from "../../analysis/analyse.js";
import type { Description, Findings } from "../../contract/findings.js";
import type { ExportAnswer, ExportQuestion } from "../../contract/previewProtocol.js";
import { version } from "../../contract/version.js";
import { exportFiles } from "../../report/exportFiles.js";
import { fileName } from "../../report/fileName.js";
import { htmlReport } from "../../report/htmlReport.js";
import { markdownReport } from "../../report/markdownReport.js";

/** A run's pictures or curves, or the report of its description, as files. */
export function exportOf(description: Description, { run: id, format }: ExportQuestion): ExportAnswer {
  const findings: Findings = { ratewright: version, language: 1, method, descriptions: [description] };
  const name = fileName(description.path);
  if (format === "html") return [{ name: `${name}.html`, text: htmlReport(findings) }];
  if (format === "markdown") return [{ name: `${name}.md`, text: markdownReport(findings) }];
  const files = exportFiles(format, [description], (run) => run.id === id);
  return files.length === 0 ? null : files;
}
