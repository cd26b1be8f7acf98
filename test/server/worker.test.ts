import assert from "node:assert/strict";
import { writeFileSync } from "node:fs";
import { join } from "node:path";
import { openThread } from "../../src/host/node/workThread.js";
import { bySize, workerFrom } from "../../src/server/compute/bySize.js";
import type { ToWorker } from "../../src/server/compute/jobMessages.js";
import { type EndableComputer, workerComputer } from "../../src/server/compute/workerComputer.js";
import type { OpenWorkLine } from "../../src/server/compute/workLine.js";
import { inlineComputer, type Job, sizeOfJob } from "../../src/workspace/computer.js";
import { temporaryFolder } from "../editor/temporaryFolder.js";
import { withDeadline } from "../editor/withDeadline.js";
import { decayCsv, decayRun } from "./decay.js";
import { workerBundle } from "./workerBundle.js";

const never = new AbortController().signal;

function jobOf(csv: string, key: string, curves = true): Job {
  const outcome = { kind: "bytes", bytes: new TextEncoder().encode(csv) } as const;
  const files = new Map([["data/a.csv", { key, outcome }]]);
  return { uri: "file:///lab/a.raterun", text: decayRun, path: "a.raterun", files, sizeLimit: 1e9, curves };
}

describe("findings worked out in a worker thread", () => {
  let script = "";
  let remove: () => void = () => undefined;
  let computer: EndableComputer;
  const posted: ToWorker[] = [];
  const log: string[] = [];

  before(async () => {
    ({ script, remove } = await workerBundle());
  });
  after(() => remove());
  beforeEach(() => {
    posted.length = 0;
    log.length = 0;
    const open: OpenWorkLine = (events) => {
      const line = openThread(script, events);
      return {
        ...line,
        post(message) {
          posted.push(message as ToWorker);
          line.post(message);
        },
      };
    };
    computer = workerComputer({ open, stopBy: "flag", log: (line) => void log.push(line) });
  });
  afterEach(() => computer.end());

  it("are those worked out in place, for more than 300 kB of readings", async () => {
    const job = jobOf(decayCsv(24_000, 0.05), "reading 1");
    assert.ok(sizeOfJob(job) > 300_000, String(sizeOfJob(job)));
    const there = await computer.compute(job, never);
    assert.ok(there?.runs[0]?.fits[0]?.parameters["k"]);
    assert.deepEqual(there, await inlineComputer(async () => {}).compute(job, never));
  });

  it("cost the bytes of a file once, however often the text changes", async () => {
    const job = jobOf(decayCsv(12_000, 0.1), "reading 1", false);
    await computer.compute(job, never);
    await computer.compute({ ...job, text: job.text.replace("25.0", "26.0") }, never);
    assert.deepEqual(
      posted.map(({ kind }) => kind),
      ["file", "job", "job"],
    );
    await computer.compute(jobOf(decayCsv(12_000, 0.2), "reading 2", false), never);
    assert.equal(posted.filter(({ kind }) => kind === "file").length, 2);
  });

  it("stop when told to: null at once, and the worker is soon free for the next job", async () => {
    const one = jobOf(decayCsv(100_000, 0.02), "reading 1");
    const long = {
      ...one,
      text: one.text + ["B", "C", "D", "E", "F", "G"].map((run) => `run ${run} like A\n`).join(""),
    };
    const whole = await timeOf(() => computer.compute(long, never));
    const abort = new AbortController();
    const changed = { ...long, text: long.text.replace("25.0", "26.0") };
    const stopping = computer.compute(changed, abort.signal);
    await new Promise((done) => setTimeout(done, whole / 10));
    abort.abort();
    const later = new Promise((done) => setImmediate(() => done("only after the message loop went round")));
    assert.equal(await Promise.race([stopping, later]), null);
    const next = await timeOf(() => computer.compute(jobOf(decayCsv(40), "reading 2"), never));
    assert.ok(next < whole / 2, `the next job took ${next} ms, the long one ${whole} ms`);
  });

  it("answer null to a job that was stopped before it began", async () => {
    assert.equal(await computer.compute(jobOf(decayCsv(40), "reading 1"), AbortSignal.abort()), null);
    assert.deepEqual(posted, []);
  });

  it("take only big jobs to the worker", async () => {
    const both = bySize(
      inlineComputer(async () => {}),
      computer,
    );
    assert.ok(await both.compute(jobOf(decayCsv(40), "reading 1"), never));
    assert.deepEqual(posted, []);
    const big = jobOf(decayCsv(12_000, 0.1), "reading 2", false);
    assert.ok(sizeOfJob(big) >= workerFrom);
    assert.ok(await both.compute(big, never));
    assert.equal(posted.length, 2);
  });
});

async function timeOf(act: () => Promise<unknown>): Promise<number> {
  const begin = performance.now();
  await act();
  return performance.now() - begin;
}

describe("a worker thread that ends by itself", () => {
  const folder = temporaryFolder("worker");
  after(() => folder.remove());
  const job = jobOf(decayCsv(40), "reading 1", false);

  /** A computer whose worker runs the given script. */
  function brokenBy(source: string, log: string[]): EndableComputer {
    const script = join(folder.path, "worker.cjs");
    writeFileSync(script, `const { parentPort } = require("node:worker_threads");\n${source}`);
    const open: OpenWorkLine = (events) => openThread(script, events, { maxOldGenerationSizeMb: 16 });
    return workerComputer({ open, stopBy: "flag", log: (line) => void log.push(line) });
  }
  const compute = (computer: EndableComputer) => withDeadline("the job", 20_000, computer.compute(job, never));

  it("is started anew; a job that takes it down twice is refused, never left hanging", async () => {
    const log: string[] = [];
    const computer = brokenBy(`parentPort.on("message", ({ kind }) => { if (kind === "job") process.exit(3); });`, log);
    await assert.rejects(compute(computer), /status 3/);
    assert.equal(log.length, 2);
    assert.match(log[0] ?? "", /ended: status 3/);
    computer.end();
  });

  it("does its job when only the first one broke", async () => {
    const log: string[] = [];
    const marker = JSON.stringify(join(folder.path, "broken-once"));
    const computer = brokenBy(
      `const { existsSync, writeFileSync } = require("node:fs");
       parentPort.on("message", ({ kind, id }) => {
         if (kind !== "job") return;
         if (existsSync(${marker})) parentPort.postMessage({ kind: "done", id, description: null });
         else { writeFileSync(${marker}, ""); throw new Error("once"); }
       });`,
      log,
    );
    assert.equal(await compute(computer), null);
    assert.equal(log.length, 1);
    assert.match(log[0] ?? "", /once/);
    computer.end();
  });

  it("says that its memory is full", async () => {
    const log: string[] = [];
    const computer = brokenBy(
      `parentPort.on("message", ({ kind }) => {
         const all = [];
         while (kind === "job") all.push(new Array(10000).fill(all.length).map((value) => ({ value })));
       });`,
      log,
    );
    await assert.rejects(compute(computer), /memory is full/);
    computer.end();
  });

  it("is refused where the script is not there", async () => {
    const log: string[] = [];
    const open: OpenWorkLine = (events) => openThread(join(folder.path, "gone.cjs"), events);
    const computer = workerComputer({ open, stopBy: "flag", log: (line) => void log.push(line) });
    await assert.rejects(compute(computer), /gone\.cjs/);
  });
});
