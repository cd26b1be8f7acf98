import assert from "node:assert/strict";
import { spawnSync } from "node:child_process";
import { cpSync, mkdirSync, readdirSync, readFileSync, rmSync, statSync, writeFileSync } from "node:fs";
import { join } from "node:path";
import { temporaryFolder } from "../editor/temporaryFolder.js";
import { commandLineIn } from "./commandLineIn.js";

describe("ratewright record and verify", () => {
  let folder: ReturnType<typeof temporaryFolder>;
  const path = (name: string): string => join(folder.path, name);
  const text = (name: string): string => readFileSync(path(name), "utf8");
  const change = (name: string, from: string | RegExp, to: string): void => {
    const before = text(name);
    const after = before.replace(from, to);
    assert.notEqual(after, before, `${name} holds no ${from}`);
    writeFileSync(path(name), after);
  };
  const run = (...words: string[]) => commandLineIn(folder.path, words);

  beforeEach(() => {
    folder = temporaryFolder("record");
    cpSync("samples", folder.path, { recursive: true });
    for (const name of readdirSync(folder.path)) if (name.endsWith(".raterecord")) rmSync(path(name));
  });
  afterEach(() => folder.remove());

  it("writes the record beside the description, twice the same bytes, the second time nothing", async () => {
    assert.deepEqual(await run("record", "ester.raterun"), {
      status: 0,
      out: "ester.raterecord is written.\n1 description: 1 record written\n",
      err: "",
    });
    const first = text("ester.raterecord");
    assert.equal(first, readFileSync("samples/ester.raterecord", "utf8"));
    const { mtimeMs } = statSync(path("ester.raterecord"));
    assert.deepEqual(await run("record", "ester.raterun"), {
      status: 0,
      out: "1 description: nothing to write\n",
      err: "",
    });
    assert.equal(statSync(path("ester.raterecord")).mtimeMs, mtimeMs);
    rmSync(path("ester.raterecord"));
    await run("record", ".");
    assert.equal(text("ester.raterecord"), first);
  });

  it("holds the same whatever folder it is written from", async () => {
    await run("record", "ester.raterun");
    const here = text("ester.raterecord");
    rmSync(path("ester.raterecord"));
    mkdirSync(path("elsewhere"));
    const { status } = await commandLineIn(path("elsewhere"), ["record", "../ester.raterun"]);
    assert.deepEqual([status, text("ester.raterecord")], [0, here]);
  });

  it("a description with errors has a record that holds them; status 1, and verify is 0 on it", async () => {
    const { status, err } = await run("record", "planted.raterun");
    assert.deepEqual([status, err], [1, "planted.raterun: 4 errors; its record holds them.\n"]);
    assert.match(text("planted.raterecord"), /"code": "unbalanced"/);
    assert.equal((await run("verify", "planted.raterun")).status, 0);
  });

  it("is not written over something else, nor over a later record; over a broken one it is", async () => {
    for (const other of ['{"my": "own"}', '{"raterecord": 2}']) {
      writeFileSync(path("ester.raterecord"), other);
      const { status, err } = await run("record", "ester.raterun");
      assert.equal(status, 2);
      assert.match(err, /^ratewright: ester\.raterecord: .* It is left as it is\.\n$/);
      assert.equal(text("ester.raterecord"), other);
    }
    writeFileSync(path("ester.raterecord"), '{\n  "raterecord": 1,\n  "descr');
    assert.equal((await run("record", "ester.raterun")).status, 0);
    assert.equal((await run("verify", "ester.raterun")).status, 0);
    rmSync(path("ester.raterecord"));
    mkdirSync(path("ester.raterecord"));
    assert.equal((await run("record", "ester.raterun")).status, 2);
  });

  it("verify: 0 on the untouched, by the name of either file and for a whole folder", async () => {
    await run("record", ".");
    for (const words of [["ester.raterun"], ["ester.raterecord"], ["."]]) {
      const { status, out } = await run("verify", ...words);
      assert.equal(status, 0, out);
      assert.match(out, /^[15] descriptions?: nothing moved\n$/);
    }
  });

  it("verify: 0 after comments, spaces, line ends and the layout changed", async () => {
    await run("record", "gas.raterun");
    change("gas.raterun", "run A", "# a comment more\n\nrun   A");
    change("gas.raterun", /\n/g, "\r\n");
    for (const layout of [[], ["--ascii"]]) {
      const before = text("gas.raterun");
      assert.equal((await run("format", ...layout, "gas.raterun")).status, 0);
      assert.notEqual(text("gas.raterun"), before);
      assert.deepEqual(await run("verify", "gas.raterun"), {
        status: 0,
        out: "1 description: nothing moved\n",
        err: "",
      });
    }
  });

  it("verify: 1 after one digit of the data, with the file", async () => {
    await run("record", "ester.raterun");
    change("data/ester.csv", "\n4;34,48\n", "\n4;34,49\n");
    const { status, out } = await run("verify", "ester.raterun");
    assert.equal(status, 1);
    const lines = out.split("\n");
    assert.equal(lines[0], "ester.raterun: not as recorded.");
    assert.match(lines[1] ?? "", /^ {2}data\/ester\.csv changed: 41 rows as before, SHA-256 /);
    assert.match(out, /\n {2}run A, fit 1: k moved /);
    assert.match(out, /\n1 description: 1 not as recorded\n$/);
    assert.doesNotMatch(out, /What the description means changed/);
  });

  it("verify: 1 after a row more, after the file is gone, after another amount, after another method", async () => {
    await run("record", "ester.raterun", "gas.raterun");
    change("data/ester.csv", "\n4;34,48\n", "\n4;34,48\n4,5;34,1\n");
    const row = await run("verify", "ester.raterun");
    assert.equal(row.status, 1);
    assert.match(row.out, /data\/ester\.csv changed: 41 rows before, 42 now/);
    rmSync(path("data/ester.csv"));
    const gone = await run("verify", "ester.raterun");
    assert.equal(gone.status, 1);
    assert.match(gone.out, /data\/ester\.csv is no longer read: it is not there, or/);

    change("gas.raterun", "10.0 mL", "11.0 mL");
    const amount = await run("verify", "gas.raterun");
    assert.equal(amount.status, 1);
    assert.match(
      amount.out,
      /^gas\.raterun: not as recorded\.\n {2}What the description means changed\.\n {2}run A: H2O2 taken moved from 10 mL to 11 mL\.\n/,
    );
    assert.doesNotMatch(amount.out, /data\/gas\.csv/);
    change("gas.raterun", "11.0 mL", "10.0 mL");
    assert.equal((await run("verify", "gas.raterun")).status, 0);

    change("gas.raterecord", /"method": "[^"]*"/, '"method": "0"');
    const method = await run("verify", "gas.raterun");
    assert.equal(method.status, 1);
    assert.match(method.out, /\n {2}The way numbers are computed changed: version 0 before, \S+ now\.\n1 description/);
  });

  it("verify: 1 where there is no record, or none that can be read; 2 where there is no description", async () => {
    const none = await run("verify", "ester.raterun");
    assert.deepEqual(
      [none.status, none.out.split("\n")[0]],
      [1, "ester.raterun: there is no record yet; ratewright record ester.raterun writes it."],
    );
    await run("record", "ester.raterun");
    writeFileSync(path("ester.raterecord"), text("ester.raterecord").slice(0, 500));
    const cut = await run("verify", "ester.raterun");
    assert.equal(cut.status, 1);
    assert.match(cut.out, /^ester\.raterecord: The record ends too soon\. Bring it back from version control/);
    const missing = await run("verify", "nowhere.raterun");
    assert.deepEqual([missing.status, missing.out], [2, ""]);
  });

  it("a git diff after another amount fits on a screen and names the quantity", async () => {
    await run("record", "gas.raterun");
    const git = (...words: string[]): string => {
      const { status, stdout, stderr } = spawnSync("git", words, { cwd: folder.path, encoding: "utf8" });
      assert.ok(status === 0, stderr);
      return stdout;
    };
    git("init", "--quiet");
    git("add", "gas.raterecord");
    change("gas.raterun", "10.0 mL", "10.1 mL");
    await run("record", "gas.raterun");
    const diff = git("diff", "--no-color", "gas.raterecord");
    const lines = diff.trimEnd().split("\n");
    // A screen: 50 lines, as a terminal of ordinary size has (common practice).
    assert.ok(lines.length <= 50, `${lines.length} lines:\n${diff}`);
    assert.match(diff, /^-.*"what": "run A: H2O2 taken", "text": "10 mL"/m);
    assert.match(diff, /^\+.*"what": "run A: H2O2 taken", "text": "10\.1 mL"/m);
    const changed = lines.filter((line) => /^[-+] /.test(line));
    assert.deepEqual(
      changed.filter((line) => !/"what": "run A|"meaning": "/.test(line)),
      [],
    );
  });
});
