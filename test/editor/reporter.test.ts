import assert from "node:assert/strict";
import Mocha from "mocha";
import { printTally, tallyOf } from "../../src/build/reporter.mjs";

/** Runs a suite of its own, apart from the one that is running, and answers with its tally. */
function tallyOfSuite(fill: (suite: Mocha.Suite) => void): Promise<ReturnType<typeof tallyOf>> {
  const mocha = new Mocha({ reporter: Mocha.reporters.Base });
  fill(mocha.suite);
  return new Promise((done) => {
    const runner = mocha.run(() => done(tally));
    const tally = tallyOf(runner, "inner");
  });
}

describe("the tally of a layer", () => {
  it("counts what passed and what failed, and prints each failure in full", async () => {
    const tally = await tallyOfSuite((suite) => {
      suite.addTest(new Mocha.Test("good", () => undefined));
      suite.addTest(new Mocha.Test("bad", () => assert.equal(1, 2, "one is not two")));
    });
    assert.equal(tally.passed, 1);
    assert.equal(tally.failed, 1);
    const lines: string[] = [];
    printTally(tally, (line) => lines.push(line));
    assert.match(lines.join("\n"), /bad[\s\S]*one is not two/);
    assert.equal(lines.at(-1), "inner: 1 passed, 1 failed");
  });

  it("counts a test that is only announced, and a hook that fails, as failures", async () => {
    const tally = await tallyOfSuite((suite) => {
      suite.addTest(new Mocha.Test("announced"));
      suite.afterAll("order", () => {
        throw new Error("left a mess");
      });
      suite.addTest(new Mocha.Test("good", () => undefined));
    });
    assert.equal(tally.passed, 1);
    assert.equal(tally.failed, 2);
  });
});
