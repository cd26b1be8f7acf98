import type { Description } from "../../contract/findings.js";
import type { Computer, Job } from "../../workspace/computer.js";
import type { FromWorker, SentFile, ToWorker } from "./jobMessages.js";
import { createSentFiles, type SentFiles } from "./sentFiles.js";
import type { OpenWorkLine, WorkLine } from "./workLine.js";

/** A computer with something to end when it is not needed any more. */
export interface EndableComputer extends Computer {
  end(): void;
}

export interface WorkerOptions {
  readonly open: OpenWorkLine;
  /** how a job is stopped: by a flag both sides see, or by ending the worker */
  readonly stopBy: "flag" | "end";
  readonly log: (line: string) => void;
}

interface Waiting {
  readonly done: (description: Description | null) => void;
  readonly refuse: (why: Error) => void;
}

interface Running {
  readonly line: WorkLine;
  readonly sent: SentFiles;
  readonly waiting: Map<number, Waiting>;
}

/**
 * Works out findings in a worker, started at the first job. A worker that ends by itself is said in the log and started
 * anew; a job it takes down twice is refused. A job that is told to stop answers null at once.
 */
export function workerComputer({ open, stopBy, log }: WorkerOptions): EndableComputer {
  let running: Running | null = null;
  let lastId = 0;
  let over = false;

  const start = (): Running => {
    const sent = createSentFiles();
    const waiting = new Map<number, Waiting>();
    const line = open({
      message(message) {
        const answer = message as FromWorker;
        const asked = waiting.get(answer.id);
        waiting.delete(answer.id);
        if (answer.kind === "done") asked?.done(answer.description);
        else asked?.refuse(new Error(answer.words));
      },
      broken(words) {
        if (running?.line !== line) return;
        running = null;
        log(`The worker that works out findings ended: ${words}. Another one is started when it is needed.`);
        for (const { refuse } of waiting.values()) refuse(new WorkerGone(words, "broken"));
      },
    });
    return { line, sent, waiting };
  };

  const endWorker = (): void => {
    const before = running;
    running = null;
    before?.line.end();
    for (const { refuse } of before?.waiting.values() ?? []) refuse(new WorkerGone("it was ended", "ended"));
  };

  const attempt = (job: Job, signal: AbortSignal): Promise<Description | null> => {
    running ??= start();
    const { line, sent, waiting } = running;
    const id = ++lastId;
    const stop = stopBy === "flag" ? new Int32Array(new SharedArrayBuffer(4)) : null;
    const post = (message: ToWorker): void => line.post(message);
    return new Promise((done, refuse) => {
      const stopJob = (): void => {
        waiting.delete(id);
        done(null);
        if (stop !== null) Atomics.store(stop, 0, 1);
        // Whoever else waits for this worker is asked again by `compute`.
        else if (running?.line === line) endWorker();
      };
      const settle = <T>(then: (value: T) => void) => {
        return (value: T) => {
          signal.removeEventListener("abort", stopJob);
          then(value);
        };
      };
      waiting.set(id, { done: settle(done), refuse: settle(refuse) });
      signal.addEventListener("abort", stopJob, { once: true });
      post({ kind: "job", id, job: { ...job, files: sendFiles(job, sent, post) }, stop });
    });
  };

  return {
    async compute(job, signal) {
      let broken = 0;
      while (!signal.aborted && !over) {
        try {
          return await attempt(job, signal);
        } catch (error) {
          if (!(error instanceof WorkerGone)) throw error;
          if (error.how === "broken" && ++broken > 1) throw error;
        }
      }
      return null;
    },
    end() {
      over = true;
      endWorker();
    },
  };
}

/** The worker is gone, and with it the job: it broke, or it was ended to stop another job. */
class WorkerGone extends Error {
  constructor(
    words: string,
    readonly how: "broken" | "ended",
  ) {
    super(words);
  }
}

/** Sends the bytes the worker does not hold yet; the files of the job without them. */
function sendFiles(job: Job, sent: SentFiles, post: (message: ToWorker) => void): Map<string, SentFile> {
  const files = new Map<string, SentFile>();
  const needed = new Set<string>();
  for (const [path, state] of job.files) {
    if (!("outcome" in state) || state.outcome.kind !== "bytes") {
      files.set(path, state);
      continue;
    }
    const { key, outcome } = state;
    if (sent.use(key, outcome.bytes.length)) post({ kind: "file", key, bytes: outcome.bytes });
    files.set(path, { sent: key });
    needed.add(key);
  }
  for (const key of sent.surplus(needed)) post({ kind: "forget", key });
  return files;
}
