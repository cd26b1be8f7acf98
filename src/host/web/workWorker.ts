/** What a worker tells whoever started it. After `broken` nothing comes any more. */
export interface WorkerEvents {
  message(message: unknown): void;
  broken(words: string): void;
}

/** Starts a script as a web worker, under a name by which it knows its part. */
export function openWorker(script: string, name: string, events: WorkerEvents) {
  const worker = new Worker(script, { name });
  let over = false;
  const broken = (words: string): void => {
    if (over) return;
    over = true;
    worker.terminate();
    events.broken(words);
  };
  worker.addEventListener("message", ({ data }) => {
    if (!over) events.message(data);
  });
  worker.addEventListener("messageerror", () => broken("a message could not be read"));
  worker.addEventListener("error", ({ message }) => broken(message || "it could not be loaded"));
  return {
    post: (message: unknown): void => worker.postMessage(message),
    end(): void {
      over = true;
      worker.terminate();
    },
  };
}
