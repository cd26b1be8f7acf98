import assert from "node:assert/strict";
import { mkdirSync, mkdtempSync, rmSync, symlinkSync, writeFileSync } from "node:fs";
import { tmpdir } from "node:os";
import { dirname, join } from "node:path";
import { expandPaths } from "../../src/host/node/expandPaths.js";

describe("the descriptions that arguments mean", () => {
  let folder = "";
  const files = [
    "b.raterun",
    "a.raterun",
    "notes.txt",
    "deep/er/c d.raterun",
    "deep/[1].raterun",
    "deep/.hidden/h.raterun",
    "node_modules/x/n.raterun",
    "deep/node_modules/n.raterun",
    ".git/g.raterun",
    "empty/readme.txt",
  ];
  before(() => {
    folder = mkdtempSync(join(tmpdir(), "ratewright-paths-"));
    for (const file of files) {
      mkdirSync(dirname(join(folder, file)), { recursive: true });
      writeFileSync(join(folder, file), "");
    }
    symlinkSync("..", join(folder, "deep/up"));
    symlinkSync("a.raterun", join(folder, "linked.raterun"));
  });
  after(() => rmSync(folder, { recursive: true, force: true }));

  const shown = async (...paths: string[]): Promise<string[]> =>
    (await expandPaths(paths, folder)).found.map((one) => one.shown);
  const unused = async (...paths: string[]) => (await expandPaths(paths, folder)).unused;

  it("searches a folder through and through, in a fixed order, without node_modules, .git and what is linked", async () => {
    assert.deepEqual(await shown("."), [
      "a.raterun",
      "b.raterun",
      "deep/.hidden/h.raterun",
      "deep/[1].raterun",
      "deep/er/c d.raterun",
    ]);
  });

  it("keeps the order of the arguments and names each file once", async () => {
    assert.deepEqual(await shown("b.raterun", "deep/er", "*.raterun"), [
      "b.raterun",
      "deep/er/c d.raterun",
      "a.raterun",
    ]);
  });

  it("takes a glob, and a path that exists for itself before a glob", async () => {
    assert.deepEqual(await shown("deep/**/c*.raterun"), ["deep/er/c d.raterun"]);
    assert.deepEqual(await shown("deep/[1].raterun"), ["deep/[1].raterun"]);
    assert.deepEqual(await shown("{a,b}.*"), ["a.raterun", "b.raterun"]);
  });

  it("takes a linked description that is named itself", async () => {
    assert.deepEqual(await shown("linked.raterun"), ["linked.raterun"]);
  });

  it("takes absolute paths and gives URIs", async () => {
    const { found } = await expandPaths([join(folder, "deep/er/c d.raterun")], folder);
    assert.deepEqual(
      found.map(({ path, uri }) => [path.slice(folder.length), uri.endsWith("/deep/er/c%20d.raterun")]),
      [["/deep/er/c d.raterun", true]],
    );
  });

  it("says which argument leads nowhere, and why", async () => {
    assert.deepEqual(await unused("gone.raterun", "notes.txt", "empty", "x*.raterun", "a.raterun"), [
      { argument: "gone.raterun", reason: "missing" },
      { argument: "notes.txt", reason: "not a description" },
      { argument: "empty", reason: "no descriptions in it" },
      { argument: "x*.raterun", reason: "missing" },
    ]);
  });
});
