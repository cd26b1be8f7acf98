import assert from "node:assert/strict";
import type {
  DocumentLink,
  DocumentSymbol,
  FoldingRange,
  SemanticTokens,
  WorkspaceSymbol,
} from "vscode-languageserver/node";
import { type EditorClient, folder, startEditorClient } from "./editorClient.js";

const text = `ratewright 1
# µ · ₂ invented,
# in two lines
reaction  2 H2O2(aq) → 2 H2O(l) + O2(g)

run A "µ · ₂ 𝒌"
  taken  H2O2  0.100 mol·L⁻¹ ± 2 %  as inert # µ
  data   "dätä/a b.csv"
    column min "t / min" min
  follow H2O2 as concentration from min
  fit    order 1 in H2O2
    window 0 min to 5 min

series all "over the week"
  across A, "more/*.raterun", "more/b.raterun:B"
`;

describe("a description seen as a whole", () => {
  let client: EditorClient;
  const start = async (options = {}): Promise<void> => {
    client = await startEditorClient({
      files: { "more/b.raterun": 'run B\n  data "b.csv"\n    column gas 2 mL\n' },
      ...options,
    });
    await client.open("a.raterun", text);
  };
  afterEach(() => client.end());

  it("has an outline", async () => {
    await start();
    const names = (symbols: readonly DocumentSymbol[], depth = 0): string[] =>
      symbols.flatMap(({ name, detail, range, children }) => [
        `${" ".repeat(depth)}${name}${detail === undefined ? "" : ` | ${detail}`} | ${range.start.line + 1}-${range.end.line + 1}`,
        ...names(children ?? [], depth + 1),
      ]);
    const symbols = await client.ask<DocumentSymbol[]>("textDocument/documentSymbol", "a.raterun");
    assert.deepEqual(names(symbols), [
      "reaction 2 H2O2(aq) → 2 H2O(l) + O2(g) | 4-4",
      "run A | µ · ₂ 𝒌 | 6-12",
      ' data "dätä/a b.csv" | 8-9',
      "  column min | t / min | 9-9",
      " follow H2O2 as concentration from min | 10-10",
      " fit order 1 in H2O2 | 11-12",
      "series all | over the week | 14-15",
    ]);
    const [, run] = symbols;
    assert.deepEqual(run?.selectionRange, { start: { line: 5, character: 4 }, end: { line: 5, character: 5 } });
  });

  it("folds headers with their lines and comments of several lines", async () => {
    await start();
    const folds = await client.ask<FoldingRange[]>("textDocument/foldingRange", "a.raterun");
    const shown = folds.map(({ startLine, endLine, kind }) => `${startLine + 1}-${endLine + 1} ${kind ?? ""}`.trim());
    assert.deepEqual(shown, ["6-12", "8-9", "11-12", "14-15", "2-3 comment"]);
  });

  it("links paths to their files, patterns not", async () => {
    await start();
    const links = await client.ask<DocumentLink[]>("textDocument/documentLink", "a.raterun");
    assert.deepEqual(
      links.map(({ range, target }) => [range, target]),
      [
        [client.place("a.raterun", "dätä/a b.csv"), `${folder}/d%C3%A4t%C3%A4/a%20b.csv`],
        [client.place("a.raterun", "more/b.raterun"), `${folder}/more/b.raterun`],
      ],
    );
  });

  it("links nothing outside the folder that is not trusted", async () => {
    await start({ trusted: false });
    await client.edit("a.raterun", "dätä/a b.csv", "../elsewhere/a.csv");
    const links = await client.ask<DocumentLink[]>("textDocument/documentLink", "a.raterun");
    assert.deepEqual(
      links.map(({ target }) => target),
      [`${folder}/more/b.raterun`],
    );
  });

  it("finds names in all descriptions of the folder, open or not", async () => {
    await start();
    const find = async (query: string): Promise<string[]> => {
      const found: WorkspaceSymbol[] = await client.connection.sendRequest("workspace/symbol", { query });
      return found.map(
        ({ name, containerName, location }) => `${name} | ${containerName} | ${location.uri.slice(folder.length + 1)}`,
      );
    };
    assert.deepEqual(await find("run"), ["run A | a.raterun | a.raterun", "run B | more/b.raterun | more/b.raterun"]);
    assert.deepEqual(await find("gas"), ["column gas | more/b.raterun · run B | more/b.raterun"]);
    assert.deepEqual(await find("nowhere"), []);
  });

  it("colours each word by what it means, whatever it is called", async () => {
    await start();
    const { data } = await client.ask<SemanticTokens>("textDocument/semanticTokens/full", "a.raterun");
    const types = "keyword connective class variable species number unit string operator comment".split(" ");
    const lines = text.split("\n");
    const shown: string[] = [];
    let [line, start0] = [0, 0];
    for (let at = 0; at < data.length; at += 5) {
      const [down = 0, right = 0, length = 0, type = 0, modifier = 0] = data.slice(at, at + 5);
      line += down;
      start0 = down > 0 ? right : start0 + right;
      const word = lines[line]?.slice(start0, start0 + length);
      shown.push(`${line + 1} ${types[type]}${modifier > 0 ? "!" : ""} ${word}`);
    }
    const on = (number: number) =>
      shown.filter((one) => one.startsWith(`${number} `)).map((one) => one.replace(/^\d+ /, ""));
    assert.deepEqual(on(4), [
      "keyword reaction",
      "number 2",
      "species H2O2(aq)",
      "operator →",
      "number 2",
      "species H2O(l)",
      "operator +",
      "species O2(g)",
    ]);
    assert.deepEqual(on(6), ["keyword run", "class! A", 'string "µ · ₂ 𝒌"']);
    assert.deepEqual(on(7), [
      "keyword taken",
      "species H2O2",
      "number 0.100",
      "unit mol·L⁻¹",
      "operator ±",
      "number 2",
      "unit %",
      "connective as",
      "connective inert",
      "comment # µ",
    ]);
    assert.deepEqual(on(9), ["keyword column", "variable! min", 'string "t / min"', "unit min"]);
    assert.deepEqual(on(10), [
      "keyword follow",
      "species H2O2",
      "connective as",
      "connective concentration",
      "connective from",
      "variable min",
    ]);
    assert.deepEqual(on(11), ["keyword fit", "connective order", "number 1", "connective in", "species H2O2"]);
    assert.deepEqual(on(15), [
      "keyword across",
      "class A",
      "operator ,",
      'string "more/*.raterun"',
      "operator ,",
      'string "more/b.raterun:B"',
    ]);
    const range = { start: { line: 8, character: 0 }, end: { line: 9, character: 0 } };
    const part = await client.ask<SemanticTokens>("textDocument/semanticTokens/range", "a.raterun", undefined, {
      range,
    });
    assert.equal(part.data.length, 4 * 5);
    assert.equal(part.data[0], 8);
  });
});
