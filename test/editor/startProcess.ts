import { spawn } from "node:child_process";
import { atExit } from "./leftovers.js";

/** How long a process may take to end by itself after being asked to, ms. */
const graceTime = 3_000;
/** Characters of output kept for a failure's words. */
const outputKept = 20_000;

export interface StartOptions {
  folder: string;
  environment?: { [name: string]: string | undefined };
  shell?: boolean;
}

export interface RunningProcess {
  /** What it wrote so far on both streams, at most the last 20,000 characters. */
  output(): string;
  /** Calls back with every piece of output, also with what was written before. */
  onOutput(listener: (text: string) => void): void;
  /** Its exit status; `null` where a signal ended it. Refuses where it could not be started. */
  ended: Promise<number | null>;
  /** Ends it and all it started. */
  stop(): Promise<void>;
}

/** Starts a program in a process group of its own, without input, so that it can be ended with all its children. */
export function startProcess(command: string, args: readonly string[], options: StartOptions): RunningProcess {
  const grouped = process.platform !== "win32";
  const child = spawn(command, args, {
    cwd: options.folder,
    env: { ...process.env, ...options.environment },
    stdio: ["ignore", "pipe", "pipe"],
    detached: grouped,
    shell: options.shell ?? false,
  });
  let output = "";
  const listeners: ((text: string) => void)[] = [];
  for (const stream of [child.stdout, child.stderr]) {
    stream.setEncoding("utf8").on("data", (text: string) => {
      output = (output + text).slice(-outputKept);
      for (const listener of listeners) listener(text);
    });
  }
  const kill = (signal: NodeJS.Signals) => {
    if (child.pid === undefined) return;
    try {
      if (grouped) process.kill(-child.pid, signal);
      else child.kill(signal);
    } catch {
      // The group is gone already, which is what was wanted.
    }
  };
  const forget = atExit(() => kill("SIGKILL"));
  const ended = new Promise<number | null>((done, refuse) => {
    child.once("error", refuse);
    child.once("close", (status) => done(status));
  });
  // Whoever waits for `ended` hears of a failed start; nobody waiting is no reason to crash.
  ended.catch(() => undefined);
  return {
    output: () => output,
    onOutput(listener) {
      if (output !== "") listener(output);
      listeners.push(listener);
    },
    ended,
    async stop() {
      kill("SIGTERM");
      const force = setTimeout(() => kill("SIGKILL"), graceTime);
      await ended.catch(() => undefined);
      clearTimeout(force);
      kill("SIGKILL");
      forget();
    },
  };
}
