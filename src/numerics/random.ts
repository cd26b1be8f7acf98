import { log } from "./elementary.js";

/** A seeded stream of pseudo-random numbers: the same seed gives the same numbers on every engine. */
export interface Random {
  /** evenly spread in [0, 1), 53 bits */
  uniform(): number;
  /** standard normal */
  normal(): number;
  /** integer from 0 to n − 1, each equally likely; n from 1 to 2^32 */
  integer(n: number): number;
}

/**
 * xoshiro128** 1.1 (D. Blackman and S. Vigna, Scrambled linear pseudorandom number generators, ACM TOMS 47 (2021) 36),
 * its state filled by SplitMix64 from the seed (any safe integer). Normals by Marsaglia's polar method
 * (G. Marsaglia and T. A. Bray, SIAM Review 6 (1964) 260–264) with the sealed logarithm.
 */
export function seededRandom(seed: number): Random {
  const next = xoshiro128(splitMixState(seed));
  let spare: number | null = null;
  const uniform = (): number => ((next() >>> 5) * 67108864 + (next() >>> 6)) / 9007199254740992;
  return {
    uniform,
    normal() {
      if (spare !== null) {
        const kept = spare;
        spare = null;
        return kept;
      }
      for (;;) {
        const u = 2 * uniform() - 1;
        const v = 2 * uniform() - 1;
        const s = u * u + v * v;
        if (s === 0 || s >= 1) continue;
        const factor = Math.sqrt((-2 * log(s)) / s);
        spare = v * factor;
        return u * factor;
      }
    },
    integer(n) {
      // values beyond the last whole multiple of n are thrown away, so that none is favoured
      const limit = 4294967296 - (4294967296 % n);
      for (;;) {
        const value = next();
        if (value < limit) return value % n;
      }
    },
  };
}

/** Generator of 32-bit words from a state of four 32-bit words, not all 0. */
export function xoshiro128(state: readonly [number, number, number, number]): () => number {
  let [a, b, c, d] = state.map((word) => word | 0) as [number, number, number, number];
  const rotate = (x: number, k: number): number => (x << k) | (x >>> (32 - k));
  return () => {
    const result = Math.imul(rotate(Math.imul(b, 5), 7), 9) >>> 0;
    const t = b << 9;
    c ^= a;
    d ^= b;
    b ^= c;
    a ^= d;
    c ^= t;
    d = rotate(d, 11);
    return result;
  };
}

/** The next SplitMix64 output and counter (G. L. Steele, D. Lea and C. H. Flood, OOPSLA 2014). */
export function splitMix64(counter: bigint): { counter: bigint; value: bigint } {
  const advanced = BigInt.asUintN(64, counter + 0x9e3779b97f4a7c15n);
  let z = advanced;
  z = BigInt.asUintN(64, (z ^ (z >> 30n)) * 0xbf58476d1ce4e5b9n);
  z = BigInt.asUintN(64, (z ^ (z >> 27n)) * 0x94d049bb133111ebn);
  return { counter: advanced, value: z ^ (z >> 31n) };
}

function splitMixState(seed: number): [number, number, number, number] {
  const first = splitMix64(BigInt.asUintN(64, BigInt(Math.trunc(seed))));
  const second = splitMix64(first.counter);
  const word = (value: bigint, shift: bigint): number => Number((value >> shift) & 0xffffffffn);
  return [word(first.value, 0n), word(first.value, 32n), word(second.value, 0n), word(second.value, 32n)];
}
