import assert from "node:assert/strict";
import { commands, type Hover, type MarkdownString, type TextDocument } from "vscode";
import { commandLine, openDescription } from "./descriptions.js";

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

  it("are none where no column is meant", async () => {
    const document = await openDescription("peroxide.raterun");
    assert.equal(await hoverAt(document, "temperature"), "");
  });
});
