import assert from "node:assert/strict";
import type { FromWorker, ToWorker } from "../../src/server/compute/jobMessages.js";
import { createSentFiles } from "../../src/server/compute/sentFiles.js";
import { serveJobs } from "../../src/server/compute/serveJobs.js";
import { workerComputer } from "../../src/server/compute/workerComputer.js";
import { inlineComputer, type Job } from "../../src/workspace/computer.js";
import { decayCsv, decayRun } from "./decay.js";

const never = new AbortController().signal;

function jobOf(key: string): Job {
  const outcome = { kind: "bytes", bytes: new TextEncoder().encode(decayCsv(40)) } as const;
  const files = new Map([["data/a.csv", { key, outcome }]]);
  return { uri: "file:///lab/a.raterun", text: decayRun, path: "a.raterun", files, sizeLimit: 1e9, curves: false };
}

interface Opened {
  ended: boolean;
  readonly posted: ToWorker[];
  pass: () => void;
}

/** Workers as on the web, whose messages pass only when told; all in this thread. */
function workers() {
  const opened: Opened[] = [];
  const computer = workerComputer({
    stopBy: "end",
    log: () => undefined,
    open({ message }) {
      const worker: Opened = { ended: false, posted: [], pass: () => undefined };
      const take = serveJobs((answer: FromWorker) => {
        if (!worker.ended) message(structuredClone(answer));
      });
      worker.pass = () => {
        for (const held of worker.posted) take(held);
      };
      opened.push(worker);
      return {
        post: (held) => void worker.posted.push(structuredClone(held as ToWorker)),
        end: () => {
          worker.ended = true;
        },
      };
    },
  });
  return { computer, opened };
}

describe("a worker that can only be stopped by ending it", () => {
  it("is ended with the job, and another job that waited there is done by the next worker, bytes and all", async () => {
    const { computer, opened } = workers();
    const abort = new AbortController();
    const stopped = computer.compute(jobOf("reading 1"), abort.signal);
    const waiting = computer.compute(jobOf("reading 2"), never);
    abort.abort();
    assert.equal(await stopped, null);
    await new Promise((done) => setTimeout(done, 0));
    assert.equal(opened.length, 2);
    assert.equal(opened[0]?.ended, true);
    assert.deepEqual(
      opened[1]?.posted.map(({ kind }) => kind),
      ["file", "job"],
    );
    opened[1]?.pass();
    assert.deepEqual(await waiting, await inlineComputer(async () => {}).compute(jobOf("reading 2"), never));
  });

  it("answers null to whatever waits when the computer is ended", async () => {
    const { computer, opened } = workers();
    const waiting = computer.compute(jobOf("reading 1"), never);
    computer.end();
    assert.equal(await waiting, null);
    assert.equal(opened.length, 1);
  });
});

describe("the files a worker holds", () => {
  it("are let go, longest unused first, beyond the budget; what the job needs stays", () => {
    const sent = createSentFiles(100);
    assert.equal(sent.use("a", 60), true);
    assert.equal(sent.use("b", 60), true);
    assert.equal(sent.use("a", 60), false);
    assert.deepEqual(sent.surplus(new Set()), ["b"]);
    assert.equal(sent.use("b", 60), true);
    assert.equal(sent.use("c", 500), true);
    assert.deepEqual(sent.surplus(new Set(["c"])), ["a"]);
    assert.deepEqual(sent.surplus(new Set()), ["b", "c"]);
  });
});
