import assert from "node:assert/strict";
import { commands, extensions, languages, Uri, workspace } from "vscode";
import { until } from "../editor/until.js";

describe("the extension", () => {
  it("starts when a description is opened, and knows it by its language", async () => {
    const extension = extensions.getExtension("ratewright.ratewright");
    assert.ok(extension, "the editor does not know the extension ratewright.ratewright");
    const folder = workspace.workspaceFolders?.[0];
    assert.ok(folder, "no folder is open");
    // Read, not searched: the editor's search needs a native program that the test editor lacks.
    const names = (await workspace.fs.readDirectory(folder.uri)).map(([name]) => name);
    const first = names.sort().find((name) => name.endsWith(".raterun"));
    assert.ok(first, "the opened folder holds no description");
    const description = await workspace.openTextDocument(Uri.joinPath(folder.uri, first));
    assert.equal(description.languageId, "raterun");
    await until("the extension is active", () => extension.isActive);
  });

  it("offers only commands under its own name", async () => {
    const extension = extensions.getExtension("ratewright.ratewright");
    const declared: { command: string }[] = extension?.packageJSON.contributes?.commands ?? [];
    const known = new Set(await commands.getCommands(true));
    for (const { command } of declared) {
      assert.match(command, /^ratewright\./);
      assert.ok(known.has(command), `${command} is declared but nobody carries it out`);
    }
    assert.ok((await languages.getLanguages()).includes("raterun"));
  });
});
