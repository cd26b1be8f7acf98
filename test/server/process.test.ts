import assert from "node:assert/strict";
import { spawn } from "node:child_process";
import { mkdirSync, writeFileSync } from "node:fs";
import { join } from "node:path";
import {
  createProtocolConnection,
  type PublishDiagnosticsParams,
  StreamMessageReader,
  StreamMessageWriter,
} from "vscode-languageserver/node";
import { type StatusChanged, statusChanged } from "../../src/contract/editorProtocol.js";
import { fileUri } from "../../src/host/node/fileUri.js";
import { projectFolder } from "../editor/projectFolder.js";
import { temporaryFolder } from "../editor/temporaryFolder.js";
import { until } from "../editor/until.js";
import { decayCsv, decayRun } from "./decay.js";

describe("the server as a process of its own, as it is shipped", () => {
  const folder = temporaryFolder("process µ");
  after(() => folder.remove());

  it("speaks over its standard streams, has its worker beside it for big data, and ends in order", async () => {
    mkdirSync(join(folder.path, "data"));
    writeFileSync(join(folder.path, "data", "a.csv"), `${decayCsv(24_000, 0.05)}1201,spilt\n`);
    const script = join(projectFolder(), "dist", "server.cjs");
    const server = spawn(process.execPath, [script, "--stdio"], { stdio: ["pipe", "pipe", "inherit"] });
    const ended = new Promise<number | null>((done) => server.once("exit", done));
    try {
      const reader = new StreamMessageReader(server.stdout);
      const connection = createProtocolConnection(reader, new StreamMessageWriter(server.stdin));
      const sent: PublishDiagnosticsParams[] = [];
      const statuses: StatusChanged[] = [];
      connection.onNotification("textDocument/publishDiagnostics", (message: PublishDiagnosticsParams) => {
        sent.push(message);
      });
      connection.onNotification(statusChanged, (message: StatusChanged) => void statuses.push(message));
      connection.listen();
      await connection.sendRequest("initialize", {
        processId: process.pid,
        rootUri: null,
        workspaceFolders: [{ uri: fileUri(folder.path), name: "lab" }],
        capabilities: {},
        initializationOptions: { theme: "light", trusted: false },
      });
      await connection.sendNotification("initialized", {});
      const uri = fileUri(join(folder.path, "a.raterun"));
      const textDocument = { uri, languageId: "raterun", version: 1, text: decayRun };
      await connection.sendNotification("textDocument/didOpen", { textDocument });
      await until("the findings", () => statuses.some(({ state }) => state !== "working"));
      assert.equal(statuses.at(-1)?.state, "up to date");
      const codes = sent.at(-1)?.diagnostics.map(({ code }) => code) ?? [];
      assert.ok(codes.includes("unbalanced") && codes.includes("data-cell-word"), codes.join(", "));
      await connection.sendRequest("shutdown");
      await connection.sendNotification("exit");
      assert.equal(await ended, 0);
      connection.dispose();
    } finally {
      server.kill();
    }
  });
});
