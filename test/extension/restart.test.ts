import assert from "node:assert/strict";
import { commands, languages, Position, WorkspaceEdit, workspace } from "vscode";
import { until } from "../editor/until.js";
import { openCopy, untilShown } from "./descriptions.js";

describe("the command that restarts the server", () => {
  it("leaves a server that answers as before", async () => {
    const document = await openCopy("peroxide.raterun", "restarted.raterun");
    await untilShown(document, []);
    let cleared = false;
    const watching = languages.onDidChangeDiagnostics(() => {
      cleared = true;
    });
    await commands.executeCommand("ratewright.restartServer");
    const edit = new WorkspaceEdit();
    edit.insert(document.uri, new Position(document.lineCount - 1, 0), "nosuchword");
    assert.ok(await workspace.applyEdit(edit));
    await untilShown(document, [`word-unknown ${document.lineCount}`]);
    await until("diagnostics changed", () => cleared);
    watching.dispose();
  });

  it("works twice in a row", async () => {
    await commands.executeCommand("ratewright.restartServer");
    await commands.executeCommand("ratewright.restartServer");
    const document = await openCopy("peroxide.raterun", "restarted-twice.raterun", (text) =>
      text.replace("run A", "rn A"),
    );
    await until("a diagnostic", () => languages.getDiagnostics(document.uri).length > 0);
  });
});
