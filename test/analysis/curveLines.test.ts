import assert from "node:assert/strict";
import { describeText, onlyRun } from "../support/describeText.js";

const text = `ratewright 1
reaction  2 H2O2(aq) -> 2 H2O(l) + O2(g)
run X
  temperature  25 °C
  taken  H2O2  1.0 mol/L
  data  "x.csv"
    column  t  "t / s"
    column  c  "c / mol L^-1"
    exclude  line 5  because "cuvette was moved"
  follow  H2O2 as concentration from c
  fit  order 1 in H2O2
`;
// Invented: 1.0 falling by a tenth a step; line 1 is a comment, line 2 the header.
const data = ["# invented", "t / s,c / mol L^-1"]
  .concat(Array.from({ length: 10 }, (_, i) => `${i},${(1 * 0.9 ** i).toFixed(4)}`))
  .join("\n");

describe("lines of the file in curves", () => {
  it("each reading knows its line, those left out say why and where that is written", async () => {
    const description = await describeText(text, { "x.csv": data }, true);
    assert.deepEqual(
      description.diagnostics.filter(({ severity }) => severity === "error"),
      [],
    );
    const run = onlyRun(description);
    const [follow] = run.follow;
    assert.deepEqual(follow?.lines, [3, 4, 6, 7, 8, 9, 10, 11, 12]);
    assert.deepEqual(follow?.time?.values.length, 9);
    assert.deepEqual(follow?.leftOut?.lines, [5]);
    assert.deepEqual(follow?.leftOut?.time.values, [2]);
    assert.deepEqual(follow?.leftOut?.signal.values, [0.81]);
    assert.deepEqual(follow?.leftOut?.why, ["cuvette was moved"]);
    assert.equal(follow?.leftOut?.places[0]?.line, 9);
    assert.equal(run.taken[0]?.place?.line, 5);
    assert.equal(run.conditionPlaces?.["temperature"]?.line, 4);
  });
});
