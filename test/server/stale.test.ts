import assert from "node:assert/strict";
import { CancellationTokenSource } from "vscode-languageserver/node";
import type { Description } from "../../src/contract/findings.js";
import type { EndableComputer } from "../../src/server/compute/workerComputer.js";
import { inlineComputer, type Job } from "../../src/workspace/computer.js";
import { until } from "../editor/until.js";
import { decayCsv, decayRun } from "./decay.js";
import { type EditorClient, startEditorClient } from "./editorClient.js";

/** A computer that answers when it is let: each job waits for its turn, and none heeds the signal by itself. */
function heldComputer() {
  const inner = inlineComputer(async () => {});
  const jobs: { job: Job; signal: AbortSignal; release: () => Promise<void> }[] = [];
  const computer: EndableComputer = {
    compute(job, signal) {
      return new Promise<Description | null>((done, refuse) => {
        const release = async (): Promise<void> => {
          await inner.compute(job, new AbortController().signal).then(done, refuse);
        };
        jobs.push({ job, signal, release });
      });
    },
    end: () => undefined,
  };
  return { computer, jobs };
}

const wrongHeader = decayRun.replace('"time / s"', '"tme / s"');
const files = { "data/a.csv": decayCsv() };

describe("answers that come late", () => {
  let client: EditorClient;
  afterEach(() => client.end());

  it("are stopped by the next keystroke and dropped when they come all the same", async () => {
    const { computer, jobs } = heldComputer();
    client = await startEditorClient({ files, computer });
    await client.open("a.raterun", wrongHeader);
    await until("the first job", () => jobs.length === 1);
    await client.edit("a.raterun", "tme", "time");
    await until("the second job", () => jobs.length === 2);
    assert.equal(jobs[0]?.signal.aborted, true);
    assert.equal(jobs[1]?.signal.aborted, false);
    await jobs[1]?.release();
    await client.settled("a.raterun");
    await jobs[0]?.release();
    await client.fixes("a.raterun", "->");
    assert.deepEqual(client.codes("a.raterun"), ["unbalanced 2"]);
    assert.ok(client.sent.every(({ diagnostics }) => diagnostics.every(({ code }) => code === "unbalanced")));
  });

  it("carry the version of the text they speak of", async () => {
    client = await startEditorClient({ files });
    await client.open("a.raterun", decayRun);
    await client.edit("a.raterun", "25.0", "µ");
    await client.settled("a.raterun");
    assert.deepEqual(
      client.sent.map(({ version }) => version),
      [1, 2, ...client.sent.slice(2).map(() => 2)],
    );
  });

  it("leave no hover about a text that is no more", async () => {
    const { computer, jobs } = heldComputer();
    client = await startEditorClient({ files, computer, delay: 60_000 });
    await client.open("a.raterun", decayRun);
    await until("the findings' job", () => jobs.length === 1);
    const hovering = client.hover("a.raterun", "column c");
    await until("the hover's job", () => jobs.length === 2);
    await client.edit("a.raterun", "column t", "column  t");
    await client.fixes("a.raterun", "->");
    await jobs[1]?.release();
    assert.equal(await hovering, null);
  });

  it("are not worked on any longer when a hover is called off", async () => {
    const { computer, jobs } = heldComputer();
    client = await startEditorClient({ files, computer, delay: 60_000 });
    await client.open("a.raterun", decayRun);
    await until("the findings' job", () => jobs.length === 1);
    const source = new CancellationTokenSource();
    const position = { line: 7, character: 6 };
    const textDocument = { uri: "file:///lab/a.raterun" };
    const hovering = client.connection.sendRequest("textDocument/hover", { textDocument, position }, source.token);
    hovering.catch(() => undefined);
    await until("the hover's job", () => jobs.length === 2);
    source.cancel();
    await until("the job is told to stop", () => jobs[1]?.signal.aborted);
    await jobs[1]?.release();
  });

  it("that fail are said in the log and the status, and the next one is worked out", async () => {
    let broken = true;
    const inner = inlineComputer(async () => {});
    const computer: EndableComputer = {
      compute: (job, signal) => (broken ? Promise.reject(new Error("no memory")) : inner.compute(job, signal)),
      end: () => undefined,
    };
    client = await startEditorClient({ files, computer });
    await client.open("a.raterun", wrongHeader);
    await until("the failure", () => client.statuses.some(({ state }) => state === "failed"));
    assert.ok(client.log.some((line) => line.includes("no memory")));
    assert.deepEqual(client.codes("a.raterun"), ["unbalanced 2"]);
    broken = false;
    await client.edit("a.raterun", "25.0", "26.0");
    await client.settled("a.raterun");
    assert.deepEqual(client.codes("a.raterun"), ["unbalanced 2", "data-column-missing 7"]);
  });
});
