import { writeSync } from "node:fs";
import { runCommandLine } from "./run.js";

/** Writes all of a text, however slowly the other end reads. */
function write(descriptor: number, text: string): void {
  const bytes = Buffer.from(text, "utf8");
  let at = 0;
  while (at < bytes.length) {
    try {
      at += writeSync(descriptor, bytes, at);
    } catch (error) {
      const code = error instanceof Error && "code" in error ? error.code : "";
      if (code === "EPIPE") process.exit(1);
      if (code !== "EAGAIN") throw error;
    }
  }
}

const io = { cwd: process.cwd(), out: (text: string) => write(1, text), err: (text: string) => write(2, text) };
runCommandLine(process.argv.slice(2), io).then(
  (status) => {
    process.exitCode = status;
  },
  (error: unknown) => {
    io.err(
      `ratewright: an internal error, please report it: ${error instanceof Error ? error.stack : String(error)}\n`,
    );
    process.exitCode = 2;
  },
);
