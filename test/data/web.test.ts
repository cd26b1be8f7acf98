import assert from "node:assert/strict";
import { createContext, runInContext } from "node:vm";
import { build } from "esbuild";

describe("the data room in a web worker", () => {
  it("bundles without Node and reads a file where nothing of Node is there", async () => {
    const { outputFiles } = await build({
      stdin: {
        contents: `
          import { readColumns } from "./src/data/readColumns.js";
          import { contentHash } from "./src/data/contentHash.js";
          import { resolveUri } from "./src/data/resolve.js";
          const bytes = new TextEncoder().encode('t / s,V / mL\\n0,"1"\\n10,2.5\\n');
          const reading = readColumns(bytes);
          answer(JSON.stringify({
            kind: reading.kind,
            values: reading.columns.columns.map((column) => Array.from(column.values)),
            hash: contentHash(bytes).slice(0, 8).length,
            uri: resolveUri("vscode-vfs://h/r/a.raterun", "b c.csv").uri,
          }));`,
        resolveDir: process.cwd(),
      },
      bundle: true,
      write: false,
      platform: "browser",
      format: "iife",
      target: "es2022",
    });
    let said = "";
    const answer = (text: string): void => {
      said = text;
    };
    const worker = createContext({ TextEncoder, TextDecoder, Uint8Array, answer });
    runInContext(outputFiles[0]?.text ?? "", worker);
    assert.deepEqual(JSON.parse(said), {
      kind: "columns",
      values: [
        [0, 10],
        [1, 2.5],
      ],
      hash: 8,
      uri: "vscode-vfs://h/r/b%20c.csv",
    });
  }).timeout(20_000);
});
