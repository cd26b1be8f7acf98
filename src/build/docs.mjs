// Writes the pages made from the catalogue of messages and from the table of lines: node src/build/docs.mjs
import { mkdirSync, readdirSync, rmSync, writeFileSync } from "node:fs";
import { dirname, join, sep } from "node:path";
import { pathToFileURL } from "node:url";
import { bundleTests } from "./bundleTests.mjs";
import { root } from "./install.mjs";

const bundles = await bundleTests("docs", [join(root, "src", "build", "docs", "pages.ts")], "esm");
const { docsPages } = await import(pathToFileURL(join(bundles, "src", "build", "docs", "pages.mjs")).href);
const { pages, faults } = await docsPages();
const folder = join(root, "media", "docs");
mkdirSync(folder, { recursive: true });
for (const name of readdirSync(folder, { recursive: true, encoding: "utf8" })) {
  // Pages of codes that are no more.
  if (name.endsWith(".md") && !pages.has(name.split(sep).join("/"))) rmSync(join(folder, name));
}
for (const [path, text] of pages) {
  const file = join(folder, path);
  mkdirSync(dirname(file), { recursive: true });
  writeFileSync(file, text);
}
console.log(`${pages.size} pages in media/docs`);
for (const fault of faults) console.error(fault);
if (faults.length > 0) process.exitCode = 1;
