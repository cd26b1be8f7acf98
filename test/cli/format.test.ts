import assert from "node:assert/strict";
import { chmodSync, mkdirSync, mkdtempSync, readFileSync, rmSync, statSync, writeFileSync } from "node:fs";
import { tmpdir } from "node:os";
import { join } from "node:path";
import { runCommandLine } from "../../src/cli/run.js";

const flat = "reaction 2 H2O2 -> 2 H2O + O2\r\nrun A # first\r\nvolume 5 mL\r\n";
const inSigns = "reaction  2 H2O2 → 2 H2O + O2\r\nrun A  # first\r\n  volume       5 mL\r\n";

describe("ratewright format", () => {
  let folder = "";
  const path = (name: string): string => join(folder, name);
  const text = (name: string): string => readFileSync(path(name), "utf8");

  beforeEach(() => {
    folder = mkdtempSync(join(tmpdir(), "ratewright-format-"));
    mkdirSync(path("runs"));
    writeFileSync(path("runs/a.raterun"), flat);
    writeFileSync(path("runs/b.raterun"), inSigns);
  });
  afterEach(() => rmSync(folder, { recursive: true, force: true }));

  async function run(...words: string[]): Promise<{ status: number; out: string; err: string }> {
    let out = "";
    let err = "";
    const io = {
      cwd: folder,
      out: (more: string) => {
        out += more;
      },
      err: (more: string) => {
        err += more;
      },
    };
    return { status: await runCommandLine(["format", ...words], io), out, err };
  }

  it("writes what changes, leaves the rest untouched, and says which", async () => {
    const before = statSync(path("runs/b.raterun")).mtimeMs;
    const { status, out, err } = await run("runs");
    assert.deepEqual([status, err], [0, ""]);
    assert.equal(out, "runs/a.raterun is formatted.\n2 descriptions: 1 changed\n");
    assert.deepEqual([text("runs/a.raterun"), text("runs/b.raterun")], [inSigns, inSigns]);
    assert.equal(statSync(path("runs/b.raterun")).mtimeMs, before);
    assert.deepEqual(await run("runs"), { status: 0, out: "2 descriptions: nothing to change\n", err: "" });
  });

  it("--check: status 1 and a line for each that would change, nothing written", async () => {
    const { status, out, err } = await run("--check", "runs");
    assert.deepEqual([status, err], [1, ""]);
    assert.equal(out, "runs/a.raterun would change.\n2 descriptions: 1 would change\n");
    assert.equal(text("runs/a.raterun"), flat);
    assert.equal((await run("--check", "runs/b.raterun")).status, 0);
  });

  it("--ascii: the signs of a keyboard", async () => {
    assert.equal((await run("--ascii", "runs/b.raterun")).status, 0);
    assert.equal(text("runs/b.raterun"), inSigns.replace("→", "->"));
  });

  it("keeps a byte order mark, and refuses bytes that are not UTF-8 rather than lose them", async () => {
    writeFileSync(path("bom.raterun"), `\ufeff${flat}`);
    assert.equal((await run("bom.raterun")).status, 0);
    assert.equal(text("bom.raterun"), `\ufeff${inSigns}`);
    const latin = Buffer.from([...Buffer.from('run A\nnote "25 '), 0xb0, ...Buffer.from('C"\n')]);
    writeFileSync(path("latin.raterun"), latin);
    const { status, err } = await run("latin.raterun", "runs/a.raterun");
    assert.equal(status, 2);
    assert.equal(err, "ratewright: latin.raterun: cannot be read as UTF-8 text; it is left as it is.\n");
    assert.deepEqual(readFileSync(path("latin.raterun")), latin);
    assert.equal(text("runs/a.raterun"), inSigns);
  });

  it("keeps the permissions of a file", async () => {
    chmodSync(path("runs/a.raterun"), 0o640);
    await run("runs");
    assert.equal(statSync(path("runs/a.raterun")).mode & 0o777, 0o640);
  });

  it("a path that leads nowhere is misuse, and nothing is written", async () => {
    const { status, err } = await run("runs", "missing.raterun");
    assert.equal(status, 2);
    assert.match(err, /missing\.raterun: there is no such file or folder/);
    assert.equal(text("runs/a.raterun"), flat);
  });
});
