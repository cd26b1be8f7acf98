import assert from "node:assert/strict";
import { requestReader } from "../../src/host/web/requestReader.js";

describe("reading files from the web worker", () => {
  it("passes the answer of the client on", async () => {
    const asked: [string, number][] = [];
    const reader = requestReader(async (uri, limit) => {
      asked.push([uri, limit]);
      return { kind: "missing" };
    });
    assert.deepEqual(await reader.read("vscode-vfs://h/a.csv", 5), { kind: "missing" });
    assert.deepEqual(asked, [["vscode-vfs://h/a.csv", 5]]);
  });

  it("keeps the limit though the client does not", async () => {
    const reader = requestReader(async () => ({ kind: "bytes", bytes: new Uint8Array(6) }));
    assert.deepEqual(await reader.read("a:b", 5), { kind: "too large", size: 6 });
    assert.equal((await reader.read("a:b", 6)).kind, "bytes");
  });

  it("turns a failed request into a reason", async () => {
    const reader = requestReader(() => Promise.reject(new Error("connection is closed")));
    assert.deepEqual(await reader.read("a:b", 5), { kind: "unreadable", reason: "connection is closed" });
  });
});
