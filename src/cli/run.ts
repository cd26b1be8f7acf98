import { parseArgs } from "node:util";
import { version } from "../contract/version.js";
import { nearest } from "../quantity/nearest.js";
import { commands } from "./commands.js";
import { help } from "./help.js";
import type { ExitStatus, Io } from "./io.js";

/** Runs the command line: `words` are the arguments behind the program's name. */
export async function runCommandLine(words: readonly string[], io: Io): Promise<ExitStatus> {
  const [first, ...rest] = words;
  if (first === undefined || first === "--help" || first === "-h" || first === "help") {
    (first === undefined ? io.err : io.out)(help(null));
    return first === undefined ? 2 : 0;
  }
  if (first === "--version") {
    io.out(`${version}\n`);
    return 0;
  }
  const command = commands.find(({ name }) => name === first);
  if (command === undefined) {
    const names = commands.map(({ name }) => name);
    const near = nearest(first, names)[0];
    const hint = near === undefined ? `the commands are ${names.join(", ")}` : `the nearest is ${near}`;
    return misuse(io, `there is no command ${first}; ${hint}`);
  }
  const options = Object.fromEntries([
    ["help", { type: "boolean" as const }],
    ...Object.entries(command.options).map(([name, { takes }]) => [
      name,
      { type: takes === undefined ? ("boolean" as const) : ("string" as const) },
    ]),
  ]);
  try {
    const { values, positionals } = parseArgs({ args: rest, options, allowPositionals: true });
    const given = new Map(
      Object.entries(values).map(([name, value]) => [name, typeof value === "string" ? value : ""]),
    );
    if (given.has("help")) {
      io.out(help(command));
      return 0;
    }
    if (positionals.length === 0) return misuse(io, `${command.name} needs a path, for example: ${command.example}`);
    return await command.run(positionals, given, io);
  } catch (error) {
    if (error instanceof TypeError && "code" in error) return misuse(io, `${error.message.split(". ")[0]}`);
    throw error;
  }
}

function misuse(io: Io, words: string): ExitStatus {
  io.err(`ratewright: ${words}.\nratewright --help tells how it is used.\n`);
  return 2;
}
