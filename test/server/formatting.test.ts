import assert from "node:assert/strict";
import type { TextEdit } from "vscode-languageserver/node";
import { features } from "../../src/server/features/features.js";
import { formatting } from "../../src/server/features/formatting.js";
import { decayCsv, decayRun } from "./decay.js";
import { type EditorClient, folder, startEditorClient } from "./editorClient.js";

const textDocument = { uri: `${folder}/a.raterun` };
// What an editor sends of its own tab size; the language has its own.
const options = { tabSize: 8, insertSpaces: false };

const formatted = `ratewright 1
reaction  H2O2(aq) → H2O(l) + O2(g)
run A "µ · ₂ 𝒌 run"
  temperature  25.0 °C
  taken        H2O2  0.1000(5) mol/L
  data         "data/a.csv"
    column     t  "time / s"
    column     c  "c / mol L^-1"
  follow       H2O2 as concentration from c
  rate         from 0 s to 300 s
  fit          order 1 in H2O2
`;

describe("formatting in the editor", () => {
  let client: EditorClient;
  const start = async (text: string): Promise<void> => {
    client = await startEditorClient({ files: { "data/a.csv": decayCsv() } });
    await client.open("a.raterun", text);
  };
  const whole = (): Promise<TextEdit[]> =>
    client.connection.sendRequest<TextEdit[]>("textDocument/formatting", { textDocument, options });
  const selection = (first: number, last: number, character = 1): Promise<TextEdit[]> =>
    client.connection.sendRequest<TextEdit[]>("textDocument/rangeFormatting", {
      textDocument,
      options,
      range: { start: { line: first, character: 0 }, end: { line: last, character } },
    });
  const apply = async (edits: readonly TextEdit[]): Promise<string> => {
    const { uri } = textDocument;
    await client.apply("a.raterun", { title: "format", edit: { changes: { [uri]: [...edits] } } });
    return client.text("a.raterun");
  };
  afterEach(() => client.end());

  it("sets the whole text, in edits of lines; a second time there is nothing to do", async () => {
    await start(decayRun);
    assert.equal(await apply(await whole()), formatted);
    assert.deepEqual(await whole(), []);
  });

  it("changes the lines of a selection, not the line on whose beginning it ends", async () => {
    await start(decayRun);
    const edits = await selection(3, 5, 0);
    assert.deepEqual(
      edits.map(({ range, newText }) => [range.start.line, newText]),
      [
        [3, "  temperature  25.0 °C"],
        [4, "  taken        H2O2  0.1000(5) mol/L"],
      ],
    );
  });

  it("keeps CRLF and the diagnostics as they are", async () => {
    await start(decayRun.replaceAll("\n", "\r\n"));
    await client.settled("a.raterun");
    const before = client.codes("a.raterun");
    assert.equal(await apply(await whole()), formatted.replaceAll("\n", "\r\n"));
    await client.settled("a.raterun");
    assert.deepEqual(client.codes("a.raterun"), before);
  });

  it("writes ASCII where the setting says so, for the folder of the description", async () => {
    await start(formatted);
    const scopes: unknown[] = [];
    client.connection.onRequest("workspace/configuration", ({ items }: { items: { scopeUri?: string }[] }) => {
      scopes.push(items[0]?.scopeUri);
      return [{ notation: { ascii: true } }];
    });
    const text = await apply(await whole());
    assert.equal(text, formatted.replace("→", "->").replace("°C", "degC"));
    assert.deepEqual(scopes, [textDocument.uri]);
  });

  it("answers nothing for a text that is not open", async () => {
    await start(decayRun);
    const edits = await client.connection.sendRequest("textDocument/formatting", {
      textDocument: { uri: `${folder}/other.raterun` },
      options,
    });
    assert.deepEqual(edits, []);
  });
});

describe("the formatter of the server", () => {
  it("is announced for a text and for a selection", () => {
    const { documentFormattingProvider, documentRangeFormattingProvider } = formatting.capabilities;
    assert.deepEqual([documentFormattingProvider, documentRangeFormattingProvider], [true, true]);
    assert.ok(features.includes(formatting));
  });
});
