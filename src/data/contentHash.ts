/**
 * SHA-256 (FIPS 180-4, section 6.2) of a file's bytes as 64 lower-case hexadecimal digits.
 *
 * Own code, because the hash is wanted synchronously and alike in Node and in a web worker: Web Crypto is
 * asynchronous and missing from insecure pages, and `node:crypto` is not there on the web.
 */
export function contentHash(bytes: Uint8Array): string {
  const state = Int32Array.from(initialState);
  const schedule = new Int32Array(64);
  const whole = bytes.length - (bytes.length % 64);
  for (let at = 0; at < whole; at += 64) mixBlock(state, schedule, bytes, at);
  const tail = padded(bytes, whole);
  for (let at = 0; at < tail.length; at += 64) mixBlock(state, schedule, tail, at);
  return Array.from(state, (word) => (word >>> 0).toString(16).padStart(8, "0")).join("");
}

/** The bytes from `whole` on, the bit 1, zeros, and the message's length in bits as 64 bits (section 5.1.1). */
function padded(bytes: Uint8Array, whole: number): Uint8Array {
  const rest = bytes.length - whole;
  const tail = new Uint8Array(rest < 56 ? 64 : 128);
  tail.set(bytes.subarray(whole));
  tail[rest] = 0x80;
  const view = new DataView(tail.buffer);
  view.setUint32(tail.length - 8, Math.floor(bytes.length / 0x20000000));
  view.setUint32(tail.length - 4, (bytes.length * 8) >>> 0);
  return tail;
}

/** One block of 64 bytes into the state; names as in the standard, section 6.2.2. */
function mixBlock(state: Int32Array, w: Int32Array, bytes: Uint8Array, at: number): void {
  for (let t = 0, i = at; t < 16; t++, i += 4) {
    w[t] = (bytes[i]! << 24) | (bytes[i + 1]! << 16) | (bytes[i + 2]! << 8) | bytes[i + 3]!;
  }
  for (let t = 16; t < 64; t++) {
    const x = w[t - 15]!;
    const y = w[t - 2]!;
    const small0 = ((x >>> 7) | (x << 25)) ^ ((x >>> 18) | (x << 14)) ^ (x >>> 3);
    const small1 = ((y >>> 17) | (y << 15)) ^ ((y >>> 19) | (y << 13)) ^ (y >>> 10);
    w[t] = (small1 + w[t - 7]! + small0 + w[t - 16]!) | 0;
  }
  let a = state[0]!;
  let b = state[1]!;
  let c = state[2]!;
  let d = state[3]!;
  let e = state[4]!;
  let f = state[5]!;
  let g = state[6]!;
  let h = state[7]!;
  for (let t = 0; t < 64; t++) {
    const big1 = ((e >>> 6) | (e << 26)) ^ ((e >>> 11) | (e << 21)) ^ ((e >>> 25) | (e << 7));
    const t1 = (h + big1 + ((e & f) ^ (~e & g)) + roundConstants[t]! + w[t]!) | 0;
    const big0 = ((a >>> 2) | (a << 30)) ^ ((a >>> 13) | (a << 19)) ^ ((a >>> 22) | (a << 10));
    const t2 = (big0 + ((a & b) ^ (a & c) ^ (b & c))) | 0;
    h = g;
    g = f;
    f = e;
    e = (d + t1) | 0;
    d = c;
    c = b;
    b = a;
    a = (t1 + t2) | 0;
  }
  state[0] = state[0]! + a;
  state[1] = state[1]! + b;
  state[2] = state[2]! + c;
  state[3] = state[3]! + d;
  state[4] = state[4]! + e;
  state[5] = state[5]! + f;
  state[6] = state[6]! + g;
  state[7] = state[7]! + h;
}

/**
 * First 32 bits of the fractional parts of the square and cube roots of the first primes (sections 5.3.3 and 4.2.2),
 * computed exactly in integers: floor(root(p × 2^(n·32))) modulo 2^32.
 */
const primes = firstPrimes(64);
const initialState = primes.slice(0, 8).map((prime) => rootBits(prime, 2n));
const roundConstants = Int32Array.from(primes, (prime) => rootBits(prime, 3n));

function firstPrimes(count: number): number[] {
  const found: number[] = [];
  for (let candidate = 2; found.length < count; candidate++) {
    if (found.every((prime) => candidate % prime !== 0)) found.push(candidate);
  }
  return found;
}

function rootBits(prime: number, degree: bigint): number {
  const radicand = BigInt(prime) << (32n * degree);
  let low = 0n;
  let high = 1n << 40n;
  while (low < high) {
    const middle = (low + high + 1n) >> 1n;
    const power = degree === 2n ? middle * middle : middle * middle * middle;
    if (power <= radicand) low = middle;
    else high = middle - 1n;
  }
  return Number(BigInt.asIntN(32, low));
}
