import assert from "node:assert/strict";
import type { CodeLens } from "vscode-languageserver/node";
import {
  type RecordDifferenceAnswer,
  recordDifference,
  type WriteRecordAnswer,
  writeRecord,
} from "../../src/contract/recordProtocol.js";
import { until } from "../editor/until.js";
import { decayCsv, decayRun } from "./decay.js";
import { type EditorClient, folder, startEditorClient } from "./editorClient.js";

const balanced = decayRun.replace("H2O2(aq) -> H2O(l)", "2 H2O2(aq) -> 2 H2O(l)");
const name = "a.raterun";
const uri = `${folder}/${name}`;
const record = `${folder}/a.raterecord`;

describe("the record beside an open description", () => {
  let client: EditorClient;
  const start = async (options: Parameters<typeof startEditorClient>[0] = {}): Promise<void> => {
    client = await startEditorClient({ files: { "data/a.csv": decayCsv() }, ...options });
    // The server asks for the lines anew whenever they are others.
    client.connection.onRequest("workspace/codeLens/refresh", () => null);
    await client.open(name, balanced);
    await client.settled(name);
  };
  afterEach(() => client.end());

  const lenses = async (): Promise<CodeLens[]> =>
    (await client.connection.sendRequest("textDocument/codeLens", { textDocument: { uri } })) ?? [];
  const titles = async (): Promise<string[]> => (await lenses()).map(({ command }) => command?.title ?? "");
  const untilTitle = async (wanted: RegExp): Promise<string[]> => {
    await until(`a line ${wanted}`, async () => (await titles()).some((title) => wanted.test(title)));
    return titles();
  };
  const write = (): Promise<WriteRecordAnswer> => client.connection.sendRequest(writeRecord, { uri });
  const difference = (): Promise<RecordDifferenceAnswer> => client.connection.sendRequest(recordDifference, { uri });

  it("none yet: said above the first line with the command that writes it; written, it is up to date", async () => {
    await start();
    assert.deepEqual(await untilTitle(/no record/), ["no record yet: write it"]);
    const [lens] = await lenses();
    assert.deepEqual(lens?.range.start, { line: 0, character: 0 });
    assert.deepEqual([lens?.command?.command, lens?.command?.arguments], ["ratewright.writeRecord", [uri]]);
    assert.match(
      (await difference()).text,
      /^a\.raterun: there is no record yet; the command “Ratewright: Write Record” writes it\.\n$/,
    );
    assert.deepEqual(await write(), { done: true, words: "a.raterecord is written." });
    assert.match(client.files.get(record) ?? "", /^\{\n {2}"raterecord": 1,\n {2}"description": "a\.raterun",\n/);
    assert.deepEqual(await untilTitle(/up to date/), ["record up to date"]);
    assert.deepEqual(await difference(), {
      record: "a.raterecord",
      text: "a.raterun: nothing moved since a.raterecord was written.\n",
    });
    assert.deepEqual(await write(), { done: true, words: "a.raterecord is up to date already." });
  });

  it("stale, and why, once the text means something else; up to date again when that is taken back", async () => {
    await start();
    await write();
    await untilTitle(/up to date/);
    await client.edit(name, "0.1000(5)", "0.1200(5)");
    const stale = await untilTitle(/stale/);
    assert.match(stale[0] ?? "", /^record stale: the description changed, \d+ results? moved$/);
    assert.equal(stale[1], "write it anew");
    const { text } = await difference();
    assert.match(
      text,
      /^a\.raterun: not as recorded\.\n {2}What the description means changed\.\n {2}run A: H2O2 taken moved from 0\.10000\(50\) mol L\^-1 to 0\.12000/,
    );
    await client.edit(name, "0.1200(5)", "0.1000(5)");
    assert.deepEqual(await untilTitle(/up to date/), ["record up to date"]);
    await client.edit(name, "run A", "# a comment\nrun A");
    await client.settled(name);
    assert.deepEqual(await titles(), ["record up to date"]);
  });

  it("follows the data file and the record itself as they change on disk", async () => {
    await start();
    await write();
    await untilTitle(/up to date/);
    const csv = client.files.get(`${folder}/data/a.csv`) ?? "";
    client.files.set(`${folder}/data/a.csv`, `${csv.trimEnd()}\n`.replace(/\n([^\n]*)\n$/, "\n"));
    await client.fileChanged("data/a.csv");
    assert.match((await untilTitle(/stale/))[0] ?? "", /^record stale: data\/a\.csv changed, \d+ results moved$/);
    client.files.set(`${folder}/data/a.csv`, csv);
    await client.fileChanged("data/a.csv");
    await untilTitle(/up to date/);
    client.files.set(record, "{\n");
    await client.fileChanged("a.raterecord");
    assert.deepEqual(await untilTitle(/cannot be read/), ["record cannot be read", "write it anew"]);
    client.files.delete(record);
    await client.fileChanged("a.raterecord");
    await untilTitle(/no record yet/);
  });

  it("something else of that name is left as it is", async () => {
    await start({ files: { "data/a.csv": decayCsv(), "a.raterecord": '{"my": "own"}' } });
    assert.deepEqual(await untilTitle(/cannot be read/), ["record cannot be read"]);
    const { done, words } = await write();
    assert.equal(done, false);
    assert.match(words, /^a\.raterecord: This is no record as Ratewright writes it: .* It is left as it is\.$/);
    assert.equal(client.files.get(record), '{"my": "own"}');
  });

  it("a description with errors has one that holds them", async () => {
    await start();
    await client.edit(name, "2 H2O2(aq)", "H2O2(aq)");
    await client.settled(name);
    const { done, words } = await write();
    assert.deepEqual([done, words], [true, "a.raterecord is written. It holds 1 error of the description."]);
  });

  it("is not written without trust, nor outside the opened folder", async () => {
    await start({ trusted: false });
    assert.deepEqual(await titles(), []);
    const { done, words } = await write();
    assert.deepEqual([done, words], [false, "Records are written only in a trusted folder. Trust this one first."]);
    assert.equal(client.files.has(record), false);
    await client.connection.sendNotification("ratewright/trustGranted");
    await untilTitle(/no record yet/);
    const outside = "file:///elsewhere/b.raterun";
    await client.connection.sendNotification("textDocument/didOpen", {
      textDocument: { uri: outside, languageId: "raterun", version: 1, text: balanced },
    });
    const refused: WriteRecordAnswer = await client.connection.sendRequest(writeRecord, { uri: outside });
    assert.deepEqual(refused, {
      done: false,
      words: "The description lies outside the opened folder. Open its folder first.",
    });
  });
});
