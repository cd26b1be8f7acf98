import assert from "node:assert/strict";
import type { Hover, Location, MarkupContent, Range } from "vscode-languageserver/node";
import { decayCsv, decayRun } from "./decay.js";
import { type EditorClient, folder, startEditorClient } from "./editorClient.js";

const text = `species dye
  molar mass 204.2(5) g/mol
species EtOAc is C4H8O2
reaction EtOAc + OH^- -> CH3COO^- + C2H5OH

run A "µ · ₂ 𝒌"
  volume 50.00 mL
  temperature 25.0(1) °C
  taken EtOAc 0.100(2) mol/L giving H^+ # µ · ₂
  taken Na2S2O3 5 mmol purity 98 %
  follow EtOAc as pH from p
  fit order 1 in EtOAc
    window 1 min 30 s to 2 h
`;

const textOf = (hover: Hover | null): string => (hover === null ? "" : (hover.contents as MarkupContent).value);
/** Markdown as it reads. */
const plain = (markdown: string | undefined): string => (markdown ?? "").replace(/\\(?=[^\w\s])/g, "");

describe("resting on a word", () => {
  let client: EditorClient;
  beforeEach(async () => {
    client = await startEditorClient();
    await client.open("a.raterun", text);
  });
  afterEach(() => client.end());
  const at = async (words: string, nth?: number): Promise<string> =>
    plain((await client.hover("a.raterun", words, nth))?.text);

  it("tells of a formula its molar mass, and the ions of a salt", async () => {
    // Sums of abridged standard atomic weights 2021 (IUPAC): 2 x 22.990 + 2 x 32.06 + 3 x 15.999 = 158.097.
    assert.match(
      await at("Na2S2O3"),
      /^\*\*Na₂S₂O₃\*\* · molar mass 158\.09\d*\(\d+\) g·mol⁻¹ · gives 2 Na⁺ and S₂O₃²⁻$/,
    );
    // 15.999 + 1.0080 = 17.007
    assert.match(await at("OH^-"), /^\*\*OH⁻\*\* · hydroxide · molar mass 17\.007\d*\(\d+\) g·mol⁻¹$/);
  });

  it("tells of a declared species its formula, or its stated molar mass", async () => {
    // 4 x 12.011 + 8 x 1.0080 + 2 x 15.999 = 88.106
    assert.match(await at("EtOAc 0.1"), /^\*\*EtOAc\*\* is C₄H₈O₂ · molar mass 88\.10\d*\(\d+\) g·mol⁻¹$/);
    assert.equal(await at("dye"), "**dye** · molar mass 204.20(50) g·mol⁻¹, as stated");
    const range = (await client.hover("a.raterun", "EtOAc 0.1"))?.range;
    assert.deepEqual(range, client.place("a.raterun", "EtOAc", 3));
  });

  it("tells of a quantity its value in other units of its kind, with its uncertainty", async () => {
    assert.equal(await at("25.0(1)"), "**25.00(10) °C** = 298.15(10) K");
    assert.equal(await at("50.00 mL"), "**50 mL** = 0.05 L = 50000 µL = 5e-5 m³");
    assert.equal(await at("mol/L giving"), "**0.1000(20) mol·L⁻¹** = 100.0(20) mmol·L⁻¹ = 1.000(20)e5 µmol·L⁻¹");
    assert.match(await at("2 h"), /^\*\*2 h\*\* = 7200 s = 120 min/);
  });

  it("tells of a keyword what its line does, with an example, and what waits to be computed with", async () => {
    assert.match(
      await at("volume"),
      /^\*\*volume\*\* · The volume of the reacting mixture\.\n\n```raterun\nvolume 50\.00 mL within 0\.05 mL\n```$/,
    );
    assert.match(await at("as pH"), /^\*\*follow\*\* · Which species was followed/);
    assert.match(await at("molar"), /^\*\*molar\*\*/);
  });

  it("tells nothing of comments, texts and gaps", async () => {
    assert.equal(await client.hover("a.raterun", "# µ"), null);
    assert.equal(await client.hover("a.raterun", '"µ · ₂'), null);
    assert.equal(await client.hover("a.raterun", " EtOAc + "), null);
  });
});

describe("the header of a data file", () => {
  let client: EditorClient;
  const header = "µ₂ 𝒌 / mol L^-1";
  const csv = `invented\n\n${decayCsv().replace("time / s,c / mol L^-1", `"time / s",${header}`)}`;
  const balanced = decayRun
    .replace("H2O2(aq) -> H2O(l)", "2 H2O2(aq) -> 2 H2O(l)")
    .replace('"c / mol L^-1"', `"${header}"`);
  beforeEach(async () => {
    client = await startEditorClient({ files: { "data/a.csv": csv, "data/other.csv": csv } });
    await client.open("a.raterun", balanced);
    await client.settled("a.raterun");
  });
  afterEach(() => client.end());
  const rest = (path: string, line: number, character: number): Promise<Hover | null> =>
    client.connection.sendRequest("textDocument/hover", {
      textDocument: { uri: `${folder}/${path}` },
      position: { line, character },
    });
  const columns = csv.split("\n").findIndex((line) => line.includes(header));

  it("shows the same as the column in the description, and only over its own cell", async () => {
    const start = (csv.split("\n")[columns] ?? "").indexOf(header);
    const there = await rest("data/a.csv", columns, start + 3);
    const here = await client.hover("a.raterun", "column c");
    assert.equal(textOf(there), here?.text);
    const range: Range = {
      start: { line: columns, character: start },
      end: { line: columns, character: start + header.length },
    };
    assert.deepEqual(there?.range, range);
    assert.match(textOf(await rest("data/a.csv", columns, 2)), /\*\*t\*\* · time/);
    assert.equal(await rest("data/a.csv", columns + 1, 2), null);
    assert.equal(await rest("data/other.csv", columns, start + 3), null);
  });

  it("asks the editor for hovers in the files that are used, by their names", async () => {
    const asked = client.registered.filter(({ method }) => method === "textDocument/hover");
    assert.deepEqual(
      asked.map(({ registerOptions }) => registerOptions),
      [{ documentSelector: [{ scheme: "file", pattern: "**/a.csv" }] }],
    );
    await client.edit("a.raterun", "data/a.csv", "data/o[1].csv");
    await client.settled("a.raterun");
    const last = client.registered.findLast(({ method }) => method === "textDocument/hover");
    assert.deepEqual(last?.registerOptions, {
      documentSelector: [{ scheme: "file", pattern: "**/o[[]1[]].csv" }],
    });
  });

  it("is where a column line leads to", async () => {
    const start = (csv.split("\n")[columns] ?? "").indexOf(header);
    const range: Range = {
      start: { line: columns, character: start },
      end: { line: columns, character: start + header.length },
    };
    const expected = [{ uri: `${folder}/data/a.csv`, range }];
    assert.deepEqual(await client.ask<Location[]>("textDocument/definition", "a.raterun", `"${header}`), expected);
    assert.deepEqual(await client.ask<Location[]>("textDocument/definition", "a.raterun", 'c "µ'), expected);
  });
});
