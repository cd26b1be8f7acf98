import { createHash } from "node:crypto";
import { existsSync, readFileSync, symlinkSync, writeFileSync } from "node:fs";
import { join } from "node:path";
import { setTimeout as pause } from "node:timers/promises";
import { npmCommand, npmEnvironment } from "../../src/build/npm.mjs";
import { editorPackageFolder, editorServerFolder } from "./editorServerFolder.js";
import { startProcess } from "./startProcess.js";
import { withDeadline } from "./withDeadline.js";

const attempts = 3;
/** Pause before another attempt, ms. */
const attemptPause = 3_000;
/** Time one npm run may take, ms. */
const npmLimit = 240_000;

/**
 * Installs the editor for the tests unless the installed one belongs to this lock; answers with its folder.
 * Nothing native is built (`--ignore-scripts`): what would need it (search in files, terminals, Kerberos) no test uses.
 * Refuses, with npm's own last words, where npm fails three times.
 */
export async function installEditor(say: (line: string) => void): Promise<string> {
  const folder = editorPackageFolder();
  const marker = join(folder, "node_modules", ".ratewright-installed");
  const wanted = createHash("sha256")
    .update(readFileSync(join(folder, "package-lock.json")))
    .update(`${process.platform} ${process.arch}`)
    .digest("hex");
  if (existsSync(marker) && readFileSync(marker, "utf8") === wanted) return editorServerFolder();

  say("installing the editor for the tests (once)");
  const start = performance.now();
  const quiet = ["--ignore-scripts", "--no-audit", "--no-fund", "--loglevel=error"];
  for (let attempt = 1; ; attempt++) {
    try {
      // The first run empties the folder, so nothing of a broken attempt stays.
      await runNpm(["ci", ...quiet], folder);
      await runNpm(["install", "--omit=dev", ...quiet], editorServerFolder());
      break;
    } catch (failure) {
      const words = failure instanceof Error ? failure.message : String(failure);
      if (attempt === attempts) {
        throw new Error(`The editor for the tests could not be installed. ${words}`);
      }
      say(`attempt ${attempt} of ${attempts} failed, trying again. ${words}`);
      await pause(attemptPause);
    }
  }
  // The editor looks for some of its own packages under this second name.
  const secondName = join(editorServerFolder(), "node_modules.asar");
  if (!existsSync(secondName)) symlinkSync(join(editorServerFolder(), "node_modules"), secondName, "junction");
  writeFileSync(marker, wanted);
  say(`the editor for the tests is installed, ${((performance.now() - start) / 1000).toFixed(1)} s`);
  return editorServerFolder();
}

async function runNpm(args: readonly string[], folder: string): Promise<void> {
  const { command, args: allArgs, shell } = npmCommand(args);
  const npm = startProcess(command, allArgs, { folder, environment: npmEnvironment(), shell });
  try {
    const status = await withDeadline(`npm ${args[0]}`, npmLimit, npm.ended);
    if (status !== 0) throw new Error(`npm ${args[0]} ended with status ${status}:\n${npm.output().trim()}`);
  } finally {
    await npm.stop();
  }
}
