import type { ExitStatus, Io } from "./io.js";

/** One command of the command line. */
export interface Command {
  readonly name: string;
  /** one line for the list of commands */
  readonly summary: string;
  /** options that take no value, with what they do */
  readonly options: Readonly<Record<string, string>>;
  readonly example: string;
  run(paths: readonly string[], options: ReadonlySet<string>, io: Io): Promise<ExitStatus>;
}
