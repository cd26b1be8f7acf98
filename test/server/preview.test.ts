import assert from "node:assert/strict";
import {
  type ExportAnswer,
  type PreviewPage,
  previewExport,
  previewPage,
  type WindowAnswer,
  windowEdit,
} from "../../src/contract/previewProtocol.js";
import { folder, startEditorClient } from "./editorClient.js";

/** Invented: two runs that fall by a tenth and a fifth a step; line 4 of the second's file is no number. */
const text = `ratewright 1
reaction  2 H2O2(aq) -> 2 H2O(l) + O2(g)

run A
  temperature  25 °C
  taken        H2O2  1.00 mol/L
  data         "a.csv"
    column     t  "t / s"
    column     c  "c / mol L^-1"
  follow       H2O2 as concentration from c
  fit          order 1 in H2O2  # the only one

run B like A "<b>slower</b>"
  data         "b.csv"
`;
const fall = (by: number): string =>
  ["t / s,c / mol L^-1", ...Array.from({ length: 20 }, (_, i) => `${i},${(by ** i + (i % 2) / 500).toFixed(4)}`)].join(
    "\n",
  );
const files = { "a.csv": fall(0.9), "b.csv": fall(0.8) };
const uri = `${folder}/a.raterun`;

describe("the server's answers to the preview", () => {
  it("give the page of the run under the cursor, with its plots and the lines of its readings", async () => {
    const client = await startEditorClient({ files });
    try {
      await client.open("a.raterun", text);
      const ask = (line: number | null, run: string | null = null): Promise<PreviewPage | null> =>
        client.connection.sendRequest(previewPage, { uri, line, run });
      const first = await ask(1);
      assert.equal(first?.run, "run A");
      assert.deepEqual(first?.runs, [
        { id: "run A", name: "A", line: 4 },
        { id: "run B", name: "B", line: 13 },
      ]);
      assert.deepEqual(first?.errors, []);
      const [plot] = first?.plots ?? [];
      assert.equal(plot?.file, `${folder}/a.csv`);
      assert.deepEqual(
        plot?.readings.map(({ line }) => line),
        Array.from({ length: 20 }, (_, i) => i + 2),
      );
      assert.ok(first?.markup.includes(`data-plot="${plot?.id}"`));
      assert.equal((await ask(9))?.run, "run A");
      const second = await ask(14);
      assert.equal(second?.run, "run B");
      assert.ok(second?.markup.includes("&lt;b&gt;slower"), "a title is no markup");
      assert.ok(!second?.markup.includes("<b>slower"));
      assert.equal((await ask(14, "run A"))?.run, "run A");
      assert.equal(
        await client.connection.sendRequest(previewPage, { uri: `${folder}/no.raterun`, line: 1, run: null }),
        null,
      );
    } finally {
      await client.end();
    }
  });

  it("name the errors that touch the run, not those of another one", async () => {
    const client = await startEditorClient({ files });
    try {
      await client.open("a.raterun", text.replace('"b.csv"', '"gone.csv"'));
      const ask = (run: string): Promise<PreviewPage | null> =>
        client.connection.sendRequest(previewPage, { uri, line: null, run });
      assert.deepEqual((await ask("run A"))?.errors, []);
      const errors = (await ask("run B"))?.errors ?? [];
      assert.deepEqual(
        errors.map(({ line }) => line),
        [14],
      );
    } finally {
      await client.end();
    }
  });

  it("write a window below the fit, over the one that is there, and refuse a text that is no more", async () => {
    const client = await startEditorClient({ files });
    try {
      await client.open("a.raterun", text);
      const ask = (version: number, from: number, to: number, run = "run A"): Promise<WindowAnswer> =>
        client.connection.sendRequest(windowEdit, { uri, version, run, fits: [`${run}/fit 1`], from, to, unit: "s" });
      const [edit] = (await ask(1, 2.00004, 15)) ?? [];
      assert.deepEqual(edit, {
        line: 10,
        character: 46,
        endLine: 10,
        endCharacter: 46,
        text: "\n    window     2 s to 15 s",
      });
      // Run B has its fit from run A: it is written there, once.
      assert.deepEqual(await ask(1, 2, 15, "run B"), [edit]);
      assert.equal(await ask(2, 2, 15), null);
      assert.equal(await ask(1, 15, 2), null);
      await client.edit("a.raterun", "# the only one", "# the only one\n    window     2 s to 15 s  # dragged");
      const [again] = (await ask(2, 3, 12.5)) ?? [];
      assert.deepEqual(again, { line: 11, character: 15, endLine: 11, endCharacter: 26, text: "3 s to 12.5 s" });
      const page: PreviewPage | null = await client.connection.sendRequest(previewPage, { uri, line: 4, run: null });
      const kinds = page?.plots[0]?.readings.map(({ kind }) => kind) ?? [];
      assert.deepEqual(
        [kinds.filter((kind) => kind === "used").length, kinds.filter((kind) => kind === "outside").length],
        [14, 6],
      );
    } finally {
      await client.end();
    }
  });

  it("export a run in every form", async () => {
    const client = await startEditorClient({ files });
    try {
      await client.open("a.raterun", text);
      const ask = async (format: string): Promise<[string, string][]> => {
        const answer: ExportAnswer = await client.connection.sendRequest(previewExport, { uri, run: "run B", format });
        return (answer ?? []).map((file) => [file.name, file.text.slice(0, 10)]);
      };
      assert.deepEqual(await ask("svg"), [["a-B.svg", "<svg xmlns"]]);
      assert.deepEqual(await ask("csv"), [["a-B.curves.csv", "what,t / s"]]);
      assert.deepEqual(await ask("markdown"), [["a.md", "# Rates of"]]);
      assert.deepEqual(await ask("html"), [["a.html", "<!DOCTYPE "]]);
    } finally {
      await client.end();
    }
  });
});
