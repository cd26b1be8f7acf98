// Writes two texts by turns, as a command writes a record, until it is killed. Arguments: the file, the two texts' files.
import { readFileSync } from "node:fs";
import { writeText } from "../../src/host/node/writeText.js";

const [target, ...sources] = process.argv.slice(2);
const texts = sources.map((source) => readFileSync(source, "utf8"));
if (target === undefined || texts.length !== 2) throw new Error("wanted: the file to write, two files to write of");
process.stdout.write("begun\n");
void writeByTurns(target, texts);

async function writeByTurns(path: string, [first = "", second = ""]: readonly string[]): Promise<never> {
  for (let turn = 0; ; turn++) {
    const refusal = await writeText(path, turn % 2 === 0 ? first : second);
    if (refusal !== null) throw new Error(refusal);
  }
}
