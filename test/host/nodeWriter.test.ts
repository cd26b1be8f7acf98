import assert from "node:assert/strict";
import { existsSync, mkdirSync, readFileSync, symlinkSync, writeFileSync } from "node:fs";
import { join } from "node:path";
import { fileUri } from "../../src/host/node/fileUri.js";
import { nodeWriter } from "../../src/host/node/nodeWriter.js";
import { requestWriter } from "../../src/host/web/requestWriter.js";
import { temporaryFolder } from "../editor/temporaryFolder.js";

describe("writing a file from the editor", () => {
  let folder: ReturnType<typeof temporaryFolder>;
  const at = (name: string): string => join(folder.path, name);
  const write = (name: string): Promise<string | null> =>
    nodeWriter().write(fileUri(at(name)), "text", [fileUri(at("open"))]);
  beforeEach(() => {
    folder = temporaryFolder("writer");
    mkdirSync(at("open/runs"), { recursive: true });
    mkdirSync(at("elsewhere"));
  });
  afterEach(() => folder.remove());

  it("writes inside the opened folder, new or in place of what is there", async () => {
    assert.equal(await write("open/a.raterecord"), null);
    writeFileSync(at("open/runs/b.raterecord"), "before");
    assert.equal(await write("open/runs/b.raterecord"), null);
    assert.deepEqual(
      ["open/a.raterecord", "open/runs/b.raterecord"].map((name) => readFileSync(at(name), "utf8")),
      ["text", "text"],
    );
  });

  it("refuses what lies outside, by its path or by a link", async () => {
    const outside = "it would lie outside the opened folder";
    assert.equal(await write("elsewhere/a.raterecord"), outside);
    assert.equal(await write("open/../elsewhere/a.raterecord"), outside);
    symlinkSync(at("elsewhere"), at("open/linked"), "junction");
    assert.equal(await write("open/linked/a.raterecord"), outside);
    assert.equal(existsSync(at("elsewhere/a.raterecord")), false);
  });

  it("does not follow a linked record out of the folder", async () => {
    writeFileSync(at("elsewhere/a.raterecord"), "kept");
    symlinkSync(at("elsewhere/a.raterecord"), at("open/a.raterecord"));
    assert.equal(await write("open/a.raterecord"), "it would lie outside the opened folder");
    assert.equal(readFileSync(at("elsewhere/a.raterecord"), "utf8"), "kept");
  });

  it("says why it cannot", async () => {
    mkdirSync(at("open/a.raterecord"));
    assert.equal(await write("open/a.raterecord"), "a folder of that name is there");
    assert.equal(await write("open/nowhere/a.raterecord"), "it would lie outside the opened folder");
    assert.equal(await nodeWriter().write("vscode-vfs://x/a.raterecord", "text", []), "it is no file of this machine");
  });

  it("in the web worker asks the client, inside the opened folders only, and never rejects", async () => {
    const asked: string[] = [];
    const writer = requestWriter(async (uri) => {
      asked.push(uri);
      if (uri.endsWith("full")) throw new Error("no room");
      return null;
    });
    const folders = ["vscode-vfs://x/open"];
    assert.equal(await writer.write("vscode-vfs://x/open/a", "text", folders), null);
    assert.equal(await writer.write("vscode-vfs://x/open/full", "text", folders), "no room");
    assert.equal(
      await writer.write("vscode-vfs://x/opened/a", "text", folders),
      "it would lie outside the opened folder",
    );
    assert.deepEqual(asked, ["vscode-vfs://x/open/a", "vscode-vfs://x/open/full"]);
  });
});
