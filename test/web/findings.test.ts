import assert from "node:assert/strict";
import type { Description } from "../../src/contract/findings.js";
import { inlineComputer } from "../../src/workspace/computer.js";
import { createWorkspace } from "../../src/workspace/workspace.js";
import { until } from "../editor/until.js";
import { decayCsv, decayRun } from "../server/decay.js";
import { type LanguageWorker, startLanguageWorker } from "./languageWorker.js";

const uri = "virtual://lab/a.raterun";
const balanced = decayRun.replace("H2O2(aq) -> H2O(l)", "2 H2O2(aq) -> 2 H2O(l)");

/** Findings of the same text and data in Node. */
async function inNode(csv: string): Promise<Description> {
  const bytes = new TextEncoder().encode(csv);
  const reader = { read: async () => ({ kind: "bytes", bytes }) as const };
  const workspace = createWorkspace(
    { reader, sizeLimit: 1e9, within: () => null },
    inlineComputer(async () => {}),
  );
  const { signal } = new AbortController();
  const description = await workspace.describe({ uri, text: balanced, path: "a.raterun" }, { curves: false, signal });
  assert.ok(description);
  return description;
}

describe("findings in a worker of a page", () => {
  let worker: LanguageWorker;
  let csv = decayCsv();
  const asked: unknown[] = [];
  const hover = async (): Promise<string> => {
    const textDocument = { uri };
    const answer = await worker.request("textDocument/hover", { textDocument, position: { line: 7, character: 6 } });
    return (answer as { contents: { value: string } }).contents.value.replace(/\\(?=[^\w\s])/g, "");
  };

  before(async () => {
    worker = await startLanguageWorker();
    worker.answer("ratewright/readFile", (params) => {
      if (JSON.stringify(params).includes(".raterecord")) return { kind: "missing" };
      asked.push(params);
      return { kind: "bytes", bytes: new TextEncoder().encode(csv) };
    });
    await worker.request("initialize", {
      processId: null,
      rootUri: null,
      workspaceFolders: [{ uri: "virtual://lab", name: "lab" }],
      capabilities: {},
      initializationOptions: { theme: "dark", trusted: false },
    });
    await worker.notify("initialized", {});
    const textDocument = { uri, languageId: "raterun", version: 1, text: balanced };
    await worker.notify("textDocument/didOpen", { textDocument });
  });
  after(() => worker?.close());

  it("come from a data file that the client reads, k the same to the last digit as in Node", async () => {
    const k = (await inNode(csv)).runs[0]?.fits[0]?.parameters["k"]?.text;
    assert.ok(k);
    assert.ok((await hover()).includes(k));
    assert.deepEqual(asked, [{ uri: "virtual://lab/data/a.csv", limit: 512e6 }]);
  });

  it("come from a worker of its own for more than 300 kB, and from there again after an edit", async () => {
    csv = decayCsv(24_000, 0.05);
    const changes = [{ uri: "virtual://lab/data/a.csv", type: 2 }];
    await worker.notify("workspace/didChangeWatchedFiles", { changes });
    const k = (await inNode(csv)).runs[0]?.fits[0]?.parameters["k"]?.text;
    assert.ok(k);
    assert.ok((await hover()).includes(k));
    const contentChanges = [
      { range: { start: { line: 1, character: 0 }, end: { line: 1, character: 0 } }, text: "rn\n" },
    ];
    await worker.notify("textDocument/didChange", { textDocument: { uri, version: 2 }, contentChanges });
    await until("the diagnostic of the edit", () =>
      worker.said.some(({ method, params }) => {
        return method === "textDocument/publishDiagnostics" && JSON.stringify(params).includes("word-unknown");
      }),
    );
    await until("findings after it", () => {
      const last = worker.said.findLast(({ method }) => method === "ratewright/statusChanged");
      return JSON.stringify(last?.params).includes("up to date");
    });
    // The log would say that the worker ended, had it not started.
    const log = worker.said.filter(({ method }) => method === "window/logMessage").map(({ params }) => params);
    assert.doesNotMatch(JSON.stringify(log), /ended/);
  });
});
