/** Milliseconds of each of `rounds` calls, ascending, after `warm` calls that do not count. */
export function times(rounds: number, warm: number, work: (round: number) => void): number[] {
  for (let round = 0; round < warm; round++) work(round);
  const found = Array.from({ length: rounds }, (_, round) => {
    const begun = performance.now();
    work(warm + round);
    return performance.now() - begun;
  });
  return found.sort((a, b) => a - b);
}

/** The value below which a share of ascending values lies. */
export function quantile(ascending: readonly number[], share: number): number {
  return ascending[Math.min(ascending.length - 1, Math.floor(share * ascending.length))] ?? 0;
}

export const median = (ascending: readonly number[]): number => quantile(ascending, 0.5);

export const ms = (value: number): string => `${value.toPrecision(3)} ms`;
