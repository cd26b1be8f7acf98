import assert from "node:assert/strict";
import { withDeadline } from "./withDeadline.js";

describe("a deadline", () => {
  it("passes on what came in time, result or refusal", async () => {
    assert.equal(await withDeadline("work", 1_000, Promise.resolve(7)), 7);
    await assert.rejects(withDeadline("work", 1_000, Promise.reject(new Error("broken"))), /^Error: broken$/);
  });

  it("names the work that did not come", async () => {
    const never = new Promise<never>(() => undefined);
    await assert.rejects(withDeadline("the slow work", 10, never), /the slow work: not done after/);
  });
});
