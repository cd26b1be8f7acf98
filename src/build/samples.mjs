// Writes the invented data files of the samples: node src/build/samples.mjs
import { mkdirSync, writeFileSync } from "node:fs";
import { dirname, join } from "node:path";
import { pathToFileURL } from "node:url";
import { bundleTests } from "./bundleTests.mjs";
import { root } from "./install.mjs";

const folder = await bundleTests("samples", [join(root, "src", "build", "sampleData.ts")], "esm");
const { sampleData } = await import(pathToFileURL(join(folder, "src", "build", "sampleData.mjs")).href);
for (const [path, text] of sampleData()) {
  const file = join(root, "samples", path);
  mkdirSync(dirname(file), { recursive: true });
  writeFileSync(file, text);
  console.log(path);
}
