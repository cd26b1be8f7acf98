import assert from "node:assert/strict";
import { commands, type Tab, TabInputWebview, window } from "vscode";
import { until } from "../editor/until.js";
import { openCopy } from "./descriptions.js";

/** The tabs of the preview that are open, in any group. */
function previews(): Tab[] {
  const tabs = window.tabGroups.all.flatMap((group) => group.tabs);
  return tabs.filter(({ input }) => input instanceof TabInputWebview && input.viewType.endsWith("ratewright.preview"));
}

describe("the command that opens the preview", () => {
  it("opens one panel beside the text, named after the description, and leaves the cursor in the text", async () => {
    const document = await openCopy("peroxide.raterun", "previewed.raterun");
    await commands.executeCommand("ratewright.openPreview");
    await until("the panel", () => previews().length === 1);
    await until("its name", () => previews()[0]?.label === "Preview: previewed.raterun");
    assert.equal(window.activeTextEditor?.document.uri.toString(), document.uri.toString());
    assert.notEqual(previews()[0]?.group.viewColumn, window.activeTextEditor?.viewColumn);
    await commands.executeCommand("ratewright.openPreview");
    assert.equal(previews().length, 1);
  });

  it("follows to another description, and opens anew after it was closed", async () => {
    await openCopy("ester.raterun", "previewed-too.raterun");
    await until("the other name", () => previews()[0]?.label === "Preview: previewed-too.raterun");
    await window.tabGroups.close(previews());
    assert.equal(previews().length, 0);
    await commands.executeCommand("ratewright.openPreview");
    await until("the panel again", () => previews()[0]?.label === "Preview: previewed-too.raterun");
    await window.tabGroups.close(previews());
  });
});
