import { spawnSync } from "node:child_process";
import { createHash } from "node:crypto";
import { existsSync, readFileSync, writeFileSync } from "node:fs";
import { join } from "node:path";
import { npmCommand, npmEnvironment } from "../../src/build/npm.mjs";
import { projectFolder } from "../editor/projectFolder.js";

/** Time npm may take, ms. */
const npmLimit = 240_000;

/** Whether Node for this system can be had from npm: the packages hold the builds for Linux on x64. */
export const otherNodesThere = process.platform === "linux" && process.arch === "x64";

/**
 * Node 22 and Node 24, as paths of their programs, installed from npm into `test/nodes` unless they are there for this
 * lock. Throws with plain words where the package registry cannot be reached.
 */
export function otherNodes(): readonly { readonly name: string; readonly path: string }[] {
  const folder = join(projectFolder(), "test", "nodes");
  const marker = join(folder, "node_modules", ".ratewright-installed");
  const wanted = createHash("sha256")
    .update(readFileSync(join(folder, "package-lock.json")))
    .digest("hex");
  if (!existsSync(marker) || readFileSync(marker, "utf8") !== wanted) {
    const { command, args, shell } = npmCommand(["ci", "--ignore-scripts", "--no-audit", "--no-fund"]);
    const run = spawnSync(command, args, {
      cwd: folder,
      env: npmEnvironment(),
      shell,
      timeout: npmLimit,
      encoding: "utf8",
    });
    if (run.status !== 0) {
      const why = run.error?.message ?? run.stderr.trim();
      throw new Error(`Node 22 and 24 could not be installed. Is the package registry in reach? npm says: ${why}`);
    }
    writeFileSync(marker, wanted);
  }
  return ["22", "24"].map((version) => ({
    name: `Node ${version}`,
    path: join(folder, "node_modules", `node-${version}`, "bin", "node"),
  }));
}
