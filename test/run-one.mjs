// Bundles the named test files and runs them with mocha: node test/run-one.mjs test/room/thing.test.ts …
import { spawnSync } from "node:child_process";
import { mkdirSync, rmSync } from "node:fs";
import { dirname, join, resolve } from "node:path";
import { fileURLToPath } from "node:url";
import { build } from "esbuild";

const root = dirname(dirname(fileURLToPath(import.meta.url)));
const out = join(root, "node_modules/.cache/ratewright", `one-${process.pid}`);
mkdirSync(out, { recursive: true });
await build({
  absWorkingDir: root,
  entryPoints: process.argv.slice(2).map((path) => resolve(path)),
  outdir: out,
  outbase: root,
  bundle: true,
  platform: "node",
  format: "esm",
  target: "node20",
  packages: "external",
  sourcemap: "inline",
  outExtension: { ".js": ".mjs" },
});
const run = spawnSync(
  process.execPath,
  ["--enable-source-maps", join(root, "node_modules/mocha/bin/mocha.js"), "--recursive", "--extension", "mjs", out],
  { cwd: root, stdio: "inherit" },
);
rmSync(out, { recursive: true, force: true });
process.exit(run.status ?? 1);
