// The language server in Node: dist/server.cjs. The client says by the arguments how it is spoken to.
import { join } from "node:path";
import { createConnection, ProposedFeatures } from "vscode-languageserver/node";
import { fencedReader } from "../host/node/fencedReader.js";
import { nodeFolders } from "../host/node/nodeFolders.js";
import { nodeReader } from "../host/node/nodeReader.js";
import { nodeWriter } from "../host/node/nodeWriter.js";
import { openThread } from "../host/node/workThread.js";
import { inlineComputer } from "../workspace/computer.js";
import { createBreathe } from "./breathe.js";
import { bySize } from "./compute/bySize.js";
import { workerComputer } from "./compute/workerComputer.js";
import { startServer } from "./server.js";

const script = join(__dirname, "worker.cjs");

startServer(createConnection(ProposedFeatures.all), {
  reader: (_, fence) => fencedReader(nodeReader(), fence),
  folders: (_, fence) => nodeFolders(fence),
  writer: () => nodeWriter(),
  computer: (log) =>
    bySize(
      inlineComputer(createBreathe()),
      workerComputer({ open: (events) => openThread(script, events), stopBy: "flag", log }),
    ),
});
