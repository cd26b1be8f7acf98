// Draws the samples anew into samples/pictures: node src/build/gallery.mjs (after npm run build).
import { spawnSync } from "node:child_process";
import { mkdirSync, rmSync } from "node:fs";
import { join } from "node:path";
import { root } from "./install.mjs";

const folder = join("samples", "pictures");
rmSync(join(root, folder), { recursive: true, force: true });
mkdirSync(join(root, folder), { recursive: true });
const command = join(root, "dist", "ratewright.cjs");
const { status, stdout } = spawnSync(process.execPath, [command, "report", "--svg", folder, "samples"], {
  cwd: root,
  encoding: "utf8",
});
// Status 1: one of the samples has planted mistakes.
if (status !== 0 && status !== 1) throw new Error("the samples could not be drawn; is the command built?");
console.log(stdout.trim());
