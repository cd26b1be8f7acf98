import { resolve } from "node:path";
import { fileUri } from "../../host/node/fileUri.js";
import { verdictLines } from "../../workspace/verdictText.js";
import { recordBeside, verify as verdictOf } from "../../workspace/verify.js";
import type { Command } from "../command.js";
import { type Described, describeAll } from "../describeAll.js";
import type { Io } from "../io.js";
import { readRecordFile } from "../recordFile.js";

/**
 * Works descriptions out anew and says what is otherwise than their records have it, and why. Status 1 where something
 * moved, and where a record is missing or cannot be read: then nothing vouches for the description.
 */
export const verify: Command = {
  name: "verify",
  summary: "work descriptions out anew and say what moved since their records, and why",
  options: {},
  example: "ratewright verify runs",
  async run(paths, _options, io) {
    const described = await describeAll(
      paths.map((path) => path.replace(/\.raterecord$/, ".raterun")),
      io,
      false,
    );
    if (described === null) return 2;
    let bad = 0;
    for (const one of described) {
      const lines = await verifyOne(one, io);
      if (lines.length > 0) bad++;
      for (const line of lines) io.out(`${line}\n`);
    }
    const count = described.length === 1 ? "1 description" : `${described.length} descriptions`;
    io.out(`${count}: ${bad === 0 ? "nothing moved" : `${bad} not as recorded`}\n`);
    return bad === 0 ? 0 : 1;
  },
};

/** What is to be said of one description; nothing where it is as recorded. */
async function verifyOne({ description }: Described, io: Io): Promise<string[]> {
  const { path } = description;
  const shown = recordBeside(path);
  const uri = fileUri(resolve(io.cwd, shown));
  const file = await readRecordFile(uri);
  if (file === "unreadable") return [`${shown}: cannot be read.`];
  const verdict = verdictOf(description, file.text, uri);
  return verdictLines(verdict, path, shown, `ratewright record ${path}`);
}
