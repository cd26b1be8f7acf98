import assert from "node:assert/strict";
import { editorAddress } from "./editorAddress.js";

describe("the address of an editor's page", () => {
  it("names folder, extension and tests by the server's remote URIs", () => {
    const url = new URL(
      editorAddress(8123, {
        workspace: "/tmp/with space/µ",
        extensionDevelopmentPath: "/x/extension",
        extensionTestsPath: "/x/tests/index.cjs",
      }),
    );
    assert.equal(url.origin, "http://127.0.0.1:8123");
    assert.equal(url.searchParams.get("folder"), "/tmp/with space/µ");
    assert.deepEqual(JSON.parse(url.searchParams.get("payload") ?? ""), [
      ["skipWelcome", "true"],
      ["extensionDevelopmentPath", "vscode-remote://127.0.0.1:8123/x/extension"],
      ["extensionTestsPath", "vscode-remote://127.0.0.1:8123/x/tests/index.cjs"],
    ]);
  });

  it("turns a Windows path into a URI's path", () => {
    const url = new URL(editorAddress(1, { workspace: "C:\\runs\\one" }));
    assert.equal(url.searchParams.get("folder"), "/C:/runs/one");
  });
});
