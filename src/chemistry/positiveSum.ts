import { type Fraction, negative, plus, times } from "../quantity/fraction.js";

/**
 * Whether some weights make every component of Σ weight·vector positive, decided exactly by elimination of one weight
 * after the other (Fourier–Motzkin). `vectors` are few and short; null where the elimination grows beyond what is
 * worth the wait.
 */
export function hasPositiveSum(vectors: readonly (readonly Fraction[])[]): boolean | null {
  const width = vectors[0]?.length ?? 0;
  let inequalities = Array.from({ length: width }, (_, place) => vectors.map((vector) => vector[place] ?? none));
  for (let weight = 0; weight < vectors.length; weight++) {
    const sign = (row: readonly Fraction[]): bigint => row[weight]?.num ?? 0n;
    const above = inequalities.filter((row) => sign(row) > 0n);
    const below = inequalities.filter((row) => sign(row) < 0n);
    const rest = inequalities.filter((row) => sign(row) === 0n);
    const joined = above.flatMap((low) => below.map((high) => eliminate(low, high, weight)));
    inequalities = [...rest, ...joined];
    if (inequalities.length > 4000) return null;
  }
  return inequalities.length === 0;
}

const none: Fraction = { num: 0n, den: 1n };

/** The sum of two rows, scaled so that the weight drops out: both say "greater than zero", so does their sum. */
function eliminate(low: readonly Fraction[], high: readonly Fraction[], weight: number): Fraction[] {
  const a = low[weight] ?? none;
  const b = negative(high[weight] ?? none);
  return low.map((value, place) => plus(times(value, b), times(high[place] ?? none, a)));
}
