import { alignedTable } from "../report/table.js";
import type { Command } from "./command.js";
import { commands } from "./commands.js";

/** Help of the whole command line, or of one command. */
export function help(command: Command | null): string {
  return command === null ? overview() : commandHelp(command);
}

function overview(): string {
  const width = Math.max(...commands.map(({ name }) => name.length));
  return [
    "ratewright: reaction rates from run descriptions (.raterun) and the data files they name",
    "",
    "usage: ratewright COMMAND [OPTION…] PATH…",
    "       PATH is a description, a folder that is searched, or a pattern in quotes",
    "",
    ...commands.map(({ name, summary }) => `  ${name.padEnd(width)}  ${summary}`),
    "",
    ...commands.map(({ example }) => `example: ${example}`),
    "",
    "ratewright COMMAND --help tells the options of a command; ratewright --version the version.",
    "Exit status: 0 no error and nothing moved, 1 an error was found or something moved, 2 misuse.",
    "",
  ].join("\n");
}

function commandHelp({ name, summary, options, example }: Command): string {
  const rows = Object.entries(options).map(([option, { words, takes }]) => [
    takes === undefined ? `--${option}` : `--${option} ${takes}`,
    words,
  ]);
  return [
    `ratewright ${name}: ${summary}`,
    "",
    `usage: ratewright ${name} [OPTION…] PATH…`,
    "",
    ...alignedTable(rows, "  "),
    "",
    `example: ${example}`,
    "",
  ].join("\n");
}
