import assert from "node:assert/strict";
import { commands, type Hover, type MarkdownString, type TextDocument, Uri, window, workspace } from "vscode";
import { until } from "../editor/until.js";
import { commandLine, folder, openDescription } from "./descriptions.js";

/** What the editor shows on resting at a stretch of text, as it reads: without the backslashes of Markdown. */
async function hoverAt(document: TextDocument, words: string): Promise<string> {
  const position = document.positionAt(document.getText().indexOf(words));
  const hovers = await commands.executeCommand<Hover[]>("vscode.executeHoverProvider", document.uri, position);
  const parts = hovers.flatMap(({ contents }) => contents as MarkdownString[]);
  return parts.map(({ value }) => value.replace(/\\(?=[^\w\s])/g, "")).join("\n");
}

describe("hovers in the real editor", () => {
  for (const [name, column] of [
    ["peroxide.raterun", "column     c"],
    ["ester.raterun", "column     left"],
  ] as const) {
    it(`show at the column of ${name} k of every fit, as the report prints it, in the order of the text`, async () => {
      const document = await openDescription(name);
      const text = await hoverAt(document, column);
      const fits = commandLine("report", name).runs.flatMap(({ fits }) => fits);
      const printed = fits.map(({ parameters }) => parameters["k"]?.text ?? "no k");
      assert.ok(printed.length >= 2);
      const places = printed.map((k) => text.indexOf(k));
      assert.ok(!places.includes(-1), `${printed.join(" | ")} not all in:\n${text.replace(/\(data:[^)]*\)/g, "(…)")}`);
      assert.match(text, /!\[[^\]]*\]\(data:image\/svg\+xml/);
    });
  }

  it("tell of keywords, quantities and formulas what they mean, and nothing of a path", async () => {
    const document = await openDescription("peroxide.raterun");
    assert.match(await hoverAt(document, "temperature"), /temperature of the reacting mixture/);
    assert.match(await hoverAt(document, "25.0(1)"), /298\.15\(10\) K/);
    assert.match(await hoverAt(document, "KI "), /molar mass 165\.99\d*\(\d+\) g/);
    assert.equal(await hoverAt(document, "data/peroxide-a"), "");
  });

  it("are the same over the header cell of the column in its data file", async () => {
    const description = await openDescription("peroxide.raterun");
    const expected = await hoverAt(description, "column     c");
    const data = await workspace.openTextDocument(Uri.joinPath(folder(), "data", "peroxide-a.csv"));
    await window.showTextDocument(data);
    // Run B has a file of its own: over the header of A's file stands A alone.
    await until("the hover of the header", async () => (await hoverAt(data, "c(H2O2)")).length > 0);
    const [first] = expected.split("\n\n---\n\n");
    assert.equal(await hoverAt(data, "c(H2O2)"), first);
    assert.equal(await hoverAt(data, "\n"), "");
  });
});
