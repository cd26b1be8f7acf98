import assert from "node:assert/strict";
import { createCleanup } from "./cleanup.js";

describe("a clean-up", () => {
  it("undoes the last thing first, and each once", async () => {
    const done: string[] = [];
    const cleanup = createCleanup();
    cleanup.add("first", () => void done.push("first"));
    cleanup.add("second", async () => void done.push("second"));
    await cleanup.run();
    await cleanup.run();
    assert.deepEqual(done, ["second", "first"]);
  });

  it("does the rest although one step fails, and tells of the failure", async () => {
    const done: string[] = [];
    const cleanup = createCleanup();
    cleanup.add("first", () => void done.push("first"));
    cleanup.add("second", () => {
      throw new Error("the second step failed");
    });
    await assert.rejects(cleanup.run(), /the second step failed/);
    assert.deepEqual(done, ["first"]);
  });
});
