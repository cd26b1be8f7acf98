/**
 * The words of `known` that `word` may have been meant to be, nearest first, at most `limit`: those that differ in
 * case only, or else those one slip away (two for words of six letters and more); none where nothing is near.
 */
export function nearest(word: string, known: readonly string[], limit = 2): string[] {
  const allowed = word.length < 3 ? 1 : word.length < 6 ? 1.5 : 2.5;
  const near = known
    .map((candidate, index) => ({ candidate, index, away: slips(word, candidate) }))
    .filter(({ away, candidate }) => away <= allowed && away < candidate.length)
    .sort((a, b) => a.away - b.away || a.index - b.index);
  const caseOnly = near.filter(({ away }) => away < 1);
  return (caseOnly.length > 0 ? caseOnly : near).slice(0, limit).map(({ candidate }) => candidate);
}

/** Letters added, left out, changed or swapped with the next; a change of case counts a quarter. */
function slips(a: string, b: string): number {
  if (Math.abs(a.length - b.length) > 3 || a.length > 60) return Number.MAX_VALUE;
  let before: number[] = [];
  let last = Array.from({ length: b.length + 1 }, (_, index) => index);
  for (let i = 1; i <= a.length; i++) {
    const row = [i];
    for (let j = 1; j <= b.length; j++) {
      const change = cost(a.charAt(i - 1), b.charAt(j - 1));
      let best = Math.min((last[j] ?? 0) + 1, (row[j - 1] ?? 0) + 1, (last[j - 1] ?? 0) + change);
      const swapped = i > 1 && j > 1 && a.charAt(i - 1) === b.charAt(j - 2) && a.charAt(i - 2) === b.charAt(j - 1);
      if (swapped) best = Math.min(best, (before[j - 2] ?? 0) + 1);
      row.push(best);
    }
    before = last;
    last = row;
  }
  return last[b.length] ?? Number.MAX_VALUE;
}

function cost(a: string, b: string): number {
  if (a === b) return 0;
  return a.toLowerCase() === b.toLowerCase() ? 0.25 : 1;
}
