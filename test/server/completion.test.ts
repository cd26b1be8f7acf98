import assert from "node:assert/strict";
import type { CompletionItem, CompletionList, TextEdit } from "vscode-languageserver/node";
import { decayCsv } from "./decay.js";
import { type ClientOptions, type EditorClient, startEditorClient } from "./editorClient.js";

/** `|` marks the place. */
const above = `species dye is C16H18N3S^+
reaction 2 H2O2(aq) -> 2 H2O(l) + O2(g)
calibration line of dye
  slope 1.0 L/mol

run A "µ · ₂ 𝒌"
  taken H2O2 0.1 mol/L # µ · ₂
  data "data/a.csv"
    column t "time / s"
    column gas "V / mL" mL
`;

const files = {
  "data/a.csv": decayCsv(),
  "data/deep/b.csv": "t,µ₂ (mL)\n0,1\n1,2\n",
  "data/notes.docx": "",
  "other.raterun": "run X\n",
  ".hidden.csv": "",
};

describe("completion", () => {
  const list = async (text: string, options: ClientOptions = {}): Promise<CompletionItem[]> => {
    const client: EditorClient = await startEditorClient({ files, ...options });
    await client.open("a.raterun", text.replace("|", ""));
    const offset = text.indexOf("|");
    const lines = text.slice(0, offset).split("\n");
    const position = { line: lines.length - 1, character: (lines.at(-1) ?? "").length };
    const { items } = await client.ask<CompletionList>("textDocument/completion", "a.raterun", undefined, { position });
    await client.end();
    return items.sort((a, b) => ((a.sortText ?? a.label) < (b.sortText ?? b.label) ? -1 : 1));
  };
  const labels = async (line: string, rest = ""): Promise<string[]> =>
    (await list(`${above}${line}${rest}`)).map(({ label }) => label);
  const textOf = (item: CompletionItem | undefined): string =>
    item === undefined ? "" : (item.textEdit as TextEdit).newText.replaceAll("${", "<");
  /** The line after taking the item. */
  const taken = async (line: string, label: string): Promise<string> => {
    const item = (await list(above + line)).find((one) => one.label === label);
    assert.ok(item, `${label} is not offered`);
    const { range } = item.textEdit as TextEdit;
    const bare = line.replace("|", "");
    assert.equal(range.start.line, above.split("\n").length - 1);
    return bare.slice(0, range.start.character) + textOf(item) + bare.slice(range.end.character);
  };

  it("offers the lines allowed here, those of the innermost header first, headers first at the margin", async () => {
    const inside = await labels("    |");
    assert.deepEqual(inside.slice(0, 2), ["random", "common"]);
    assert.ok(
      inside.includes("column") && inside.includes("volume") && inside.includes("fit") && inside.includes("run"),
    );
    // `data` stands already; `window` belongs to a fit, `standard` to a calibration, `ratewright` to the first line.
    assert.deepEqual(
      inside.filter((one) => ["data", "window", "standard", "ratewright"].includes(one)),
      [],
    );
    const margin = await labels("|");
    assert.ok(margin.indexOf("run") < margin.indexOf("random"), margin.join(" "));
    assert.ok(margin.indexOf("series") < margin.indexOf("volume"));
    assert.deepEqual((await labels("  fit order 1 in H2O2\n    win|")).slice(0, 3), ["window", "start", "infinity"]);
  });

  it("gives a line with its example to fill in, what is known in place of the example's", async () => {
    const [follow] = (await list(`${above}  fol|`)).filter(({ label }) => label === "follow");
    assert.equal(follow?.insertTextFormat, 2);
    assert.equal(
      textOf(follow),
      "follow <1:H2O2} as <2|concentration,mass loss,gas volume,gas pressure,conductivity,pH,pH-stat,absorbance,optical rotation,titration,signal|} from <3:gas}",
    );
    assert.equal(follow?.detail, "follow H2O2 as concentration from c");
    assert.match(JSON.stringify(follow?.documentation), /Which species was followed/);
    assert.match(await taken("  |", "data").catch(String), /is not offered/);
    assert.equal(await taken("  te|", "temperature"), "  temperature <1:25.0(1) °C}");
    assert.equal(await taken("|", "run"), 'run <1:A} "<2:0.050 M iodide, 25 °C}"');
  });

  it("gives the bare word to an editor without places to fill in, and where the line goes on", async () => {
    const [bare] = (await list(`${above}  fol|`, { snippets: false })).filter(({ label }) => label === "follow");
    assert.equal(textOf(bare), "follow");
    assert.equal(await taken("  temp| 25 °C", "temperature"), "  temperature 25 °C");
  });

  it("knows the species of the reaction and the declared ones, also in an equation", async () => {
    assert.deepEqual(await labels("  taken |"), ["H2O2", "H2O", "O2", "dye"]);
    assert.deepEqual(await labels("  fit order 1 in |"), ["H2O2", "H2O", "O2", "dye"]);
    assert.deepEqual(await labels("  follow O|"), ["H2O2", "H2O", "O2", "dye"]);
    assert.deepEqual(await labels("reaction 2 H2O2 -> |"), ["H2O2", "H2O", "O2", "dye"]);
    assert.equal(await taken("  taken d|", "dye"), "  taken dye");
  });

  it("knows columns of the run, runs, calibrations and fixed words", async () => {
    assert.deepEqual(await labels("  follow O2 as gas volume from |"), ["t", "gas"]);
    assert.deepEqual(await labels("run B like |"), ["A"]);
    assert.deepEqual(await labels("  follow dye as absorbance from gas\n    calibrated by |"), ["line"]);
    assert.deepEqual(await labels("series s\n  across A, |"), ["A", "other.raterun", "data"]);
    assert.ok((await labels("  follow H2O2 as |")).includes("gas volume"));
    assert.deepEqual(await labels("  taken dye 0.1 mol/L as |"), ["buffer", "catalyst", "inert"]);
    assert.deepEqual(await labels("  fit |"), ["order", "saturation"]);
  });

  it("offers units of the dimension that is wanted, and no others", async () => {
    assert.deepEqual(await labels("  volume 50.00 |"), ["mL", "L", "µL", "m^3", "cm^3"]);
    assert.deepEqual(await labels("  volume 50.00 m|"), ["mL", "L", "µL", "m^3", "cm^3"]);
    assert.deepEqual(await labels("  temperature 25.0(1) |"), ["°C", "K"]);
    assert.deepEqual(await labels("  taken KI 0.5 +/- 0.1 |").then((all) => all.slice(0, 3)), [
      "mol/L",
      "mmol/L",
      "µmol/L",
    ]);
    assert.deepEqual(await labels("  fit order 1 in H2O2\n    window 5 s to 2 |"), ["s", "min", "h", "ms", "d"]);
    assert.deepEqual((await labels("  taken H2O2 5.0 mL of 30 |")).slice(0, 3), ["mol/L", "mmol/L", "µmol/L"]);
    assert.ok((await labels("  taken H2O2 5.0 mL of 30 |")).includes("% by mass"));
    assert.deepEqual((await labels("      random 0.2 |")).slice(0, 2), ["mL", "L"]);
    assert.deepEqual((await labels("results in |")).slice(0, 2), ["mol/L", "mmol/L"]);
    assert.equal(await taken("  volume 50.00 m|", "µL"), "  volume 50.00 µL");
    // µ and its like before the place on the same line
    assert.equal(await taken('  observed "µ · ₂ 𝒌" at 5 |', "min"), '  observed "µ · ₂ 𝒌" at 5 min');
  });

  it("offers nothing for a word that is typed out, so that Enter is a line break", async () => {
    assert.deepEqual(await labels("  volume 50.00 mL|"), []);
    assert.deepEqual(await labels("  follow O2 as gas volume from gas|"), []);
    assert.deepEqual(await labels("  fit order 1 in H2O2\n    robust|"), []);
    assert.deepEqual(await labels("  volume 50 mL # a note |"), []);
    assert.deepEqual(await labels("  volume 50|"), []);
  });

  it("reads the headers from the data file, those without a column first, with their units", async () => {
    assert.deepEqual(await labels('    column c "|"'), ["c / mol L^-1", "time / s"]);
    assert.equal(await taken('    column c "c|"', "c / mol L^-1"), '    column c "c / mol L^-1"');
    assert.equal(await taken('    column c "c|', "c / mol L^-1"), '    column c "c / mol L^-1"');
    assert.equal(await taken("    column c |", "c / mol L^-1"), '    column c "c / mol L^-1"');
    assert.deepEqual((await labels('    column c "c / mol L^-1" |')).slice(0, 2), ["mol L^-1", "mol/L"]);
    assert.deepEqual(await labels('run Z\n  data "data/deep/b.csv"\n    column v "|'), ["t", "µ₂ (mL)"]);
    assert.deepEqual(await labels('run Z\n  data "nowhere.csv"\n    column v "|'), []);
  });

  it("offers paths: data files before other files, folders to go on from, nothing hidden", async () => {
    assert.deepEqual(await labels('run Z\n  data "|"'), ["data"]);
    assert.deepEqual(await labels('run Z\n  data "data/|"'), ["a.csv", "deep", "notes.docx"]);
    assert.equal(await taken('  data "data/a|.txt"', "a.csv").catch(String), '  data "data/a.csv"');
    assert.equal(await taken('  data "data/|', "a.csv"), '  data "data/a.csv"');
    assert.equal(await taken('  data "data/|', "deep"), '  data "data/deep');
    assert.deepEqual(await labels('series s\n  across "|"'), ["other.raterun", "data"]);
    assert.deepEqual(await labels('  instrument "|"'), []);
    assert.deepEqual(await labels('    delimiter "|"'), [",", ";", "space", "tab"]);
  });

  it("lists nothing outside the folder that is not trusted", async () => {
    const outside = { "../secret/x.csv": "" };
    const found = await list(`${above}run Z\n  data "../|"`, { trusted: false, files: { ...files, ...outside } });
    assert.deepEqual(found, []);
  });
});
