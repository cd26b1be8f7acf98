import { descriptionText } from "../../report/descriptionText.js";
import { diagnosticLine } from "../../report/diagnosticText.js";
import type { Command } from "../command.js";
import { describeAll, hasError } from "../describeAll.js";
import { findingsJson } from "../findingsJson.js";

/** What the runs of descriptions say: rates, rate constants, their uncertainty. */
export const report: Command = {
  name: "report",
  summary: "print rates and rate constants with their uncertainty",
  options: {
    json: "print the findings as JSON",
    curves: "with --json: the readings, fitted curves and residuals too",
  },
  example: "ratewright report --json runs/peroxide.raterun",
  async run(paths, options, io) {
    const described = await describeAll(paths, io, options.has("curves"));
    if (described === null) return 2;
    if (options.has("json")) {
      io.out(findingsJson(described.map(({ description }) => description)));
    } else {
      for (const { description } of described) {
        io.out(`${descriptionText(description)}\n`);
        for (const diagnostic of description.diagnostics) io.err(`${diagnosticLine(description.path, diagnostic)}\n`);
      }
    }
    return hasError(described) ? 1 : 0;
  },
};
