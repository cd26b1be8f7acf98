// Bundles everything that runs: node src/build/build.mjs. Other scripts import `build`. With --write the files made from
// the code that are kept in the repository are written anew too; a test says when one of them is not current.
import { spawnSync } from "node:child_process";
import { createHash } from "node:crypto";
import { chmodSync, copyFileSync, readFileSync, renameSync } from "node:fs";
import { rm } from "node:fs/promises";
import { join } from "node:path";
import { pathToFileURL } from "node:url";
import { build as bundle } from "esbuild";
import { writeGrammar } from "./grammarFile.mjs";
import { root } from "./install.mjs";
import { plotSpecsJson } from "./specs.mjs";

const shared = {
  absWorkingDir: root,
  bundle: true,
  minify: true,
  legalComments: "none",
  logLevel: "warning",
  target: "es2022",
  metafile: true,
};
const node = {
  ...shared,
  platform: "node",
  format: "cjs",
  target: "node20",
  // A package asks for the address of its module, which a CommonJS bundle does not have by itself.
  define: { "import.meta.url": "bundleUrl" },
  banner: { js: 'const bundleUrl=require("node:url").pathToFileURL(__filename).href;' },
};

const web = { ...shared, platform: "browser", format: "iife" };
const client = { format: "cjs", external: ["vscode"] };

/** Entry, bundle and how it is made. */
const bundles = [
  { ...node, entryPoints: ["src/cli/main.ts"], outfile: "dist/command.cjs" },
  { ...node, entryPoints: ["src/server/node.ts"], outfile: "dist/server.cjs" },
  { ...node, entryPoints: ["src/server/compute/workerNode.ts"], outfile: "dist/worker.cjs" },
  { ...web, entryPoints: ["src/server/web.ts"], outfile: "dist/server.web.js" },
  { ...node, ...client, entryPoints: ["src/extension/node.ts"], outfile: "dist/extension.cjs" },
  { ...web, ...client, entryPoints: ["src/extension/web.ts"], outfile: "dist/extension.web.js" },
];

/** What runs in the page of the preview; its plots are compiled beforehand and stand in it as plain data. */
async function previewBundle() {
  return {
    ...web,
    entryPoints: ["src/preview/main.ts"],
    outfile: "dist/preview.js",
    define: { plotSpecs: await plotSpecsJson() },
  };
}

/** Builds all bundles into dist/ and gives their sizes in bytes, by name. */
export async function build() {
  await rm(join(root, "dist"), { recursive: true, force: true });
  const made = await Promise.all([...bundles, await previewBundle()].map((options) => bundle(options)));
  placeCommand();
  return Object.fromEntries(
    made.flatMap(({ metafile }) => Object.entries(metafile.outputs).map(([name, { bytes }]) => [name, bytes])),
  );
}

/**
 * Puts the command in its place: `ratewright.cjs` starts it, `command-HASH.cjs` is it, and beside that stands what V8
 * made of it. The name holds a hash of the code, so that no code can ever be taken for that of another build.
 */
function placeCommand() {
  const dist = join(root, "dist");
  const code = readFileSync(join(dist, "command.cjs"));
  const hash = createHash("sha256").update(code).digest("hex").slice(0, 16);
  renameSync(join(dist, "command.cjs"), join(dist, `command-${hash}.cjs`));
  const command = join(dist, "ratewright.cjs");
  copyFileSync(join(root, "src", "build", "launcher.cjs"), command);
  chmodSync(command, 0o755);
  // A run on the samples, so that what a run needs is there; without it the command only starts more slowly.
  spawnSync(process.execPath, [command, "report", join("samples", "peroxide.raterun")], {
    cwd: root,
    stdio: "ignore",
    env: { ...process.env, RATEWRIGHT_KEEP_CODE: "yes" },
  });
}

if (process.argv[1] !== undefined && import.meta.url === pathToFileURL(process.argv[1]).href) {
  if (process.argv.includes("--write")) await writeGrammar();
  for (const [name, bytes] of Object.entries(await build())) console.log(`${name}  ${Math.round(bytes / 1000)} kB`);
}
