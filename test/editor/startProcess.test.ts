import assert from "node:assert/strict";
import { startProcess } from "./startProcess.js";
import { until } from "./until.js";
import { withDeadline } from "./withDeadline.js";

/** Whether a process with this id is there; signal 0 asks without harm. */
function alive(id: number): boolean {
  try {
    process.kill(id, 0);
    return true;
  } catch {
    return false;
  }
}

describe("a started process", () => {
  it("tells its output and its status", async () => {
    const run = startProcess(process.execPath, ["-e", "console.log('said'); process.exit(3)"], { folder: "." });
    assert.equal(await withDeadline("end", 10_000, run.ended), 3);
    assert.equal(run.output(), "said\n");
    await run.stop();
  });

  it("refuses with the reason where the program is not there", async () => {
    const run = startProcess("no-such-program-anywhere", [], { folder: "." });
    await assert.rejects(run.ended, /ENOENT/);
    await run.stop();
  });

  it("ends with all it started", async () => {
    const child = "setInterval(() => {}, 1000)";
    const parent = `const c = require("node:child_process").spawn(process.execPath, ["-e", ${JSON.stringify(child)}]);
      console.log(c.pid); ${child}`;
    const run = startProcess(process.execPath, ["-e", parent], { folder: "." });
    const id = await until("the child's id", () => Number(/^\d+\n/.exec(run.output())?.[0] ?? 0));
    assert.ok(alive(id));
    await run.stop();
    await until("the child's end", () => !alive(id));
  });
});
