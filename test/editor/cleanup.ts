import { withDeadline } from "./withDeadline.js";

/** Longest time one step of a clean-up may take, ms. */
const stepLimit = 15_000;

/** What must be undone at the end, last in, first out. */
export interface Cleanup {
  /** Remembers a step; `words` name it should it fail. */
  add(words: string, step: () => void | Promise<void>): void;
  /** Does all steps, each under a time-out, and only then refuses with the first failure. A second call does nothing. */
  run(): Promise<void>;
}

export function createCleanup(): Cleanup {
  const steps: { words: string; step: () => void | Promise<void> }[] = [];
  return {
    add(words, step) {
      steps.push({ words, step });
    },
    async run() {
      const failures: unknown[] = [];
      for (let last = steps.pop(); last !== undefined; last = steps.pop()) {
        try {
          await withDeadline(last.words, stepLimit, Promise.resolve(last.step()));
        } catch (failure) {
          failures.push(failure);
        }
      }
      if (failures.length > 0) throw failures[0];
    },
  };
}
