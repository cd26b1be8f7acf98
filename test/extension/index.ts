// The module the editor loads to test the extension from inside: it finds the bundled test files beside itself.
import { readdirSync } from "node:fs";
import { createRequire } from "node:module";
import { join } from "node:path";
import { tallyOf, writeTally } from "../../src/build/reporter.mjs";

/** Time one test may take, ms: the first one waits for the extension to start. */
const testLimit = 30_000;

/** Runs all test files inside the extension host; refuses when one fails or none was there to run. */
export async function run(): Promise<void> {
  // By name at run time: mocha is an ES module, this bundle is not.
  const { default: Mocha } = await import("mocha");
  const mocha = new Mocha({ ui: "bdd", timeout: testLimit, reporter: Mocha.reporters.Base });
  const load = createRequire(__filename);
  for (const name of readdirSync(__dirname)
    .filter((entry) => entry.endsWith(".test.cjs"))
    .sort()) {
    const file = join(__dirname, name);
    mocha.suite.emit("pre-require", globalThis, file, mocha);
    load(file);
  }
  const tally = await new Promise<ReturnType<typeof tallyOf>>((done) => {
    const runner = mocha.run(() => done(counted));
    const counted = tallyOf(runner, "extension");
  });
  const report = process.env["RATEWRIGHT_TALLY"];
  if (report !== undefined) writeTally(tally, report);
  if (tally.failed > 0) throw new Error(`${tally.failed} of ${tally.passed + tally.failed} tests failed`);
  if (tally.passed === 0) throw new Error("there was no test to run");
}
