import { columnStore } from "../../workspace/columnStore.js";
import { computeJob, type Job } from "../../workspace/computer.js";
import type { DataFileState } from "../../workspace/fileContent.js";
import type { FromWorker, SentFile, SentJob, ToWorker } from "./jobMessages.js";

/** The worker's side: keeps the bytes it was sent and does one job after the other. Give it every message. */
export function serveJobs(answer: (message: FromWorker) => void): (message: ToWorker) => void {
  const store = columnStore();
  const kept = new Map<string, Uint8Array>();
  let last: Promise<void> = Promise.resolve();

  const work = async (id: number, sent: SentJob, stop: Int32Array | null): Promise<void> => {
    const stopped = (): boolean => stop !== null && Atomics.load(stop, 0) !== 0;
    try {
      const files = new Map([...sent.files].map(([path, file]) => [path, stateOf(file, kept)]));
      const job: Job = { ...sent, files };
      const description = stopped() ? null : await computeJob(job, { store, stopped, breathe: async () => {} });
      answer({ kind: "done", id, description });
    } catch (error) {
      answer({ kind: "failed", id, words: error instanceof Error ? (error.stack ?? error.message) : String(error) });
    }
  };

  // Everything in the order it came: a job that was asked for before may still need bytes that are to be forgotten.
  return (message) => {
    last = last.then(() => {
      if (message.kind === "job") return work(message.id, message.job, message.stop);
      if (message.kind === "file") kept.set(message.key, message.bytes);
      else kept.delete(message.key);
    });
  };
}

function stateOf(file: SentFile, kept: ReadonlyMap<string, Uint8Array>): DataFileState {
  if (!("sent" in file)) return file;
  const bytes = kept.get(file.sent);
  if (bytes === undefined) throw new Error(`the bytes of ${file.sent} never came`);
  return { key: file.sent, outcome: { kind: "bytes", bytes } };
}
