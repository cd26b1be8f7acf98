import assert from "node:assert/strict";
import { cpSync, mkdirSync, mkdtempSync, rmSync, writeFileSync } from "node:fs";
import { tmpdir } from "node:os";
import { join } from "node:path";
import type { Findings } from "../../src/contract/findings.js";
import { type CommandLineRun, commandLineIn } from "./commandLineIn.js";

let folder = "";

before(() => {
  folder = mkdtempSync(join(tmpdir(), "ratewright-cli-"));
  cpSync("samples", join(folder, "samples"), { recursive: true });
  mkdirSync(join(folder, "with space é#%"));
  cpSync("samples", join(folder, "with space é#%"), { recursive: true });
  mkdirSync(join(folder, "empty"));
  writeFileSync(join(folder, "notes.txt"), "no description");
});
after(() => rmSync(folder, { recursive: true, force: true }));

/** Runs the command line in a folder below the temporary one: status, standard output, standard error. */
function run(words: readonly string[], below = ""): Promise<CommandLineRun> {
  return commandLineIn(join(folder, below), words);
}

describe("ratewright check", () => {
  it("is silent and 0 on a sound description", async () => {
    const { status, out, err } = await run(["check", "samples/peroxide.raterun"]);
    assert.deepEqual([status, err], [0, ""]);
    assert.equal(out, "1 description: nothing to mend\n");
  });

  it("gives each diagnostic as file:line:column, marks the words and offers the mends; status 1", async () => {
    const { status, out } = await run(["check", "samples/planted.raterun"]);
    assert.equal(status, 1);
    assert.ok(
      out.startsWith(
        [
          "samples/planted.raterun:4:11: error: Oxygen does not balance: 2 on the left, 3 on the right. [unbalanced]",
          "  4 | reaction  H2O2(aq) -> H2O(l) + O2(g)",
          "    |           ^^^^^^^^^^^^^^^^^^^^^^^^^^",
          "    = Write “2 H2O2(aq) -> 2 H2O(l) + O2(g)”",
          "",
        ].join("\n"),
      ),
      out,
    );
    assert.ok(out.trimEnd().endsWith("1 description: 4 errors, 2 warnings"), out);
  });

  it("--lines: one line each, as editors and CI read it", async () => {
    const { status, out } = await run(["check", "--lines", "samples/planted.raterun"]);
    assert.equal(status, 1);
    const lines = out.trimEnd().split("\n");
    assert.deepEqual(
      lines.map((line) =>
        /^samples\/planted\.raterun:(\d+):(\d+): (error|warning|information): .+ \[([a-z-]+)\]$/.exec(line)?.slice(1),
      ),
      [
        ["4", "11", "error", "unbalanced"],
        ["8", "3", "error", "word-unknown"],
        ["9", "19", "error", "coulomb-for-celsius"],
        ["13", "5", "warning", "data-cell-empty"],
        ["13", "5", "warning", "data-cell-word"],
        ["15", "3", "error", "rate-outside-readings"],
      ],
    );
  });

  it("--json: the findings without runs", async () => {
    const { status, out, err } = await run(["check", "--json", "samples/planted.raterun", "samples/ester.raterun"]);
    assert.deepEqual([status, err], [1, ""]);
    const findings = JSON.parse(out) as Findings;
    assert.deepEqual(
      findings.descriptions.map(({ path, runs, series, mechanisms }) => [path, runs, series, mechanisms]),
      [
        ["samples/planted.raterun", [], [], []],
        ["samples/ester.raterun", [], [], []],
      ],
    );
    assert.equal(findings.descriptions[0]?.diagnostics.length, 6);
    assert.equal(findings.descriptions[0]?.data[0]?.rows, 21);
  });

  it("finds descriptions in folders and by patterns, from any folder, with any letters in the path", async () => {
    assert.match((await run(["check", "."])).out, /^.*10 descriptions: 8 errors, 4 warnings\n$/s);
    assert.match((await run(["check", "../with space é#%"], "samples")).out, /5 descriptions: 4 errors/);
    assert.match((await run(["check", "samples/*er*.raterun"])).out, /2 descriptions: nothing to mend/);
  });
});

describe("ratewright report", () => {
  it("prints what was done, the rates and the fit", async () => {
    const { status, out } = await run(["report", "samples/peroxide.raterun"]);
    assert.equal(status, 0);
    for (const words of [
      "run A — 0.050 M iodide, 25 °C",
      "2 H2O2(aq) -> 2 H2O(l) + O2(g)",
      "fit 1: order 1 in H2O2",
      "half-life",
      "run B",
    ]) {
      assert.ok(out.includes(words), words);
    }
  });

  it("--json is one document with every number finite or null, --curves adds the blocks", async () => {
    const plain = await run(["report", "--json", "samples"]);
    const curves = await run(["report", "--json", "--curves", "samples"]);
    assert.deepEqual([plain.status, plain.err, curves.status], [1, "", 1]);
    const findings = JSON.parse(plain.out) as Findings;
    assert.equal(findings.language, 1);
    assert.equal(findings.ratewright, "0.1.0");
    const fit = findings.descriptions.flatMap(({ runs }) => runs).flatMap(({ fits }) => fits)[0];
    assert.ok(fit !== undefined && fit.curve === undefined && Number.isFinite(fit.parameters["k"]?.value));
    const withCurves = JSON.parse(curves.out) as Findings;
    assert.ok(withCurves.descriptions[0]?.runs[0]?.fits[0]?.curve !== undefined);
    assert.ok(!plain.out.includes("NaN") && !plain.out.includes("Infinity"));
  });

  it("goes on where diagnostics stand, and says them in the report; status 1", async () => {
    const { status, out, err } = await run(["report", "samples/planted.raterun"]);
    assert.equal(status, 1);
    assert.match(out, /fit 1: order 1 in H2O2/);
    assert.equal(err, "");
    assert.match(out, /what to watch: 4 errors, 2 warnings\n {2}- error, line 4: Oxygen does not balance/);
  });
});

describe("the command line itself", () => {
  it("--help and --version answer with status 0 and an example", async () => {
    const { status, out } = await run(["--help"]);
    assert.equal(status, 0);
    assert.match(out, /example: ratewright check runs\/peroxide\.raterun/);
    const check = await run(["check", "--help"]);
    assert.equal(check.status, 0);
    assert.match(check.out, /--lines .*\n[\s\S]*example: ratewright check/);
    assert.deepEqual(await run(["--version"]), { status: 0, out: "0.1.0\n", err: "" });
  });

  it("misuse is status 2 with words on standard error and nothing on standard output", async () => {
    const cases: readonly (readonly [string[], RegExp])[] = [
      [[], /usage: ratewright COMMAND/],
      [["chek", "."], /there is no command chek; the nearest is check/],
      [["frobnicate"], /the commands are check, report/],
      [["check"], /check needs a path, for example: ratewright check/],
      [["check", "--jsn", "."], /--jsn/],
      [["check", "missing.raterun"], /missing\.raterun: there is no such file or folder/],
      [["check", "empty"], /empty: no \.raterun file is in it/],
      [["check", "notes.txt"], /notes\.txt: is not a run description; those end in \.raterun/],
    ];
    for (const [words, said] of cases) {
      const { status, out, err } = await run(words);
      assert.deepEqual([status, out], [2, ""], words.join(" "));
      assert.match(err, said);
    }
  });
});
