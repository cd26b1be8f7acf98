// Runs everything that must hold: node src/build/test.mjs [--only NAME]…
// Names: build, types, lint, unit, web, extension, person. The last line says how much passed and failed over all.
import { existsSync, mkdtempSync, readFileSync, rmSync } from "node:fs";
import { tmpdir } from "node:os";
import { join } from "node:path";
import { parseArgs } from "node:util";
import { installPackages, root } from "./install.mjs";
import { printTally } from "./reporter.mjs";
import { runStep } from "./runStep.mjs";
import { testFiles } from "./testFiles.mjs";

/** Longest time of each step, ms. The two that may install the editor first have time for that. */
const limits = {
  build: 120_000,
  types: 120_000,
  lint: 60_000,
  unit: 300_000,
  web: 180_000,
  extension: 420_000,
  person: 420_000,
};

/** Longest time of one test, ms; a person's tests wait for an editor, and the first of them may install it. */
const testLimits = { unit: 60_000, web: 240_000, person: 240_000 };

const names = Object.keys(limits);
const say = (line) => console.log(line);

/** What came of a step that is one check: build, types, lint. */
function single(layer, { status, why }) {
  if (status === 0 && why === "") return { layer, passed: 1, failed: 0, failures: [] };
  return {
    layer,
    passed: 0,
    failed: 1,
    failures: [{ title: layer, words: `It failed: ${why}. Its words stand above.` }],
  };
}

/** What came of a layer of tests: its tally, and one failure more where it did not run as it should. */
function layered(layer, { status, why }, tallyFile) {
  const tally = existsSync(tallyFile)
    ? JSON.parse(readFileSync(tallyFile, "utf8"))
    : { layer, passed: 0, failed: 0, failures: [] };
  const fault = (words) => {
    tally.failed++;
    tally.failures.push({ title: `the layer "${layer}" itself`, words });
  };
  if (!existsSync(tallyFile)) {
    const running = existsSync(`${tallyFile}.running`) ? readFileSync(`${tallyFile}.running`, "utf8") : "none yet";
    fault(`It did not come to an end: ${why || "it ended without a tally"}. Last test started: ${running}`);
  } else if (tally.passed + tally.failed === 0) fault("It held no test.");
  else if (status !== 0 && tally.failed === 0) fault(`All its tests passed, but then: ${why}`);
  return tally;
}

const node = (args, limit) => runStep(process.execPath, args, { cwd: root, limit });
const tool = (...path) => join(root, "node_modules", ...path);

/** How each step is done. Bundling needs packages, so it is loaded when they are there. */
async function perform(name, folder) {
  const limit = limits[name];
  if (name === "build") return single(name, await node([join(root, "src/build/build.mjs")], limit));
  if (name === "types") return single(name, await node([tool("typescript/bin/tsc"), "--noEmit", "-p", root], limit));
  if (name === "lint") return single(name, await node([tool("@biomejs/biome/bin/biome"), "check", root], limit));
  const tallyFile = join(folder, `${name}.json`);
  const { bundleTests } = await import("./bundleTests.mjs");
  if (name === "extension") {
    const base = join(root, "test", "extension");
    const inside = await bundleTests(name, [join(base, "index.ts"), ...testFiles(name)], "cjs", base);
    const outside = await bundleTests("launch", [join(base, "launch.ts")], "esm");
    const launch = join(outside, "test", "extension", "launch.mjs");
    return layered(name, await node(["--enable-source-maps", launch, inside, tallyFile], limit), tallyFile);
  }
  const bundles = await bundleTests(name, testFiles(name), "esm");
  const runner = join(root, "src", "build", "mochaLayer.mjs");
  const args = ["--enable-source-maps", runner, name, tallyFile, String(testLimits[name]), bundles];
  return layered(name, await node(args, limit), tallyFile);
}

const { values } = parseArgs({ options: { only: { type: "string", multiple: true } } });
const only = values.only?.flatMap((value) => value.split(",")) ?? [];
const unknown = only.find((name) => !names.includes(name));
if (unknown !== undefined) {
  console.error(`--only ${unknown}: there is no such step; there are ${names.join(", ")}`);
  process.exit(2);
}
// What the three last layers test is the built extension, so a build comes before them.
const needsBuild = only.some((name) => ["web", "extension", "person"].includes(name));
const wanted =
  only.length === 0 ? names : names.filter((name) => only.includes(name) || (name === "build" && needsBuild));

const tallies = [];
const folder = mkdtempSync(join(tmpdir(), "ratewright-test-"));
let interrupted = false;
for (const signal of ["SIGINT", "SIGTERM", "SIGHUP"]) {
  process.on(signal, () => {
    interrupted = true;
  });
}
try {
  installPackages();
  for (const name of wanted) {
    if (interrupted) throw new Error("interrupted");
    const start = performance.now();
    say(`\n— ${name}`);
    let tally;
    try {
      tally = await perform(name, folder);
    } catch (error) {
      tally = { layer: name, passed: 0, failed: 1, failures: [{ title: name, words: String(error.stack ?? error) }] };
    }
    tallies.push(tally);
    printTally(tally, say);
    say(`${name}: ${((performance.now() - start) / 1000).toFixed(1)} s`);
  }
} catch (error) {
  console.error(error.message);
  tallies.push({ layer: "run", passed: 0, failed: 1, failures: [] });
} finally {
  rmSync(folder, { recursive: true, force: true });
}

const sum = (key) => tallies.reduce((total, tally) => total + tally[key], 0);
process.exitCode = sum("failed") > 0 || sum("passed") === 0 ? 1 : 0;
const broken = tallies.filter(({ failed }) => failed > 0).map(({ layer }) => layer);
say(broken.length === 0 ? "" : `\nfailed in: ${broken.join(", ")}`);
say(`${sum("passed")} passed, ${sum("failed")} failed`);
