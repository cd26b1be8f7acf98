// Runs bundled test files with mocha in this process and writes the tally.
// Arguments: name of the layer, its tally file, longest time of one test in ms, the bundled files' folder.
import { readdirSync, writeFileSync } from "node:fs";
import { join } from "node:path";
import { pathToFileURL } from "node:url";
import Mocha from "mocha";
import { tallyOf, writeTally } from "./reporter.mjs";

/** Time this process may take to end by itself after the last test, ms. */
const endLimit = 10_000;

const [layer, tallyFile, testLimit, folder] = process.argv.slice(2);
const mocha = new Mocha({ ui: "bdd", timeout: Number(testLimit), reporter: Mocha.reporters.Base });
const files = readdirSync(folder, { recursive: true, encoding: "utf8" }).filter((path) => path.endsWith(".test.mjs"));
for (const path of files.sort()) {
  const file = join(folder, path);
  mocha.suite.emit("pre-require", globalThis, file, mocha);
  await import(pathToFileURL(file).href);
}

const runner = mocha.run(() => {
  writeTally(tally, tallyFile);
  process.exitCode = tally.failed > 0 ? 1 : 0;
  // What a test left running would hide here until the runner's time-out: name it instead. Being "unref" this timer
  // itself keeps nothing alive.
  setTimeout(() => {
    console.error(`${layer}: after the last test something was still running: ${process.getActiveResourcesInfo()}`);
    process.exit(1);
  }, endLimit).unref();
});
const tally = tallyOf(runner, layer);
// Should a test hang so hard that only a kill ends it, its name is on disk.
runner.on("test", (test) => writeFileSync(`${tallyFile}.running`, test.fullTitle()));
