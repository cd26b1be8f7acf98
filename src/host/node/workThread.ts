import { Worker } from "node:worker_threads";

/** What a thread tells whoever started it. After `broken` nothing comes any more. */
export interface ThreadEvents {
  message(message: unknown): void;
  broken(words: string): void;
}

/** Limits of a thread's memory, as `worker_threads` takes them; its own default where none is given. */
export interface ThreadLimits {
  readonly maxOldGenerationSizeMb?: number;
}

/** Starts a script as a thread. It does not keep the process alive. A script that cannot be started is `broken`. */
export function openThread(script: string, events: ThreadEvents, limits: ThreadLimits = {}) {
  const thread = new Worker(script, { resourceLimits: limits });
  let over = false;
  const broken = (words: string): void => {
    if (over) return;
    over = true;
    events.broken(words);
  };
  thread.unref();
  thread.on("message", (message: unknown) => {
    if (!over) events.message(message);
  });
  thread.on("messageerror", (error) => broken(error.message));
  thread.on("error", (error) => broken(wordsOf(error)));
  thread.on("exit", (status) => broken(`status ${status}`));
  return {
    post: (message: unknown): void => thread.postMessage(message),
    end(): void {
      over = true;
      void thread.terminate();
    },
  };
}

function wordsOf(error: unknown): string {
  if (!(error instanceof Error)) return String(error);
  return "code" in error && error.code === "ERR_WORKER_OUT_OF_MEMORY" ? "its memory is full" : error.message;
}
