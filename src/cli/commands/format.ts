import { messageOf } from "../../contract/words.js";
import { expandPaths, type FoundDescription } from "../../host/node/expandPaths.js";
import { nodeReader } from "../../host/node/nodeReader.js";
import { writeText } from "../../host/node/writeText.js";
import { type FormatOptions, formatText } from "../../language/format/formatText.js";
import type { Command } from "../command.js";
import { sayUnused, textLimit } from "../describeAll.js";
import type { Io } from "../io.js";

/** What became of one description; "failed" is said already. */
type Outcome = "as it was" | "changed" | "refused" | "failed";

/** Sets descriptions in the one layout of the language. */
export const format: Command = {
  name: "format",
  summary: "set descriptions in the one layout of the language",
  options: {
    check: { words: "change nothing, name the descriptions that would change; status 1 where there are any" },
    ascii: { words: "write -> +/- degC uL ^-1, instead of the signs → ± °C µL ⁻¹" },
  },
  example: "ratewright format --check runs",
  async run(paths, options, io) {
    const { found, unused } = await expandPaths(paths, io.cwd);
    if (sayUnused(unused, io)) return 2;
    const check = options.has("check");
    const notation = options.has("ascii") ? "ascii" : "unicode";
    const outcomes: Outcome[] = [];
    for (const description of found) outcomes.push(await formatOne(description, { notation }, check, io));
    const changed = outcomes.filter((outcome) => outcome === "changed").length;
    const count = found.length === 1 ? "1 description" : `${found.length} descriptions`;
    const words = changed === 0 ? "nothing to change" : `${changed} ${check ? "would change" : "changed"}`;
    io.out(`${count}: ${words}\n`);
    if (outcomes.includes("failed")) return 2;
    return outcomes.includes("refused") || (check && changed > 0) ? 1 : 0;
  },
};

async function formatOne(
  { uri, path, shown }: FoundDescription,
  options: FormatOptions,
  check: boolean,
  io: Io,
): Promise<Outcome> {
  const text = await readText(uri);
  if (text === null) {
    io.err(`ratewright: ${shown}: cannot be read as UTF-8 text; it is left as it is.\n`);
    return "failed";
  }
  const formatted = formatText(uri, text, options);
  if (!formatted.ok) {
    io.err(`ratewright: ${shown}: ${messageOf(formatted.problem)}\n`);
    return "refused";
  }
  if (formatted.value === text) return "as it was";
  if (!check && (await writeText(path, formatted.value)) !== null) {
    io.err(`ratewright: ${shown}: cannot be written; it is left as it is.\n`);
    return "failed";
  }
  io.out(`${shown} ${check ? "would change" : "is formatted"}.\n`);
  return "changed";
}

/** A text as it stands in its file, byte order mark and all; null where it is not UTF-8, so that no byte is lost. */
async function readText(uri: string): Promise<string | null> {
  const outcome = await nodeReader().read(uri, textLimit);
  if (outcome.kind !== "bytes") return null;
  try {
    return new TextDecoder("utf-8", { fatal: true, ignoreBOM: true }).decode(outcome.bytes);
  } catch {
    return null;
  }
}
