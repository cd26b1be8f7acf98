import { descriptionText } from "../../report/descriptionText.js";
import { diagnosticLine } from "../../report/diagnosticText.js";
import { type ExportKind, exportFiles } from "../../report/exportFiles.js";
import { htmlReport } from "../../report/htmlReport.js";
import { markdownReport } from "../../report/markdownReport.js";
import type { Command, GivenOptions } from "../command.js";
import { describeAll, hasError } from "../describeAll.js";
import { readyFolder, writeFiles } from "../exportFolder.js";
import { findingsJson, findingsOf } from "../findingsJson.js";
import { pageFile, writePage } from "../pageFile.js";

/** What the runs of descriptions say: rates, rate constants, their uncertainty. */
export const report: Command = {
  name: "report",
  summary: "print rates and rate constants with their uncertainty",
  options: {
    json: { words: "print the findings as JSON" },
    curves: { words: "with --json: the readings, fitted curves and residuals too" },
    html: { words: "write the report as one HTML page with pictures, instead of printing it", takes: "FILE" },
    markdown: { words: "print the report as Markdown" },
    svg: { words: "write the picture of each followed signal into a folder", takes: "DIR" },
    csv: { words: "write readings, fitted curves and residuals of each followed signal into a folder", takes: "DIR" },
  },
  example: "ratewright report --html peroxide.html runs/peroxide.raterun",
  async run(paths, options, io) {
    const wanted = options.get("html");
    const page = wanted === undefined ? null : await pageFile(wanted, io);
    if (wanted !== undefined && page === null) return 2;
    const folders = foldersOf(options);
    for (const { folder } of folders) if (!(await readyFolder(folder, io))) return 2;
    const markdown = options.has("markdown");
    const curves = options.has("curves") || markdown || page !== null || folders.length > 0;
    const described = await describeAll(paths, io, curves);
    if (described === null) return 2;
    const descriptions = described.map(({ description }) => description);
    if (page !== null && !(await writePage(page, htmlReport(findingsOf(descriptions)), io))) return 2;
    for (const { kind, folder } of folders) {
      if (!(await writeFiles(folder, kind, exportFiles(kind, descriptions), io))) return 2;
    }
    if (options.has("json")) {
      io.out(findingsJson(descriptions));
      return hasError(described) ? 1 : 0;
    }
    if (markdown) io.out(markdownReport(findingsOf(descriptions)));
    const printed = page === null && !markdown && folders.length === 0;
    for (const description of descriptions) {
      if (printed) io.out(`${descriptionText(description)}\n`);
      else
        for (const diagnostic of description.diagnostics) io.err(`${diagnosticLine(description.path, diagnostic)}\n`);
    }
    if (page !== null) io.out(`${page.shown} holds the report.\n`);
    return hasError(described) ? 1 : 0;
  },
};

/** The folders that options name, with what goes into them. */
function foldersOf(options: GivenOptions): { kind: ExportKind; folder: string }[] {
  return (["svg", "csv"] as const).flatMap((kind) => {
    const folder = options.get(kind);
    return folder === undefined ? [] : [{ kind, folder }];
  });
}
