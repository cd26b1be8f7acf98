// Bundles everything that runs: node src/build/build.mjs. Other scripts import `build`.
import { rm } from "node:fs/promises";
import { join } from "node:path";
import { pathToFileURL } from "node:url";
import { build as bundle } from "esbuild";
import { root } from "./install.mjs";

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

/** Entry, bundle and how it is made. */
const bundles = [
  {
    ...node,
    entryPoints: ["src/cli/main.ts"],
    outfile: "dist/ratewright.cjs",
    banner: { js: `#!/usr/bin/env node\n${node.banner.js}` },
  },
];

/** Builds all bundles into dist/ and gives their sizes in bytes, by name. */
export async function build() {
  await rm(join(root, "dist"), { recursive: true, force: true });
  const made = await Promise.all(bundles.map((options) => bundle(options)));
  return Object.fromEntries(
    made.flatMap(({ metafile }) => Object.entries(metafile.outputs).map(([name, { bytes }]) => [name, bytes])),
  );
}

if (process.argv[1] !== undefined && import.meta.url === pathToFileURL(process.argv[1]).href) {
  for (const [name, bytes] of Object.entries(await build())) console.log(`${name}  ${Math.round(bytes / 1000)} kB`);
}
