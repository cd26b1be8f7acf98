/**
 * Waits for the work, but no longer than `limit` milliseconds; then it refuses with words that name the work.
 * The timer is cleared in either case: a timer left over would keep the process alive.
 */
export async function withDeadline<T>(what: string, limit: number, work: Promise<T>): Promise<T> {
  let timer: NodeJS.Timeout | undefined;
  const late = new Promise<never>((_, refuse) => {
    timer = setTimeout(() => refuse(new Error(`${what}: not done after ${Math.round(limit / 1000)} s`)), limit);
  });
  try {
    return await Promise.race([work, late]);
  } finally {
    clearTimeout(timer);
  }
}
