import assert from "node:assert/strict";
import { mkdirSync, symlinkSync, writeFileSync } from "node:fs";
import { join } from "node:path";
import { fencedReader } from "../../src/host/node/fencedReader.js";
import { fileUri } from "../../src/host/node/fileUri.js";
import { nodeReader } from "../../src/host/node/nodeReader.js";
import { temporaryFolder } from "../editor/temporaryFolder.js";

describe("reading files in a folder that is not trusted", () => {
  const folder = temporaryFolder("fence");
  after(() => folder.remove());
  const at = (path: string): string => join(folder.path, path);
  let fence: readonly string[] | null = null;
  const reader = fencedReader(nodeReader(), () => fence);
  const kindOf = async (path: string): Promise<string> => (await reader.read(fileUri(at(path)), 1000)).kind;

  before(() => {
    mkdirSync(at("opened"));
    mkdirSync(at("opened-too"));
    writeFileSync(at("opened/a.csv"), "t,c\n");
    writeFileSync(at("secret.csv"), "t,c\n");
    writeFileSync(at("opened-too/b.csv"), "t,c\n");
    symlinkSync("a.csv", at("opened/inside.csv"));
    symlinkSync("../secret.csv", at("opened/outside.csv"));
    symlinkSync("..", at("opened/up"));
    symlinkSync("gone.csv", at("opened/dangling.csv"));
    symlinkSync("opened", at("linked"));
  });

  it("follows links that stay inside, and none that leads out", async () => {
    fence = [fileUri(at("opened"))];
    assert.equal(await kindOf("opened/a.csv"), "bytes");
    assert.equal(await kindOf("opened/inside.csv"), "bytes");
    assert.equal(await kindOf("opened/outside.csv"), "unreadable");
    assert.equal(await kindOf("opened/up/secret.csv"), "unreadable");
    assert.equal(await kindOf("opened-too/b.csv"), "unreadable");
    assert.equal(await kindOf("opened/dangling.csv"), "missing");
  });

  it("takes a folder that is itself reached by a link", async () => {
    fence = [fileUri(at("linked"))];
    assert.equal(await kindOf("linked/a.csv"), "bytes");
    assert.equal(await kindOf("linked/outside.csv"), "unreadable");
  });

  it("reads everything once the folder is trusted", async () => {
    fence = null;
    assert.equal(await kindOf("opened/outside.csv"), "bytes");
  });
});
