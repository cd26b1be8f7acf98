// The language server in a web worker: dist/server.web.js. The same script is the worker that works out findings, under
// a name of its own, so that only one script need be loaded.
import { BrowserMessageReader, BrowserMessageWriter, createConnection } from "vscode-languageserver/browser";
import {
  type ListFolder,
  type ListFolderAnswer,
  listFolder,
  type ReadFile,
  type ReadFileAnswer,
  readFile,
} from "../contract/editorProtocol.js";
import { type WriteFile, type WriteFileAnswer, writeFile } from "../contract/recordProtocol.js";
import { requestFolders } from "../host/web/requestFolders.js";
import { requestReader } from "../host/web/requestReader.js";
import { requestWriter } from "../host/web/requestWriter.js";
import { openWorker } from "../host/web/workWorker.js";
import { inlineComputer } from "../workspace/computer.js";
import { createBreathe } from "./breathe.js";
import { bySize } from "./compute/bySize.js";
import type { ToWorker } from "./compute/jobMessages.js";
import { serveJobs } from "./compute/serveJobs.js";
import { workerComputer } from "./compute/workerComputer.js";
import { startServer } from "./server.js";

const workerName = "ratewright findings";
/** The global scope; the types of a worker's own scope and of a page exclude each other, and a worker's port is alike. */
const scope = globalThis as unknown as Worker & { readonly name: string; readonly location: Location };

if (scope.name === workerName) {
  const take = serveJobs((message) => scope.postMessage(message));
  scope.addEventListener("message", ({ data }: MessageEvent<ToWorker>) => take(data));
} else {
  startServer(createConnection(new BrowserMessageReader(scope), new BrowserMessageWriter(scope)), {
    reader: (connection) =>
      requestReader((uri, limit) => {
        const question: ReadFile = { uri, limit };
        return connection.sendRequest<ReadFileAnswer>(readFile, question);
      }),
    folders: (connection) =>
      requestFolders((uri) => {
        const question: ListFolder = { uri };
        return connection.sendRequest<ListFolderAnswer>(listFolder, question);
      }),
    writer: (connection) =>
      requestWriter(async (uri, text) => {
        const question: WriteFile = { uri, text };
        return (await connection.sendRequest<WriteFileAnswer>(writeFile, question)).refusal;
      }),
    computer: (log) =>
      bySize(
        inlineComputer(createBreathe()),
        workerComputer({ open: (events) => openWorker(scope.location.href, workerName, events), stopBy: "end", log }),
      ),
  });
}
