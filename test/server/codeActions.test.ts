import assert from "node:assert/strict";
import { decayCsv, decayRun } from "./decay.js";
import { type EditorClient, startEditorClient } from "./editorClient.js";

describe("quick fixes", () => {
  let client: EditorClient;
  const start = async (options: Parameters<typeof startEditorClient>[0] = {}): Promise<void> => {
    client = await startEditorClient({ files: { "data/a.csv": decayCsv() }, ...options });
  };
  afterEach(() => client.end());

  it("balance the reaction, and the diagnostic goes", async () => {
    await start();
    await client.open("a.raterun", decayRun);
    await client.settled("a.raterun");
    assert.deepEqual(client.codes("a.raterun"), ["unbalanced 2"]);
    const [fix, ...others] = await client.fixes("a.raterun", "->");
    assert.ok(fix);
    assert.deepEqual(others, []);
    assert.equal(fix.isPreferred, true);
    assert.equal(fix.kind, "quickfix");
    assert.deepEqual(
      fix.diagnostics?.map(({ code }) => code),
      ["unbalanced"],
    );
    await client.apply("a.raterun", fix);
    await client.settled("a.raterun");
    assert.match(client.text("a.raterun"), /^reaction 2 H2O2\(aq\) -> 2 H2O\(l\) \+ O2\(g\)$/m);
    assert.deepEqual(client.codes("a.raterun"), []);
  });

  it("edit the right letters behind µ · ₂ and letters of two units", async () => {
    await start();
    const text = decayRun.replace("reaction H2O2", "reaction 2 H2O2").replace("H2O(l)", "2 H2O(l)");
    await client.open("a.raterun", text.replace('"µ · ₂ 𝒌 run"', '"µ · ₂ 𝒌 run" nonsense'));
    await client.settled("a.raterun");
    const [fix] = await client.fixes("a.raterun", "nonsense");
    assert.ok(fix);
    await client.apply("a.raterun", fix);
    assert.match(client.text("a.raterun"), /^run A "µ · ₂ 𝒌 run"\s*$/m);
  });

  it("mend what the data file shows: the header that is nearest", async () => {
    await start();
    await client.open("a.raterun", decayRun.replace('"time / s"', '"tme / s"'));
    await client.settled("a.raterun");
    const [fix] = await client.fixes("a.raterun", '"tme');
    assert.ok(fix);
    await client.apply("a.raterun", fix);
    await client.settled("a.raterun");
    assert.deepEqual(client.codes("a.raterun"), ["unbalanced 2"]);
  });

  it("mend an unknown word; elsewhere there is none", async () => {
    await start();
    await client.open("a.raterun", decayRun.replace("  rate from", "  rte from"));
    await client.settled("a.raterun");
    const [fix] = await client.fixes("a.raterun", "rte");
    assert.equal(fix?.title, "Write “rate”");
    assert.deepEqual(await client.fixes("a.raterun", "temperature"), []);
  });

  it("are for the version of the text they were made for, where the client can tell", async () => {
    await start();
    await client.open("a.raterun", decayRun);
    await client.edit("a.raterun", "25.0", "26.0");
    const [fix] = await client.fixes("a.raterun", "->");
    const part = fix?.edit?.documentChanges?.[0];
    assert.ok(part !== undefined && "textDocument" in part);
    assert.equal(part.textDocument.version, 2);
  });

  it("are plain changes for a client that knows no versions", async () => {
    await start({ versionedEdits: false });
    await client.open("a.raterun", decayRun);
    await client.settled("a.raterun");
    const [fix] = await client.fixes("a.raterun", "->");
    assert.ok(fix?.edit?.changes?.["file:///lab/a.raterun"]);
  });

  it("are not offered where another kind of action is asked for", async () => {
    await start();
    await client.open("a.raterun", decayRun);
    const start0 = { line: 1, character: 0 };
    const answer = await client.connection.sendRequest("textDocument/codeAction", {
      textDocument: { uri: "file:///lab/a.raterun" },
      range: { start: start0, end: { line: 1, character: 40 } },
      context: { diagnostics: [], only: ["refactor"] },
    });
    assert.deepEqual(answer, []);
  });
});
