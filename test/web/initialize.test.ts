import assert from "node:assert/strict";
import { type LanguageWorker, startLanguageWorker } from "./languageWorker.js";

describe("the language server as a worker of a page", () => {
  let worker: LanguageWorker;
  before(async () => {
    worker = await startLanguageWorker();
  });
  after(() => worker?.close());

  it("says on initialize what it can do", async () => {
    const answer = (await worker.request("initialize", {
      processId: null,
      rootUri: null,
      workspaceFolders: null,
      capabilities: { general: { positionEncodings: ["utf-16"] } },
    })) as { capabilities: { [name: string]: unknown } };
    const { capabilities } = answer;
    assert.ok(capabilities["hoverProvider"], "no hover");
    assert.ok(capabilities["codeActionProvider"], "no quick fixes");
    assert.ok(capabilities["textDocumentSync"], "it does not follow what is typed");
    // Left out, it means UTF-16 too: LSP 3.17, "positionEncoding".
    assert.equal(capabilities["positionEncoding"] ?? "utf-16", "utf-16");
  });

  it("ends in order", async () => {
    assert.equal(await worker.request("shutdown", null), null);
  });
});
