import assert from "node:assert/strict";
import type { DocumentHighlight, Location, Range, WorkspaceEdit } from "vscode-languageserver/node";
import { decayCsv } from "./decay.js";
import { type EditorClient, folder, startEditorClient } from "./editorClient.js";

/** Invented; what stands before the names on their lines is two bytes or more in UTF-8, one unit or two in UTF-16. */
const text = `species   ester₂ is C4H8O2
reaction  ester₂(aq) + OH^- -> CH3COO^- + C2H5OH
calibration line of ester₂
  slope 1.0 L/mol

run A "µ · ₂ 𝒌"
  volume 50 mL
  temperature 25 °C
  taken ester₂ 0.1 mol/L
  taken NaOH 0.5 mol/L
  data "data/a.csv"
    column t "time / s"
    column c "c / mol L^-1"
  follow ester₂ as concentration from c # µ · ₂ c
  fit order 1 in ester₂ using c

run B like A
  taken NaOH 0.4 mol/L

run C
  volume 50 mL
  data "data/a.csv"
    column c "c / mol L^-1"
  follow ester₂ as concentration from c

series both
  across A, B
`;

const other = `series far
  across "a.raterun:A", "a.raterun:B"
`;

/** The range of the first letter alone. */
const firstOf = ({ start }: Range): Range => ({ start, end: { ...start, character: start.character + 1 } });
const line = ({ start }: Range): number => start.line + 1;

describe("names and their places", () => {
  let client: EditorClient;
  const start = async (words = text): Promise<void> => {
    client = await startEditorClient({ files: { "data/a.csv": decayCsv(), "other.raterun": other } });
    await client.open("a.raterun", words);
  };
  afterEach(() => client.end());

  const definition = async (words: string, nth?: number): Promise<Range[]> => {
    const found = await client.ask<Location[]>("textDocument/definition", "a.raterun", words, nth ? { nth } : {});
    return found.map(({ range }) => range);
  };
  const rename = (words: string, newName: string): Promise<WorkspaceEdit | null> =>
    client.ask("textDocument/rename", "a.raterun", words, { newName });
  const refused = async (words: string, newName: string): Promise<string> => {
    const answer = rename(words, newName);
    return answer.then(
      () => assert.fail(`${words} was renamed to ${newName}`),
      (error: Error) => error.message,
    );
  };
  /** The text after the edits of a rename, of one document. */
  const renamed = (edit: WorkspaceEdit | null, path = "a.raterun"): string => {
    const parts = edit?.documentChanges?.flatMap((part) => ("edits" in part ? [part] : [])) ?? [];
    const edits = parts
      .filter(({ textDocument }) => textDocument.uri === `${folder}/${path}`)
      .flatMap((part) => part.edits);
    const lines = (path === "a.raterun" ? client.text(path) : (client.files.get(`${folder}/${path}`) ?? "")).split(
      "\n",
    );
    for (const one of edits.toReversed()) {
      assert.ok("newText" in one);
      const { range, newText } = one;
      const before = lines[range.start.line] ?? "";
      lines[range.start.line] = before.slice(0, range.start.character) + newText + before.slice(range.end.character);
    }
    return lines.join("\n");
  };

  it("a column leads to its line, in its own run", async () => {
    await start();
    assert.deepEqual(await definition("c # µ"), [firstOf(client.place("a.raterun", 'c "c / mol'))]);
    assert.deepEqual((await definition("c\n\nseries")).map(line), [23]);
  });

  it("runs, species and calibrations lead to their lines, a formula to the reaction", async () => {
    await start();
    assert.deepEqual(await definition("A\n  taken NaOH 0.4"), [firstOf(client.place("a.raterun", 'A "µ'))]);
    assert.deepEqual(await definition("ester₂ using"), [client.place("a.raterun", "ester₂")]);
    assert.deepEqual((await definition("NaOH 0.4")).map(line), [10]);
    assert.deepEqual((await definition("OH^-")).map(line), [2]);
    assert.deepEqual(await definition("volume"), []);
  });

  it("a run of another description leads there", async () => {
    await start();
    await client.open("other.raterun", other);
    const [found] = await client.ask<Location[]>("textDocument/definition", "other.raterun", "a.raterun:A");
    assert.equal(found?.uri, `${folder}/a.raterun`);
    assert.deepEqual(found?.range, firstOf(client.place("a.raterun", 'A "µ')));
  });

  it("references are all places of the thing and no others", async () => {
    await start();
    const context = { includeDeclaration: true };
    const places = async (words: string, more = {}) => {
      const found = await client.ask<Location[]>("textDocument/references", "a.raterun", words, { context, ...more });
      return found.map(({ uri, range }) => `${uri.slice(folder.length + 1)} ${line(range)}`);
    };
    assert.deepEqual(await places("c # µ"), ["a.raterun 13", "a.raterun 14", "a.raterun 15"]);
    assert.deepEqual(
      await places("ester₂"),
      [1, 2, 3, 9, 14, 15, 24].map((number) => `a.raterun ${number}`),
    );
    assert.deepEqual(await places('A "µ'), ["a.raterun 6", "a.raterun 17", "a.raterun 27", "other.raterun 2"]);
    const bare = { context: { includeDeclaration: false } };
    assert.deepEqual(await places("c # µ", bare), ["a.raterun 14", "a.raterun 15"]);
    const marks = await client.ask<DocumentHighlight[]>("textDocument/documentHighlight", "a.raterun", "c # µ");
    assert.deepEqual(
      marks.map(({ range, kind }) => [line(range), kind]),
      [
        [13, 3],
        [14, 2],
        [15, 2],
      ],
    );
  });

  it("a column is renamed in the runs that share it, and only there", async () => {
    await start();
    const changed = renamed(await rename("c # µ", "left′"));
    const expected = text
      .replace('column c "c / mol L^-1"\n  follow', 'column left′ "c / mol L^-1"\n  follow')
      .replace("from c # µ", "from left′ # µ")
      .replace("using c", "using left′");
    assert.equal(changed, expected);
  });

  it("a species, a run (in other descriptions too), a calibration and a series are renamed", async () => {
    await start();
    assert.equal(renamed(await rename("ester₂ using", "EtOAc")), text.replaceAll("ester₂", "EtOAc"));
    const edit = await rename('A "µ', "first");
    assert.equal(
      renamed(edit),
      text.replace("run A", "run first").replace("like A", "like first").replace("across A", "across first"),
    );
    assert.equal(renamed(edit, "other.raterun"), other.replace("a.raterun:A", "a.raterun:first"));
    assert.equal(renamed(await rename("line of", "slopes")), text.replace("line of", "slopes of"));
    assert.equal(renamed(await rename("both", "all")), text.replace("both", "all"));
  });

  it("says before the typing what is renamed, and of a formula that it cannot be", async () => {
    await start();
    const prepare = (words: string) => client.ask("textDocument/prepareRename", "a.raterun", words);
    const range = client.place("a.raterun", "ester₂ using c");
    const whole = { start: range.start, end: { ...range.start, character: range.start.character + 6 } };
    assert.deepEqual(await prepare("ester₂ using"), { range: whole, placeholder: "ester₂" });
    assert.equal(await prepare("volume"), null);
    await assert.rejects(() => prepare("C2H5OH"), /C2H5OH is a formula, not a name.*species NAME is C2H5OH/); // rename-formula
  });

  it("refuses names that are malformed, connecting words, taken, or change the meaning", async () => {
    await start();
    assert.match(await refused("c # µ", "c 2"), /“c 2” cannot be the name of a column/);
    assert.match(await refused("c # µ", "from"), /“from” cannot be the name/);
    assert.match(await refused("c # µ", ""), /cannot be the name/);
    assert.match(await refused("c # µ", "t"), /There is already a column t, on line 12/);
    assert.match(await refused('A "µ', "C"), /There is already a run C, on line 20/);
    assert.match(await refused("ester₂ using", "C2H5OH"), /There is already a species C2H5OH, on line 2/);
    // A name of digits is no species: rename-changes.
    assert.match(await refused("ester₂ using", "7"), /With the name “7” the description would say something else/);
    assert.equal(renamed(await rename("c # µ", "c2")).includes("from c2 # µ"), true);
  });

  it("refuses while a line with a mistake holds the name too, and not while it cannot mean it", async () => {
    await start(text.replace("fit order 1 in ester₂ using c", "fit order one in ester₂ using c"));
    // rename-unsure
    assert.match(await refused("c # µ", "left"), /^Line 15 has a mistake and holds “c” too/);
    await client.edit("a.raterun", "fit order one in ester₂ using c", "volume c c");
    assert.ok(renamed(await rename("c # µ", "left")).includes("from left # µ"));
  });
});
