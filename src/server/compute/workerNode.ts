// What runs inside the worker thread of the Node server: dist/worker.cjs.
import { parentPort } from "node:worker_threads";
import type { ToWorker } from "./jobMessages.js";
import { serveJobs } from "./serveJobs.js";

const take = serveJobs((message) => parentPort?.postMessage(message));
parentPort?.on("message", (message: ToWorker) => take(message));
