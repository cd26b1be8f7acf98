import assert from "node:assert/strict";
import { desktopEditor } from "./desktopEditor.js";

describe("the desktop editor", () => {
  it("is not used where none is named", () => {
    assert.equal(desktopEditor({ DISPLAY: ":0" }), undefined);
  });

  it("is used where it is named and can be shown", () => {
    assert.equal(desktopEditor({ RATEWRIGHT_VSCODE: process.execPath, DISPLAY: ":0" }), process.execPath);
  });

  it("is refused where the named file is not there", () => {
    assert.throws(() => desktopEditor({ RATEWRIGHT_VSCODE: "no/such/editor", DISPLAY: ":0" }), /no\/such\/editor/);
  });
});
