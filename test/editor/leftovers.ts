/**
 * What must not outlive this process, however it ends: started processes and temporary folders. An orderly end removes
 * them one by one; this list is for the other ends (a crash, Ctrl-C, the runner's time-out).
 */
const leftovers = new Set<() => void>();
let watching = false;

/** Registers a synchronous step for the end of the process; the answer takes it off the list again. */
export function atExit(step: () => void): () => void {
  if (!watching) {
    watching = true;
    process.once("exit", () => {
      for (const leftover of [...leftovers].reverse()) leftover();
    });
    for (const signal of ["SIGINT", "SIGTERM", "SIGHUP"] as const) {
      // Whoever else listens to the signal ends the process in an orderly way.
      process.once(signal, () => process.listenerCount(signal) === 0 && process.exit(130));
    }
  }
  leftovers.add(step);
  return () => leftovers.delete(step);
}
