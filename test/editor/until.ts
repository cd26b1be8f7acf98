import { setTimeout as pause } from "node:timers/promises";

/** Pause between two looks, ms. */
const interval = 25;

/**
 * Looks again and again until there is something to see, and answers with it; refuses after `limit` ms (15,000 unless
 * told) with words that name what did not come.
 */
export async function until<T>(what: string, look: () => T | Promise<T>, limit = 15_000): Promise<NonNullable<T>> {
  const end = performance.now() + limit;
  for (;;) {
    const seen = await look();
    if (seen) return seen;
    if (performance.now() > end) throw new Error(`not within ${limit / 1000} s: ${what}`);
    await pause(interval);
  }
}
