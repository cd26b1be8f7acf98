/**
 * Which of many readings a picture draws: all where there are at most `most`, else the first, the last,
 * and the lowest and the highest of each of (most - 2)/2 equal stretches of time, so that the outline the eye sees stays. Indices, ascending. Readings without a
 * time or a value are left out. `time` ascending.
 */
export function decimate(
  time: readonly (number | null)[],
  value: readonly (number | null)[],
  most: number,
): readonly number[] {
  const drawn: number[] = [];
  for (let i = 0; i < time.length; i++) {
    if (typeof time[i] === "number" && typeof value[i] === "number") drawn.push(i);
  }
  if (drawn.length <= most) return drawn;
  const start = time[drawn[0] as number] as number;
  const span = (time[drawn[drawn.length - 1] as number] as number) - start;
  const bins = Math.max(1, Math.floor((most - 2) / 2));
  const binOf = (index: number): number =>
    span > 0 ? Math.min(bins - 1, Math.floor((((time[index] as number) - start) / span) * bins)) : 0;
  const kept: number[] = [];
  let at = 0;
  while (at < drawn.length) {
    const bin = binOf(drawn[at] as number);
    let lowest = drawn[at] as number;
    let highest = lowest;
    for (; at < drawn.length && binOf(drawn[at] as number) === bin; at++) {
      const index = drawn[at] as number;
      if ((value[index] as number) < (value[lowest] as number)) lowest = index;
      if ((value[index] as number) > (value[highest] as number)) highest = index;
    }
    kept.push(Math.min(lowest, highest));
    if (lowest !== highest) kept.push(Math.max(lowest, highest));
  }
  return [...new Set([drawn[0] as number, ...kept, drawn[drawn.length - 1] as number])];
}
