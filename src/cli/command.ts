import type { ExitStatus, Io } from "./io.js";

/** One option of a command. */
export interface CommandOption {
  /** what it does */
  readonly words: string;
  /** what stands behind it, as the help names it: FILE; a switch takes nothing */
  readonly takes?: string;
}

/** The options that were given: a switch with "", any other with what stands behind it. */
export type GivenOptions = ReadonlyMap<string, string>;

/** One command of the command line. */
export interface Command {
  readonly name: string;
  /** one line for the list of commands */
  readonly summary: string;
  readonly options: Readonly<Record<string, CommandOption>>;
  readonly example: string;
  run(paths: readonly string[], options: GivenOptions, io: Io): Promise<ExitStatus>;
}
