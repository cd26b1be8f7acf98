import assert from "node:assert/strict";
import { readFileSync } from "node:fs";
import { join } from "node:path";
import { fileURLToPath, pathToFileURL } from "node:url";
import { projectFolder } from "../editor/projectFolder.js";
import { decayCsv, decayRun } from "./decay.js";
import { type EditorClient, startEditorClient } from "./editorClient.js";

/** A description with problems of its text and of its data file. */
const broken = decayRun.replace('"time / s"', '"tme / s"').replace("  rate from", "  rat from");
const docs = pathToFileURL(join(projectFolder(), "media", "docs")).href;

describe("the page of a diagnostic's code", () => {
  let client: EditorClient;
  const open = async (options: Parameters<typeof startEditorClient>[0]): Promise<void> => {
    client = await startEditorClient({ files: { "data/a.csv": decayCsv() }, ...options });
    await client.open("a.raterun", broken);
    await client.settled("a.raterun");
  };
  afterEach(() => client.end());

  it("is linked from the diagnostic, and is there", async () => {
    await open({ docs });
    const shown = client.shown("a.raterun");
    assert.deepEqual(client.codes("a.raterun"), ["unbalanced 2", "data-column-missing 7", "word-unknown 10"]);
    for (const { code, codeDescription } of shown) {
      const href = codeDescription?.href ?? "";
      assert.ok(href.endsWith(`/media/docs/codes/${code}.md`), href);
      assert.ok(readFileSync(fileURLToPath(href), "utf8").includes(`\`${code}\``), href);
    }
    const [fix] = await client.fixes("a.raterun", "->");
    assert.deepEqual(fix?.diagnostics?.[0], shown[0], "a fix names the diagnostic as it was sent");
  });

  it("is linked by whatever address the client's pages have", async () => {
    await open({ docs: "https://pages.example/ratewright/docs/" });
    const hrefs = client.shown("a.raterun").map(({ codeDescription }) => codeDescription?.href);
    assert.equal(hrefs[0], "https://pages.example/ratewright/docs/codes/unbalanced.md");
  });

  it("is not linked for a client that brings no pages", async () => {
    await open({});
    assert.ok(client.shown("a.raterun").every(({ codeDescription }) => codeDescription === undefined));
  });
});
