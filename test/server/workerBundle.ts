import { join } from "node:path";
import { build } from "esbuild";
import { projectFolder } from "../editor/projectFolder.js";
import { temporaryFolder } from "../editor/temporaryFolder.js";

/** The worker's script, bundled as it is shipped, in a folder of its own. */
export async function workerBundle(): Promise<{ script: string; remove: () => void }> {
  const folder = temporaryFolder("worker");
  const script = join(folder.path, "worker.cjs");
  await build({
    absWorkingDir: projectFolder(),
    entryPoints: ["src/server/compute/workerNode.ts"],
    outfile: script,
    bundle: true,
    platform: "node",
    format: "cjs",
    target: "node20",
    logLevel: "error",
    define: { "import.meta.url": "bundleUrl" },
    banner: { js: 'const bundleUrl=require("node:url").pathToFileURL(__filename).href;' },
  });
  return { script, remove: folder.remove };
}
