import assert from "node:assert/strict";
import {
  type CompletionList,
  commands,
  type DocumentLink,
  type DocumentSymbol,
  type FoldingRange,
  type InlayHint,
  type Location,
  Range,
  type SemanticTokens,
  type SymbolInformation,
  type TextDocument,
  Uri,
  type WorkspaceEdit,
  workspace,
} from "vscode";
import { until } from "../editor/until.js";
import { folder, openCopy, openDescription, untilShown } from "./descriptions.js";

const run = commands.executeCommand;

function placeOf(document: TextDocument, words: string, more = 0) {
  const offset = document.getText().indexOf(words);
  assert.ok(offset >= 0, words);
  return document.positionAt(offset + more);
}

describe("finding one's way in the real editor", () => {
  it("leads from a column to its line, and from there into the data file", async () => {
    const document = await openDescription("peroxide.raterun");
    const [line] = await run<Location[]>(
      "vscode.executeDefinitionProvider",
      document.uri,
      placeOf(document, "from c\n", 5),
    );
    assert.equal(document.getText(line?.range), "c");
    const header = placeOf(document, '"c(H2O2)', 2);
    const found = await run<Location[]>("vscode.executeDefinitionProvider", document.uri, header);
    const files = found.map(({ uri }) => uri.path.split("/").at(-1));
    assert.deepEqual(files, ["peroxide-a.csv", "peroxide-b.csv"]);
    const data = await workspace.openTextDocument(found[0]?.uri ?? Uri.joinPath(folder(), "none"));
    assert.equal(data.getText(found[0]?.range), "c(H2O2) / mol L^-1");
  });

  it("knows references, outline, folding, links, colours and symbols of the folder", async () => {
    const document = await openDescription("peroxide.raterun");
    const references = await run<Location[]>(
      "vscode.executeReferenceProvider",
      document.uri,
      placeOf(document, "run A", 4),
    );
    assert.deepEqual(
      references.map(({ range }) => document.lineAt(range.start).text.slice(0, 12)),
      ['run A "0.050', "run B like A"],
    );
    const symbols = await run<DocumentSymbol[]>("vscode.executeDocumentSymbolProvider", document.uri);
    assert.deepEqual(
      symbols.map(({ name }) => name.split(" ").slice(0, 2).join(" ")),
      ["reaction 2", "run A", "run B"],
    );
    const folds = await run<FoldingRange[]>("vscode.executeFoldingRangeProvider", document.uri);
    assert.ok(folds.length >= 3);
    const links = await run<DocumentLink[]>("vscode.executeLinkProvider", document.uri);
    assert.deepEqual(
      links.map(({ range }) => document.getText(range)),
      ["data/peroxide-a.csv", "data/peroxide-b.csv"],
    );
    const tokens = await run<SemanticTokens>("vscode.provideDocumentSemanticTokens", document.uri);
    assert.ok(tokens.data.length > 5 * 60);
    const all = await run<SymbolInformation[]>("vscode.executeWorkspaceSymbolProvider", "run A");
    const files = new Set(all.map(({ location }) => location.uri.path.split("/").at(-1)));
    assert.ok(files.has("ester.raterun") && files.has("gas.raterun"), [...files].join(" "));
  });

  it("renames a column everywhere, and nothing is wrong afterwards", async () => {
    const document = await openCopy("peroxide.raterun", "renamed µ₂.raterun");
    await untilShown(document, []);
    const edit = await run<WorkspaceEdit>(
      "vscode.executeDocumentRenameProvider",
      document.uri,
      placeOf(document, "from c\n", 5),
      "left₂",
    );
    await workspace.applyEdit(edit);
    assert.match(document.getText(), /column {5}left₂ {2}"c\(H2O2\)/);
    assert.match(document.getText(), /concentration from left₂$/m);
    await untilShown(document, []);
    await assert.rejects(
      async () => run("vscode.executeDocumentRenameProvider", document.uri, placeOf(document, "from left₂", 5), "t"),
      /already a column t/,
    );
  });

  it("offers headers of the data file, paths, units and lines with places to fill in", async () => {
    const document = await openCopy("peroxide.raterun", "completed.raterun", (text) =>
      text.replace("    column     t  ", '    column u ""\n    column     t  ').replace("250.0 mL", "250.0 "),
    );
    const offered = async (words: string, more: number): Promise<string[]> => {
      const place = placeOf(document, words, more);
      const { items } = await run<CompletionList>("vscode.executeCompletionItemProvider", document.uri, place);
      return items.map(({ label }) => (typeof label === "string" ? label : label.label));
    };
    const headers = await offered('column u ""', 10);
    assert.ok(headers.includes("c(H2O2) / mol L^-1"), headers.join(" "));
    const files = await offered('"data/peroxide-b', 6);
    assert.ok(files.includes("peroxide-a.csv") && files.includes("gas.csv"), files.join(" "));
    assert.deepEqual((await offered("250.0 ", 6)).slice(0, 2), ["mL", "L"]);
    const lines = await offered("  rate         initial", 2);
    assert.ok(lines.includes("follow"), lines.join(" "));
  });

  it("shows k behind its fit, and not where hints are switched off", async () => {
    const document = await openDescription("peroxide.raterun");
    const whole = new Range(0, 0, document.lineCount, 0);
    const hints = async (): Promise<string[]> => {
      const found = await run<InlayHint[]>("vscode.executeInlayHintProvider", document.uri, whole);
      return found.map(({ label }) => (typeof label === "string" ? label : label.map(({ value }) => value).join("")));
    };
    await until("the hint of k", async () => (await hints()).some((hint) => /^k = /.test(hint)));
    const settings = workspace.getConfiguration("ratewright.inlayHints");
    await settings.update("enabled", false);
    try {
      await until("no hints", async () => (await hints()).length === 0);
    } finally {
      await settings.update("enabled", undefined);
    }
  });
});
