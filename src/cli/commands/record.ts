import { resolve } from "node:path";
import { fileUri } from "../../host/node/fileUri.js";
import { writeText } from "../../host/node/writeText.js";
import { countWords } from "../../report/diagnosticText.js";
import { reasonToKeep, recordBeside, recordNow } from "../../workspace/verify.js";
import type { Command } from "../command.js";
import { type Described, describeAll, hasError } from "../describeAll.js";
import type { Io } from "../io.js";
import { readRecordFile, recordRefusals } from "../recordFile.js";

/** What became of one record; "failed" is said already. */
type Outcome = "written" | "as it was" | "failed";

/**
 * Writes the record of each description beside it. One with errors has a record too, which holds them: status 1 then.
 * What is no record, or one of a later form, is not written over: status 2.
 */
export const record: Command = {
  name: "record",
  summary: "write the record of descriptions beside them, NAME.raterecord",
  options: {},
  example: "ratewright record runs/peroxide.raterun",
  async run(paths, _options, io) {
    const described = await describeAll(paths, io, false);
    if (described === null) return 2;
    const outcomes: Outcome[] = [];
    for (const one of described) outcomes.push(await recordOne(one, io));
    const written = outcomes.filter((outcome) => outcome === "written").length;
    const count = described.length === 1 ? "1 description" : `${described.length} descriptions`;
    io.out(
      `${count}: ${written === 0 ? "nothing to write" : `${written} ${written === 1 ? "record" : "records"} written`}\n`,
    );
    if (outcomes.includes("failed")) return 2;
    return hasError(described) ? 1 : 0;
  },
};

async function recordOne({ description }: Described, io: Io): Promise<Outcome> {
  const shown = recordBeside(description.path);
  const path = resolve(io.cwd, shown);
  const text = recordNow(description);
  const before = await readRecordFile(fileUri(path));
  const keep = before === "unreadable" ? "it cannot be read." : before.text === null ? null : reasonToKeep(before.text);
  if (keep !== null) return failed(`${shown}: ${keep} It is left as it is.`, io);
  const errors = description.diagnostics.filter(({ severity }) => severity === "error");
  if (errors.length > 0) io.err(`${description.path}: ${countWords(errors)}; its record holds them.\n`);
  if (before !== "unreadable" && before.text === text) return "as it was";
  const refusal = await writeText(path, text);
  if (refusal !== null) return failed(`${shown}: ${recordRefusals[refusal]}.`, io);
  io.out(`${shown} is written.\n`);
  return "written";
}

function failed(words: string, io: Io): Outcome {
  io.err(`ratewright: ${words}\n`);
  return "failed";
}
