import assert from "node:assert/strict";
import { mkdirSync, symlinkSync, writeFileSync } from "node:fs";
import { join } from "node:path";
import { fileUri } from "../../src/host/node/fileUri.js";
import { nodeFolders } from "../../src/host/node/nodeFolders.js";
import { requestFolders } from "../../src/host/web/requestFolders.js";
import { temporaryFolder } from "../editor/temporaryFolder.js";

describe("what lies in a folder", () => {
  const temporary = temporaryFolder("folders");
  const inside = join(temporary.path, "in side µ₂");
  const outside = join(temporary.path, "outside");
  before(() => {
    mkdirSync(join(inside, "data"), { recursive: true });
    mkdirSync(outside);
    writeFileSync(join(inside, "a b.csv"), "");
    writeFileSync(join(outside, "secret.csv"), "");
    symlinkSync(outside, join(inside, "link"));
  });
  after(() => temporary.remove());

  it("files and folders by name; links are passed over", async () => {
    const entries = await nodeFolders().list(fileUri(inside));
    const sorted = [...entries].sort((a, b) => (a.name < b.name ? -1 : 1));
    assert.deepEqual(sorted, [
      { name: "a b.csv", kind: "file" },
      { name: "data", kind: "folder" },
    ]);
  });

  it("nothing where it is missing, a file, or of another scheme", async () => {
    const folders = nodeFolders();
    assert.deepEqual(await folders.list(fileUri(join(inside, "nowhere"))), []);
    assert.deepEqual(await folders.list(fileUri(join(inside, "a b.csv"))), []);
    assert.deepEqual(await folders.list("vscode-vfs://host/folder"), []);
  });

  it("nothing outside the fence, links followed", async () => {
    const fenced = nodeFolders(() => [fileUri(inside)]);
    assert.equal((await fenced.list(fileUri(inside))).length, 2);
    assert.deepEqual(await fenced.list(fileUri(outside)), []);
    assert.deepEqual(await fenced.list(fileUri(join(inside, "link"))), []);
  });

  it("on the web it is what the editor answers, nothing where it answers with an error", async () => {
    const entry = { name: "a.csv", kind: "file" } as const;
    assert.deepEqual(await requestFolders(async () => [entry]).list("x:/y"), [entry]);
    assert.deepEqual(await requestFolders(() => Promise.reject(new Error("no"))).list("x:/y"), []);
  });
});
