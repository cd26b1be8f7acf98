import assert from "node:assert/strict";
import { inlineComputer } from "../../src/workspace/computer.js";
import { createWorkspace } from "../../src/workspace/workspace.js";
import { decayCsv, decayRun } from "./decay.js";
import { type EditorClient, startEditorClient } from "./editorClient.js";

const balanced = decayRun.replace("H2O2(aq) -> H2O(l)", "2 H2O2(aq) -> 2 H2O(l)");

/** k of the first fit as the findings have it, the way the command line works them out. */
async function kText(text: string, csv: string): Promise<string> {
  const bytes = new TextEncoder().encode(csv);
  const reader = { read: async () => ({ kind: "bytes", bytes }) as const };
  const workspace = createWorkspace(
    { reader, sizeLimit: 1e9, within: () => null },
    inlineComputer(async () => {}),
  );
  const document = { uri: "file:///lab/a.raterun", text, path: "a.raterun" };
  const { signal } = new AbortController();
  const description = await workspace.describe(document, { curves: false, signal });
  const found = description?.runs[0]?.fits[0]?.parameters["k"]?.text;
  assert.ok(found);
  return found;
}

/** Markdown as it reads: without its backslashes, and with minus signs and spaces of either kind alike. */
function plain(markdown: string): string {
  return markdown.replace(/\\(?=[^\w\s])/g, "");
}

describe("resting on a column", () => {
  let client: EditorClient;
  const start = async (options: Parameters<typeof startEditorClient>[0] = {}): Promise<void> => {
    client = await startEditorClient({ files: { "data/a.csv": decayCsv() }, ...options });
  };
  afterEach(() => client.end());

  it("shows k as the findings have it and a picture, by its name on the follow line", async () => {
    await start();
    await client.open("a.raterun", balanced);
    const hover = await client.hover("a.raterun", "c\n  rate");
    assert.ok(hover);
    assert.ok(plain(hover.text).includes(await kText(balanced, decayCsv())), plain(hover.text));
    assert.match(hover.text, /!\[[^\]]*\]\(data:image\/svg\+xml/);
    assert.deepEqual(hover.range, { start: { line: 8, character: 36 }, end: { line: 8, character: 37 } });
  });

  it("shows the same anywhere on the line that declares it", async () => {
    await start();
    await client.open("a.raterun", balanced);
    const named = await client.hover("a.raterun", "c\n  rate");
    const declared = await client.hover("a.raterun", '"c / mol');
    const head = await client.hover("a.raterun", "column c");
    assert.equal(declared?.text, named?.text);
    assert.equal(head?.text, named?.text);
    assert.deepEqual(head?.range?.start, { line: 7, character: 4 });
  });

  it("says something else of the column of times, and nothing beside columns", async () => {
    await start();
    await client.open("a.raterun", balanced);
    const time = await client.hover("a.raterun", '"time / s"');
    assert.match(time?.text ?? "", /\*\*t\*\*/);
    assert.equal(await client.hover("a.raterun", '"data/a.csv"'), null);
    assert.doesNotMatch((await client.hover("a.raterun", "temperature"))?.text ?? "", /data:image/);
  });

  it("finds the column behind µ · ₂ on the same line", async () => {
    await start({ files: { "data/a.csv": decayCsv().replace("c / mol L^-1", "µ · ₂ 𝒌 / mol L^-1") } });
    const text = balanced
      .replace('column c "c / mol L^-1"', 'column c₂ "µ · ₂ 𝒌 / mol L^-1"')
      .replace("from c\n", "from c₂\n");
    await client.open("a.raterun", text);
    const hover = await client.hover("a.raterun", 'L^-1"');
    assert.ok(plain(hover?.text ?? "").includes(await kText(text, client.files.get("file:///lab/data/a.csv") ?? "")));
  });

  it("shows the column of each run that shares its line", async () => {
    await start();
    await client.open("a.raterun", `${balanced}run B like A\n  taken H2O2 0.2 mol/L\n`);
    const hover = await client.hover("a.raterun", "column c");
    assert.match(hover?.text ?? "", /run A[\s\S]*run B/);
  });

  it("has other colours on a dark ground, and changes with the theme", async () => {
    await start({ theme: "light" });
    await client.open("a.raterun", balanced);
    const light = await client.hover("a.raterun", "column c");
    await client.connection.sendNotification("ratewright/themeChanged", { theme: "dark" });
    const dark = await client.hover("a.raterun", "column c");
    assert.ok(light && dark);
    assert.notEqual(light.text, dark.text);
  });

  it("stays below the length at which the editor cuts a hover off", async () => {
    // The editor shows at most 100,000 characters of a hover's Markdown (from memory).
    await start({ files: { "data/a.csv": decayCsv(3000, 0.5) } });
    await client.open("a.raterun", balanced);
    const hover = await client.hover("a.raterun", "column c");
    assert.ok(hover);
    assert.ok(hover.text.length < 100_000, `${hover.text.length} characters`);
  });
});
