// Runs the benchmarks of test/bench and prints ratios: node src/build/bench.mjs [NAME…]
import { readdirSync } from "node:fs";
import { join } from "node:path";
import { pathToFileURL } from "node:url";
import { build } from "./build.mjs";
import { bundleTests } from "./bundleTests.mjs";
import { installPackages, root } from "./install.mjs";

installPackages();
await build();
const folder = join(root, "test", "bench");
const wanted = process.argv.slice(2);
const names = readdirSync(folder)
  .filter((name) => name.endsWith(".bench.ts"))
  .filter((name) => wanted.length === 0 || wanted.includes(name.replace(".bench.ts", "")));
const bundled = await bundleTests(
  "bench",
  names.map((name) => join(folder, name)),
  "esm",
);
for (const name of names) {
  console.log(`\n${name.replace(".bench.ts", "")}`);
  const { bench } = await import(pathToFileURL(join(bundled, "test", "bench", name.replace(/\.ts$/, ".mjs"))).href);
  for (const line of await bench()) console.log(`  ${line}`);
}
