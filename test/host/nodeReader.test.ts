import assert from "node:assert/strict";
import { appendFileSync, mkdirSync, mkdtempSync, rmSync, symlinkSync, writeFileSync } from "node:fs";
import { open, stat } from "node:fs/promises";
import { tmpdir } from "node:os";
import { join } from "node:path";
import { filePath, fileUri } from "../../src/host/node/fileUri.js";
import { type FileSystem, nodeReader } from "../../src/host/node/nodeReader.js";

describe("reading files in Node", () => {
  let folder = "";
  const at = (name: string): string => join(folder, name);
  const read = (name: string, limit = 1000) => nodeReader().read(fileUri(at(name)), limit);

  before(() => {
    folder = mkdtempSync(join(tmpdir(), "ratewright reader µ #1 50%-"));
    writeFileSync(at("a.csv"), "t,V\n0,1\n");
    mkdirSync(at("folder"));
  });
  after(() => rmSync(folder, { recursive: true, force: true }));

  it("gives the bytes, whatever characters the path has", async () => {
    const outcome = await read("a.csv");
    assert.deepEqual(outcome, { kind: "bytes", bytes: new Uint8Array(Buffer.from("t,V\n0,1\n")) });
  });

  it("says what is missing, a folder, too large", async () => {
    assert.deepEqual(await read("b.csv"), { kind: "missing" });
    assert.deepEqual(await read("a.csv/b.csv"), { kind: "missing" });
    assert.deepEqual(await read("folder"), { kind: "folder" });
    assert.deepEqual(await read("a.csv", 7), { kind: "too large", size: 8 });
    assert.equal((await read("a.csv", 8)).kind, "bytes");
  });

  it("follows a link, and says where links lead nowhere or in a circle", async () => {
    symlinkSync("a.csv", at("link.csv"));
    symlinkSync("gone.csv", at("dangling.csv"));
    symlinkSync("circle.csv", at("circle.csv"));
    assert.equal((await read("link.csv")).kind, "bytes");
    assert.deepEqual(await read("dangling.csv"), { kind: "missing" });
    assert.deepEqual(await read("circle.csv"), {
      kind: "unreadable",
      reason: "its symbolic links go round in a circle",
    });
  });

  it("does not read what is no regular file", async () => {
    const outcome = await nodeReader().read(fileUri("/dev/null"), 1000);
    assert.deepEqual(outcome, { kind: "unreadable", reason: "it is not a regular file" });
  });

  it("says when the system forbids it", async () => {
    const forbidden: FileSystem = {
      stat,
      open: () => Promise.reject(Object.assign(new Error("no"), { code: "EACCES" })),
    };
    assert.deepEqual(await nodeReader(forbidden).read(fileUri(at("a.csv")), 1000), {
      kind: "unreadable",
      reason: "permission is denied",
    });
  });

  it("reads no other scheme and no broken URI", async () => {
    for (const uri of ["untitled:Untitled-1", "https://example.org/a.csv", "no uri", ""]) {
      assert.equal((await nodeReader().read(uri, 1000)).kind, "unreadable", uri);
    }
    assert.equal((await nodeReader().read("file:///a%00b.csv", 1000)).kind, "unreadable");
  });

  /** Files that somebody writes to during the first `times` readings. */
  const written = (path: string, times: number): FileSystem => ({
    stat,
    async open(name, flags) {
      const file = await open(name, flags);
      return {
        stat: (options) => file.stat(options),
        close: () => file.close(),
        read(buffer, offset, length, position) {
          if (times-- > 0) appendFileSync(path, "1,2\n");
          return file.read(buffer, offset, length, position);
        },
      };
    },
  });

  it("reads a file that changes meanwhile once more", async () => {
    writeFileSync(at("growing.csv"), "t,V\n");
    const outcome = await nodeReader(written(at("growing.csv"), 1)).read(fileUri(at("growing.csv")), 1000);
    assert.deepEqual(outcome, { kind: "bytes", bytes: new Uint8Array(Buffer.from("t,V\n1,2\n")) });
  });

  it("gives up a file that keeps changing", async () => {
    writeFileSync(at("growing.csv"), "t,V\n");
    const outcome = await nodeReader(written(at("growing.csv"), 100)).read(fileUri(at("growing.csv")), 1000);
    assert.deepEqual(outcome, { kind: "unreadable", reason: "changed while being read" });
  });

  it("says that a file vanished between two looks", async () => {
    const vanishing: FileSystem = {
      stat,
      open: () => Promise.reject(Object.assign(new Error("gone"), { code: "ENOENT" })),
    };
    assert.deepEqual(await nodeReader(vanishing).read(fileUri(at("a.csv")), 1000), { kind: "missing" });
  });
});

describe("file URIs", () => {
  const cases: [path: string, windows: boolean, uri: string][] = [
    ["/home/lab/a b#1 50%?.csv", false, "file:///home/lab/a%20b%231%2050%25%3F.csv"],
    ["/home/lab/µ/ß.csv", false, "file:///home/lab/%C2%B5/%C3%9F.csv"],
    ["/home/lab/back\\slash.csv", false, "file:///home/lab/back%5Cslash.csv"],
    ["c:\\lab\\a b.csv", true, "file:///c%3A/lab/a%20b.csv"],
    ["\\\\server\\share\\a.csv", true, "file://server/share/a.csv"],
  ];
  for (const [path, windows, uri] of cases) {
    it(`${path} there and back`, () => {
      assert.equal(fileUri(path, windows), uri);
      assert.equal(filePath(uri, windows), path);
    });
  }

  it("spells a drive letter small, as the editor does", () => {
    assert.equal(fileUri("C:\\lab\\a.csv", true), "file:///c%3A/lab/a.csv");
  });
});
