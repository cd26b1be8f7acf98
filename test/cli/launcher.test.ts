import assert from "node:assert/strict";
import { spawnSync } from "node:child_process";
import { copyFileSync, existsSync, mkdtempSync, rmSync, writeFileSync } from "node:fs";
import { tmpdir } from "node:os";
import { join } from "node:path";

describe("what starts the bundled command", () => {
  let folder = "";
  const code = join("command-0123456789abcdef.cjs");
  before(() => {
    folder = mkdtempSync(join(tmpdir(), "ratewright-launcher-"));
    copyFileSync("src/build/launcher.cjs", join(folder, "ratewright.cjs"));
  });
  after(() => rmSync(folder, { recursive: true, force: true }));

  const run = (env: Readonly<Record<string, string>> = {}) =>
    spawnSync(process.execPath, [join(folder, "ratewright.cjs"), "a", "b"], {
      encoding: "utf8",
      env: { ...process.env, ...env },
    });

  it("says what to do where nothing is built", () => {
    const { status, stderr } = run();
    assert.equal(status, 1);
    assert.match(stderr, /The command is not built\. Run: npm run build/);
  });

  it("runs the code with its arguments, with kept code, with kept code of something else, and without any", () => {
    writeFileSync(
      join(folder, code),
      'console.log(process.argv.slice(2).join(" "), require("node:path").basename(__filename));',
    );
    const expected = `a b ${code}\n`;
    assert.equal(run().stdout, expected);
    assert.equal(run({ RATEWRIGHT_KEEP_CODE: "yes" }).stdout, expected);
    const kept = join(folder, "command-0123456789abcdef.v8");
    assert.ok(existsSync(kept));
    assert.equal(run().stdout, expected);
    writeFileSync(kept, "nothing that V8 made");
    assert.equal(run().stdout, expected);
  });
});
