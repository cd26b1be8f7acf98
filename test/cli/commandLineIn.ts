import { runCommandLine } from "../../src/cli/run.js";

/** What a command line came to. */
export interface CommandLineRun {
  readonly status: number;
  readonly out: string;
  readonly err: string;
}

/** Runs the command line in a folder: status, standard output, standard error. */
export async function commandLineIn(cwd: string, words: readonly string[]): Promise<CommandLineRun> {
  let out = "";
  let err = "";
  const io = {
    cwd,
    out: (text: string) => {
      out += text;
    },
    err: (text: string) => {
      err += text;
    },
  };
  return { status: await runCommandLine(words, io), out, err };
}
