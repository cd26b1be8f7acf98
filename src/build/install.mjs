// Installs the project's packages when the lock differs from the one they were installed from.
import { spawnSync } from "node:child_process";
import { createHash } from "node:crypto";
import { existsSync, readFileSync, writeFileSync } from "node:fs";
import { dirname, join } from "node:path";
import { fileURLToPath, pathToFileURL } from "node:url";
import { npmCommand, npmEnvironment } from "./npm.mjs";

/** The project's top folder. */
export const root = dirname(dirname(dirname(fileURLToPath(import.meta.url))));

const attempts = 3;
/** Time one attempt may take, ms. */
const attemptLimit = 240_000;

/** Where the hash of the installed lock is kept: it vanishes together with what it speaks of. */
const marker = join(root, "node_modules", ".ratewright-lock");

/** Hash of what decides which packages are installed: the lock and the kind of machine. */
function wanted() {
  const lock = readFileSync(join(root, "package-lock.json"));
  const machine = `${process.platform} ${process.arch}`;
  return createHash("sha256").update(lock).update(machine).digest("hex");
}

/** Runs `npm ci` if the packages are missing or belong to another lock; throws with plain words when npm cannot do it. */
export function installPackages() {
  const hash = wanted();
  if (existsSync(marker) && readFileSync(marker, "utf8") === hash) return;
  for (let attempt = 1; ; attempt++) {
    const { command, args, shell } = npmCommand(["ci", "--include=dev", "--no-audit", "--no-fund"]);
    const run = spawnSync(command, args, {
      cwd: root,
      env: npmEnvironment(),
      stdio: ["ignore", "inherit", "inherit"],
      shell,
      timeout: attemptLimit,
    });
    if (run.status === 0) break;
    const why = run.error ? run.error.message : `npm ci ended with status ${run.status ?? run.signal}`;
    if (attempt === attempts) {
      throw new Error(`The packages could not be installed (${why}). Is npm there, and the package registry in reach?`);
    }
    console.error(`npm ci, attempt ${attempt} of ${attempts}: ${why}; trying again`);
  }
  writeFileSync(marker, hash);
}

if (process.argv[1] && import.meta.url === pathToFileURL(process.argv[1]).href) installPackages();
