import assert from "node:assert/strict";
import { type CodeAction, commands, Position, Range, Uri, WorkspaceEdit, workspace } from "vscode";
import { commandLine, folder, openCopy, openDescription, shownCodes, untilShown } from "./descriptions.js";

/** The mistakes planted in samples/planted.raterun and in its data file, as its comment promises: code and line. */
const planted = [
  "unbalanced 4",
  "word-unknown 8",
  "coulomb-for-celsius 9",
  "data-cell-empty 13",
  "data-cell-word 13",
  "rate-outside-readings 15",
];

describe("diagnostics in the real editor", () => {
  for (const name of ["peroxide.raterun", "ester.raterun", "planted.raterun"]) {
    it(`are for ${name} those of the command line, word for word, and no others`, async () => {
      const document = await openDescription(name);
      const { diagnostics } = commandLine("check", name);
      await untilShown(
        document,
        diagnostics.map(({ code, line }) => `${code} ${line}`),
      );
    });
  }

  it("are for the sample of planted mistakes exactly these", async () => {
    await untilShown(await openDescription("planted.raterun"), planted);
  });

  it("go when the quick fix balances the reaction; the others stay", async () => {
    const document = await openCopy("planted.raterun", "fixed.raterun");
    await untilShown(document, planted);
    const at = new Range(new Position(3, 12), new Position(3, 12));
    const actions = await commands.executeCommand<CodeAction[]>("vscode.executeCodeActionProvider", document.uri, at);
    const fix = actions.find(({ isPreferred }) => isPreferred);
    assert.ok(fix?.edit, `no preferred fix among ${actions.map(({ title }) => title).join(", ")}`);
    assert.ok(await workspace.applyEdit(fix.edit));
    assert.equal(document.lineAt(3).text, "reaction  2 H2O2(aq) -> 2 H2O(l) + O2(g)");
    await untilShown(
      document,
      planted.filter((code) => !code.startsWith("unbalanced")),
    );
  });

  it("stand still while a second mistake is typed elsewhere", async () => {
    const document = await openCopy("planted.raterun", "second.raterun");
    await untilShown(document, planted);
    const gaps: string[] = [];
    const watch = setInterval(() => {
      const missing = planted.filter((code) => !shownCodes(document).includes(code));
      if (missing.length > 0) gaps.push(missing.join(", "));
    }, 5);
    try {
      const last = document.lineCount - 1;
      for (const [index, letter] of [..."nosuchword"].entries()) {
        const typing = new WorkspaceEdit();
        typing.insert(document.uri, new Position(last, index), letter);
        await workspace.applyEdit(typing);
        await new Promise((done) => setTimeout(done, 40));
      }
      await untilShown(document, [...planted, `word-unknown ${last + 1}`]);
      // Once more after the pause, when data and fits have been worked out too.
      await new Promise((done) => setTimeout(done, 600));
    } finally {
      clearInterval(watch);
    }
    assert.deepEqual(gaps, []);
  });

  it("come back after the data file is put right on disk", async () => {
    const document = await openCopy("peroxide.raterun", "watched.raterun", (text) =>
      text.replaceAll("data/peroxide-a.csv", "watched.csv").replace(/\nrun B[\s\S]*/, "\n"),
    );
    await untilShown(document, ["data-missing 13"]);
    const from = Uri.joinPath(folder(), "data", "peroxide-a.csv");
    await workspace.fs.copy(from, Uri.joinPath(folder(), "watched.csv"));
    await untilShown(document, []);
  });
});
