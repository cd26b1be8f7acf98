import { descriptionText } from "../../report/descriptionText.js";
import { diagnosticLine } from "../../report/diagnosticText.js";
import { htmlReport } from "../../report/htmlReport.js";
import type { Command } from "../command.js";
import { describeAll, hasError } from "../describeAll.js";
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
  },
  example: "ratewright report --html peroxide.html runs/peroxide.raterun",
  async run(paths, options, io) {
    const wanted = options.get("html");
    const page = wanted === undefined ? null : await pageFile(wanted, io);
    if (wanted !== undefined && page === null) return 2;
    const described = await describeAll(paths, io, options.has("curves") || page !== null);
    if (described === null) return 2;
    const descriptions = described.map(({ description }) => description);
    if (page !== null && !(await writePage(page, htmlReport(findingsOf(descriptions)), io))) return 2;
    if (options.has("json")) {
      io.out(findingsJson(descriptions));
      return hasError(described) ? 1 : 0;
    }
    for (const description of descriptions) {
      if (page === null) io.out(`${descriptionText(description)}\n`);
      else
        for (const diagnostic of description.diagnostics) io.err(`${diagnosticLine(description.path, diagnostic)}\n`);
    }
    if (page !== null) io.out(`${page.shown} holds the report.\n`);
    return hasError(described) ? 1 : 0;
  },
};
