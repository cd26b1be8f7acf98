// Bundles test files for the place they run in. Needs the project's packages installed.
import { mkdirSync, rmSync } from "node:fs";
import { join } from "node:path";
import { build } from "esbuild";
import { root } from "./install.mjs";

/** Folder of all bundles; below `node_modules`, so packages are found from there. */
export const bundleFolder = join(root, "node_modules", ".cache", "ratewright-tests");

/**
 * Bundles the files into a folder of the given name, emptied before, and answers with its path. `esm` for Node: `.mjs`,
 * in folders as below the project's top. `cjs` for the editor's extension host: `.cjs`, in folders as below `base`.
 * @param {string} name
 * @param {readonly string[]} files
 * @param {"esm" | "cjs"} format
 * @param {string} base
 */
export async function bundleTests(name, files, format, base = root) {
  const folder = join(bundleFolder, name);
  rmSync(folder, { recursive: true, force: true });
  mkdirSync(folder, { recursive: true });
  await build({
    absWorkingDir: root,
    entryPoints: [...files],
    outdir: folder,
    outbase: base,
    outExtension: { ".js": format === "esm" ? ".mjs" : ".cjs" },
    bundle: true,
    platform: "node",
    format,
    target: "node20",
    packages: "external",
    external: ["vscode"],
    sourcemap: "inline",
    logLevel: "warning",
  });
  return folder;
}
