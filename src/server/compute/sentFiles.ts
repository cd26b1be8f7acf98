/** Which files a worker holds, so that their bytes cross once and those not used any more are let go. */
export interface SentFiles {
  /** Marks the file as used now; true where its bytes must be sent. */
  use(key: string, size: number): boolean;
  /** Keys of the files used longest ago that the worker should forget, to stay within the budget. */
  surplus(needed: ReadonlySet<string>): string[];
}

/** `budget`: bytes the worker may hold beyond what the job at hand needs. */
export function createSentFiles(budget = 128e6): SentFiles {
  const sizes = new Map<string, number>();
  return {
    use(key, size) {
      const known = sizes.delete(key);
      sizes.set(key, size);
      return !known;
    },
    surplus(needed) {
      const gone: string[] = [];
      let total = [...sizes].reduce((sum, [key, size]) => (needed.has(key) ? sum : sum + size), 0);
      for (const [key, size] of sizes) {
        if (total <= budget) break;
        if (needed.has(key)) continue;
        sizes.delete(key);
        gone.push(key);
        total -= size;
      }
      return gone;
    },
  };
}
