import assert from "node:assert/strict";
import type { PreviewPage } from "../../src/contract/previewProtocol.js";
import { createPageChoice } from "../../src/extension/preview/pageChoice.js";

function page(version: number, changes: Partial<PreviewPage> = {}): PreviewPage {
  const runs = ["run A", "run B"].map((id, index) => ({ id, name: id.slice(4), line: 3 + 9 * index }));
  return {
    uri: "file:///a.raterun",
    version,
    runs,
    run: "run A",
    errors: [],
    markup: `${version}`,
    plots: [],
    ...changes,
  };
}
const errors = [
  { line: 4, words: "“x” begins no line here." },
  { line: 7, words: "Oxygen does not balance." },
];

describe("what the preview shows of a page", () => {
  it("is the page itself where it has no errors, without a sign", () => {
    const choice = createPageChoice();
    assert.deepEqual(choice.take(page(1), null), { page: page(1), sign: "" });
  });

  it("is the last good page of that run while there are errors, with the first of them", () => {
    const choice = createPageChoice();
    choice.take(page(1), null);
    choice.take(page(1, { run: "run B", markup: "B" }), "run A");
    const shown = choice.take(page(2, { errors }), "run A");
    assert.equal(shown.page.version, 1);
    assert.equal(
      shown.sign,
      "The last good picture; the text has errors. Line 4: “x” begins no line here. And 1 more.",
    );
    assert.equal(choice.take(page(2, { run: "run B", errors }), "run A").page.markup, "B");
    assert.equal(choice.take(page(3), "run A").sign, "");
  });

  it("is what there is where there never was a good one", () => {
    const shown = createPageChoice().take(page(1, { errors }), null);
    assert.equal(shown.page.version, 1);
    assert.match(shown.sign, /^The text has errors\. Line 4/);
  });

  it("stays with a run whose own header is broken", () => {
    const choice = createPageChoice();
    choice.take(page(1, { run: "run B", markup: "B" }), null);
    choice.take(page(1), "run B");
    const left = page(2, { runs: page(2).runs.slice(1), run: "run B", errors });
    assert.equal(choice.take(left, "run A").page.run, "run A");
  });

  it("takes nothing from another description", () => {
    const choice = createPageChoice();
    choice.take(page(1), null);
    assert.equal(choice.take(page(2, { uri: "file:///b.raterun", errors }), null).page.uri, "file:///b.raterun");
  });
});
