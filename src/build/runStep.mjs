// Runs one program of a longer course: without input, with a time-out, and never longer than this process.
import { spawn } from "node:child_process";
import { npmEnvironment } from "./npm.mjs";

/** Time a program may take to put its things in order when asked to end, ms. */
const graceTime = 10_000;

/**
 * Runs a program to its end, its output shown. Answers with its status and, where it did not end well, the reason.
 * @param {string} command
 * @param {readonly string[]} args
 * @param {{ cwd: string, limit: number }} options `limit` in ms
 * @returns {Promise<{ status: number | null, why: string }>}
 */
export function runStep(command, args, { cwd, limit }) {
  const grouped = process.platform !== "win32";
  const child = spawn(command, args, {
    cwd,
    env: npmEnvironment(),
    stdio: ["ignore", "inherit", "inherit"],
    detached: grouped,
  });
  const kill = (signal) => {
    try {
      if (grouped) process.kill(-child.pid, signal);
      else child.kill(signal);
    } catch {
      // Ended already.
    }
  };
  return new Promise((done) => {
    let why = "";
    const timers = [];
    const end = (reason) => {
      why = reason;
      kill("SIGTERM");
      timers.push(setTimeout(() => kill("SIGKILL"), graceTime));
    };
    timers.push(setTimeout(() => end(`not done after ${Math.round(limit / 1000)} s`), limit));
    const interrupted = () => end("interrupted");
    for (const signal of ["SIGINT", "SIGTERM", "SIGHUP"]) process.on(signal, interrupted);
    const finish = (status, reason) => {
      for (const timer of timers) clearTimeout(timer);
      for (const signal of ["SIGINT", "SIGTERM", "SIGHUP"]) process.off(signal, interrupted);
      done({ status, why: why || reason });
    };
    child.once("error", (error) => finish(null, error.message));
    child.once("close", (status, signal) => {
      finish(status, status === 0 ? "" : signal ? `ended by ${signal}` : `status ${status}`);
    });
  });
}
