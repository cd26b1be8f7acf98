import assert from "node:assert/strict";
import { isInside, resolveUri } from "../../src/data/resolve.js";

describe("resolving a data path", () => {
  const base = "file:///home/lab/peroxide/a%20run.raterun";
  const uri = (path: string, from: string = base): string => {
    const resolution = resolveUri(from, path);
    return resolution.kind === "uri" ? resolution.uri : resolution.kind;
  };

  it("counts from the folder of the description", () => {
    assert.equal(uri("data/a.csv"), "file:///home/lab/peroxide/data/a.csv");
    assert.equal(uri("./data//a.csv"), "file:///home/lab/peroxide/data/a.csv");
    assert.equal(uri("../raw/a.csv"), "file:///home/lab/raw/a.csv");
    assert.equal(uri("x/../a.csv"), "file:///home/lab/peroxide/a.csv");
  });

  it("takes every character of a name as it stands", () => {
    assert.equal(uri("run 1#2 50%.csv"), "file:///home/lab/peroxide/run%201%232%2050%25.csv");
    assert.equal(uri("a%20b?.csv"), "file:///home/lab/peroxide/a%2520b%3F.csv");
    assert.equal(uri("Messung µ/ß.csv"), "file:///home/lab/peroxide/Messung%20%C2%B5/%C3%9F.csv");
  });

  it("keeps drive letters, hosts and other schemes", () => {
    assert.equal(uri("data/a.csv", "file:///c%3A/lab/a.raterun"), "file:///c%3A/lab/data/a.csv");
    assert.equal(uri("../a.csv", "file://server/share/x/a.raterun"), "file://server/share/a.csv");
    assert.equal(uri("a.csv", "vscode-vfs://host/repo/x.raterun"), "vscode-vfs://host/repo/a.csv");
  });

  it("says why a path leads nowhere", () => {
    assert.deepEqual(resolveUri(base, " "), { kind: "empty" });
    for (const path of [
      "/data/a.csv",
      "C:\\data\\a.csv",
      "c:/a.csv",
      "\\\\server\\a.csv",
      "file:a.csv",
      "https://h/a.csv",
    ]) {
      assert.deepEqual(resolveUri(base, path), { kind: "absolute" }, path);
    }
    assert.deepEqual(resolveUri(base, "data\\a.csv"), { kind: "backslash", mended: "data/a.csv" });
    assert.deepEqual(resolveUri(base, "../../../../a.csv"), { kind: "leaves" });
    assert.deepEqual(resolveUri("untitled:Untitled-1", "a.csv"), { kind: "unsaved" });
  });
});

describe("a file inside a folder", () => {
  it("is inside by whole names, with .. worked out", () => {
    assert.equal(isInside("file:///home/lab", "file:///home/lab/x/a.csv"), true);
    assert.equal(isInside("file:///home/lab/", "file:///home/lab/a%20b.csv"), true);
    assert.equal(isInside("file:///home/lab", "file:///home/laboratory/a.csv"), false);
    assert.equal(isInside("file:///home/lab", "file:///home/lab/../a.csv"), false);
    assert.equal(isInside("file:///home/lab", "file:///home/lab/%2e%2e/a.csv"), false);
    assert.equal(isInside("file:///home/lab", "file:///home/Lab/a.csv"), false);
  });

  it("has the same scheme, host and drive", () => {
    assert.equal(isInside("file:///C%3A/lab", "file:///c:/lab/a.csv"), true);
    assert.equal(isInside("file:///c%3A/lab", "file:///d%3A/lab/a.csv"), false);
    assert.equal(isInside("file://one/lab", "file://two/lab/a.csv"), false);
    assert.equal(isInside("vscode-vfs://h/lab", "file://h/lab/a.csv"), false);
  });
});
