import assert from "node:assert/strict";
import { fenceOf, folderOf, shownPath } from "../../src/server/folders.js";

describe("the folders of the editor", () => {
  const folders = ["file:///lab", "file:///lab/inner", "file:///other%20place"];

  it("hold a description in the innermost one", () => {
    assert.equal(folderOf("file:///lab/a.raterun", folders), "file:///lab");
    assert.equal(folderOf("file:///lab/inner/x/a.raterun", folders), "file:///lab/inner");
    assert.equal(folderOf("file:///laboratory/a.raterun", folders), null);
    assert.equal(folderOf("file:///other%20place/a.raterun", folders), "file:///other%20place");
  });

  it("give a description its short name, as the command line does from there", () => {
    assert.equal(shownPath("file:///lab/runs/%C2%B5.raterun", folders), "runs/µ.raterun");
    assert.equal(shownPath("file:///elsewhere/a.raterun", folders), "a.raterun");
    assert.equal(shownPath("file:///c%3A/a.raterun", ["file:///c%3A/"]), "a.raterun");
  });

  it("fence in the data files: the opened folder, else that of the description", () => {
    assert.equal(fenceOf("file:///lab/runs/a.raterun", folders), "file:///lab");
    assert.equal(fenceOf("file:///elsewhere/a.raterun", folders), "file:///elsewhere");
  });
});
