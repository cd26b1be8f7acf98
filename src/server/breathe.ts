/** Longest time the message loop waits for a piece of work, ms. */
const longestPiece = 10;

/** Makes a function to call between pieces of work: about every 10 ms it lets the message loop have its turn. */
export function createBreathe(now: () => number = () => performance.now()): () => Promise<void> {
  let last = now();
  return async () => {
    if (now() - last < longestPiece) return;
    await new Promise<void>((done) => setTimeout(done, 0));
    last = now();
  };
}
