import { countWords, diagnosticLine, diagnosticText } from "../../report/diagnosticText.js";
import type { Command } from "../command.js";
import { describeAll, hasError } from "../describeAll.js";
import { findingsJson } from "../findingsJson.js";

/** What is wrong with descriptions and with the data files they name. */
export const check: Command = {
  name: "check",
  summary: "say what is wrong with descriptions and their data files",
  options: {
    json: { words: "print the findings as JSON, without runs" },
    lines: { words: "print one line each: file:line:column: severity: message [code]" },
  },
  example: "ratewright check runs/peroxide.raterun",
  async run(paths, options, io) {
    const described = await describeAll(paths, io, false);
    if (described === null) return 2;
    if (options.has("json")) {
      const bare = described.map(({ description }) => ({ ...description, runs: [], series: [], mechanisms: [] }));
      io.out(findingsJson(bare));
    } else {
      for (const { description, text } of described) {
        const lines = text.split(/\r\n|\n|\r/);
        for (const diagnostic of description.diagnostics) {
          const { path } = description;
          const words = options.has("lines")
            ? diagnosticLine(path, diagnostic)
            : diagnosticText(path, diagnostic, lines);
          io.out(`${words}\n${options.has("lines") ? "" : "\n"}`);
        }
      }
      if (!options.has("lines")) {
        const all = described.flatMap(({ description }) => description.diagnostics);
        const count = described.length === 1 ? "1 description" : `${described.length} descriptions`;
        io.out(`${count}: ${countWords(all)}\n`);
      }
    }
    return hasError(described) ? 1 : 0;
  },
};
