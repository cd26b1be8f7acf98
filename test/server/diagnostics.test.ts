import assert from "node:assert/strict";
import { decayCsv, decayRun } from "./decay.js";
import { type EditorClient, startEditorClient } from "./editorClient.js";

const balanced = decayRun.replace("H2O2(aq) -> H2O(l)", "2 H2O2(aq) -> 2 H2O(l)");

describe("diagnostics in the editor", () => {
  let client: EditorClient;
  const start = async (options: Parameters<typeof startEditorClient>[0] = {}): Promise<void> => {
    client = await startEditorClient({ files: { "data/a.csv": decayCsv() }, ...options });
  };
  afterEach(() => client.end());

  it("are what text and data show, on opening", async () => {
    await start();
    await client.open("a.raterun", decayRun.replace('"time / s"', '"tme / s"'));
    await client.settled("a.raterun");
    assert.deepEqual(client.codes("a.raterun"), ["unbalanced 2", "data-column-missing 7"]);
  });

  it("are none where nothing is wrong, and all go when the description is closed", async () => {
    await start();
    await client.open("a.raterun", balanced);
    await client.settled("a.raterun");
    assert.deepEqual(client.codes("a.raterun"), []);
    await client.edit("a.raterun", "run A", "rn A");
    await client.settled("a.raterun");
    assert.notDeepEqual(client.codes("a.raterun"), []);
    await client.close("a.raterun");
    await client.connection.sendRequest("workspace/symbol", { query: "" }).catch(() => undefined);
    assert.deepEqual(client.sent.at(-1), { uri: "file:///lab/a.raterun", diagnostics: [] });
  });

  it("stand in UTF-16 columns behind µ · ₂ and letters of two units", async () => {
    await start();
    // “𝒌” is U+1D48C: one letter, two UTF-16 units. The words in front are 12 units long in all.
    await client.open("a.raterun", balanced.replace('run A "µ · ₂ 𝒌 run"', 'run A "µ · ₂ 𝒌" nonsense'));
    await client.settled("a.raterun");
    const found = client.shown("a.raterun").find(({ range }) => range.start.line === 2);
    assert.deepEqual(found?.range, { start: { line: 2, character: 17 }, end: { line: 2, character: 25 } });
  });

  it("come at once for the text, before the pause, and keep what data showed meanwhile", async () => {
    await start({ delay: 60_000 });
    await client.open("a.raterun", decayRun.replace('"time / s"', '"tme / s"'));
    await client.settled("a.raterun");
    const before = client.sent.length;
    await client.edit("a.raterun", "  rate from", "  rat from");
    await client.fixes("a.raterun", "rat from");
    assert.deepEqual(client.codes("a.raterun"), ["unbalanced 2", "data-column-missing 7", "word-unknown 10"]);
    // A line above moves what stands below it.
    await client.edit("a.raterun", "ratewright 1\n", "ratewright 1\n\n");
    await client.fixes("a.raterun", "rat from");
    assert.deepEqual(client.codes("a.raterun"), ["unbalanced 3", "data-column-missing 8", "word-unknown 11"]);
    assert.equal(client.sent.length, before + 2, "one message a change, no empty one between");
  });

  it("drop what data showed of the very words that are changed", async () => {
    await start({ delay: 60_000 });
    await client.open("a.raterun", balanced.replace('"time / s"', '"tme / s"'));
    await client.settled("a.raterun");
    await client.edit("a.raterun", "tme", "time");
    await client.fixes("a.raterun", "time");
    assert.deepEqual(client.codes("a.raterun"), []);
  });

  it("follow the data file when it changes, and are not sent again when they are the same", async () => {
    await start();
    await client.open("a.raterun", balanced);
    await client.settled("a.raterun");
    const before = client.sent.length;
    client.files.set("file:///lab/data/a.csv", decayCsv().replace("c / mol L^-1", "absorbance"));
    await client.fileChanged("data/a.csv");
    await client.settled("a.raterun");
    assert.deepEqual(client.codes("a.raterun"), ["data-column-missing 8"]);
    client.files.delete("file:///lab/data/a.csv");
    await client.fileChanged("data/a.csv");
    await client.settled("a.raterun");
    assert.deepEqual(client.codes("a.raterun"), ["data-missing 6"]);
    await client.fileChanged("data/a.csv");
    await client.settled("a.raterun");
    assert.equal(client.sent.length, before + 2);
  });

  it("watch the folders of the data files in use, and that of the description, where its record stands", async () => {
    await start();
    await client.open("a.raterun", balanced);
    await client.settled("a.raterun");
    const watching = client.registered.filter(({ method }) => method === "workspace/didChangeWatchedFiles");
    assert.deepEqual(
      watching.map(({ registerOptions }) => registerOptions),
      ["file:///lab", "file:///lab/data"].map((baseUri) => ({
        watchers: [{ globPattern: { baseUri, pattern: "*" } }],
      })),
    );
  });

  it("refuse a data file outside the folder while the workspace is not trusted, and read it then", async () => {
    await start({ trusted: false, files: {} });
    client.files.set("file:///elsewhere/a.csv", decayCsv());
    await client.open("a.raterun", balanced.replace("data/a.csv", "../elsewhere/a.csv"));
    await client.settled("a.raterun");
    assert.deepEqual(client.codes("a.raterun"), ["data-path-leaves 6"]);
    await client.connection.sendNotification("ratewright/trustGranted");
    await client.settled("a.raterun");
    assert.deepEqual(client.codes("a.raterun"), []);
  });

  it("keep to the size that the settings allow", async () => {
    await start({
      maximumSize: 0.0001,
      reader: { read: async (_, limit) => ({ kind: "too large", size: limit + 1 }) },
    });
    await client.open("a.raterun", balanced);
    await client.settled("a.raterun");
    const found = client.shown("a.raterun")[0];
    assert.equal(found?.code, "data-too-large");
    assert.match(String(found?.message), /more than the 100 B allowed/);
  });
});
