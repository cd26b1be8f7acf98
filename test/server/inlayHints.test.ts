import assert from "node:assert/strict";
import type { InlayHint } from "vscode-languageserver/node";
import { until } from "../editor/until.js";
import { decayCsv } from "./decay.js";
import { type ClientOptions, type EditorClient, startEditorClient } from "./editorClient.js";

/** Invented. */
const text = `species ester₂ is C4H8O2
reaction ester₂ + OH^- -> CH3COO^- + C2H5OH

run A "µ · ₂ 𝒌"
  volume 50.00 mL
  temperature 25.0 °C
  taken ester₂ 5 mmol # µ · ₂
  taken NaOH 25.0 mL of 1.00 mol/L
  taken KNO3 0.10 mol/L as inert
  data "a.csv"
    column t "time / s"
    column c "c / mol L^-1"
  follow ester₂ as concentration from c
  fit order 1 in ester₂ # µ · ₂

run B like A
  volume 100 mL
`;

const whole = { range: { start: { line: 0, character: 0 }, end: { line: 99, character: 0 } } };

describe("hints behind the lines", () => {
  let client: EditorClient;
  const start = async (options: ClientOptions = {}): Promise<void> => {
    client = await startEditorClient({ files: { "a.csv": decayCsv() }, ...options });
    await client.open("a.raterun", text);
  };
  afterEach(() => client.end());
  const hints = (more = whole): Promise<InlayHint[]> =>
    client.ask("textDocument/inlayHint", "a.raterun", undefined, more);
  /** The line with its hint where it stands. */
  const shown = async (more = whole): Promise<string[]> => {
    const lines = client.text("a.raterun").split("\n");
    return (await hints(more)).map(({ position, label }) => {
      const line = lines[position.line] ?? "";
      return `${line.slice(0, position.character).trim()} «${String(label).replaceAll("\u00a0", " ")}»`;
    });
  };

  it("say the concentration of an amount and of a stock, what is limiting, the ions of a salt, k", async () => {
    await start();
    const found = await shown();
    // 5 mmol in 50.00 mL; 25.0 mL of 1.00 mol/L in 50.00 mL.
    assert.deepEqual(found.slice(0, 3), [
      "taken ester₂ 5 mmol «= 0.1 mol·L⁻¹ · limiting»",
      "taken NaOH 25.0 mL of 1.00 mol/L «= 0.5 mol·L⁻¹ · gives Na⁺ and OH⁻»",
      "taken KNO3 0.10 mol/L as inert «gives K⁺ and NO₃⁻»",
    ]);
    // The readings follow c = 0.1 exp(-0.002 t), rounded to four decimals.
    assert.match(found[3] ?? "", /^fit order 1 in ester₂ «k = 0\.00(1999|2000)\d*\(\d+\) s⁻¹»$/);
    assert.equal(found.length, 4);
  });

  it("stand only on the lines that are asked for, and not at all where they are not wanted", async () => {
    await start();
    const range = { start: { line: 7, character: 0 }, end: { line: 8, character: 0 } };
    assert.equal((await hints({ range })).length, 1);
    await client.end();
    await start({ hints: false });
    assert.deepEqual(await hints(), []);
  });

  it("say of a line above the first run what holds for each where runs differ", async () => {
    await start();
    await client.edit("a.raterun", "run A", "taken NaNO3 1 mmol as inert\nrun A");
    const [first] = await shown();
    assert.match(
      first ?? "",
      /^taken NaNO3 1 mmol as inert «A: = 0\.02 mol·L⁻¹ · gives Na⁺ and NO₃⁻; B: = 0\.01 mol·L⁻¹ /,
    );
  });

  it("wait for the findings of the text as it stands", async () => {
    await start({ delay: 60 });
    await client.settled("a.raterun");
    await client.edit("a.raterun", "5 mmol", "10 mmol");
    const [first] = await shown();
    assert.equal(first, "taken ester₂ 10 mmol «= 0.2 mol·L⁻¹ · limiting»");
  });

  it("are asked for anew when a data file changes", async () => {
    await start();
    await hints();
    const before = client.refreshes.hints;
    client.files.set("file:///lab/a.csv", decayCsv(30, 20));
    await client.fileChanged("a.csv");
    await until("the editor is told", () => client.refreshes.hints > before);
  });

  it("end with the description", async () => {
    await start({ delay: 100_000 });
    await client.edit("a.raterun", "5 mmol", "10 mmol");
    const waiting = hints();
    await client.close("a.raterun");
    assert.deepEqual(await waiting, []);
  });
});
