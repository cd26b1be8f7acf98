/** An exact rational number, `den` positive, in lowest terms. Unit factors and balances are computed in these. */
export interface Fraction {
  readonly num: bigint;
  readonly den: bigint;
}

export const zero: Fraction = { num: 0n, den: 1n };
export const one: Fraction = { num: 1n, den: 1n };

export function greatestCommonDivisor(a: bigint, b: bigint): bigint {
  let x = a < 0n ? -a : a;
  let y = b < 0n ? -b : b;
  while (y !== 0n) [x, y] = [y, x % y];
  return x;
}

/** num/den in lowest terms; `den` is not zero. */
export function fraction(num: bigint, den: bigint = 1n): Fraction {
  if (num === 0n) return zero;
  const common = greatestCommonDivisor(num, den);
  const sign = den < 0n ? -1n : 1n;
  return { num: (sign * num) / common, den: (sign * den) / common };
}

export function plus(a: Fraction, b: Fraction): Fraction {
  return fraction(a.num * b.den + b.num * a.den, a.den * b.den);
}

export function times(a: Fraction, b: Fraction): Fraction {
  return fraction(a.num * b.num, a.den * b.den);
}

/** a/b; `b` is not zero. */
export function over(a: Fraction, b: Fraction): Fraction {
  return fraction(a.num * b.den, a.den * b.num);
}

export function negative(a: Fraction): Fraction {
  return { num: -a.num, den: a.den };
}

/** Whole powers; of zero only positive ones. */
export function power(a: Fraction, exponent: number): Fraction {
  const size = BigInt(Math.abs(exponent));
  return exponent < 0 ? fraction(a.den ** size, a.num ** size) : { num: a.num ** size, den: a.den ** size };
}

/** The decimal number `text` (`12.5`, `1e-7`, `-3`) without rounding. */
export function decimal(text: string): Fraction {
  const [mantissa = "0", exponent = "0"] = text.toLowerCase().split("e");
  const [whole = "0", digits = ""] = mantissa.split(".");
  const shift = Number(exponent) - digits.length;
  const value = BigInt(whole + digits);
  return shift < 0 ? fraction(value, 10n ** BigInt(-shift)) : fraction(value * 10n ** BigInt(shift));
}

/** The nearest double (round half to even); infinite or zero where it is out of range. */
export function toNumber(a: Fraction): number {
  if (a.num === 0n) return 0;
  const size = a.num < 0n ? -a.num : a.num;
  const shift = 66 - (bits(size) - bits(a.den));
  const top = shift > 0 ? size << BigInt(shift) : size;
  const bottom = shift < 0 ? a.den << BigInt(-shift) : a.den;
  const quotient = top / bottom;
  const sticky = quotient * bottom === top ? 0n : 1n;
  const magnitude = scaled(Number((quotient << 1n) | sticky), -shift - 1);
  return a.num < 0n ? -magnitude : magnitude;
}

/**
 * a^(numerator/denominator) of a positive fraction to about 64 bits: whole-number Newton steps on a scaled integer,
 * so that it is the same on every engine. The denominator is at most 1000.
 */
export function toNumberRaised(a: Fraction, numerator: number, denominator: number): number {
  const raised = power(a, numerator);
  if (denominator === 1) return toNumber(raised);
  const root = BigInt(denominator);
  const guard = 70 + Math.max(0, Math.ceil((bits(raised.den) - bits(raised.num)) / denominator));
  const target = (raised.num << (BigInt(guard) * root)) / raised.den;
  return toNumber(fraction(wholeRoot(target, root), 1n << BigInt(guard)));
}

/** The greatest whole number whose `degree`-th power is at most `value`. */
function wholeRoot(value: bigint, degree: bigint): bigint {
  let guess = 1n << (BigInt(bits(value)) / degree + 1n);
  for (;;) {
    const next = ((degree - 1n) * guess + value / guess ** (degree - 1n)) / degree;
    if (next >= guess) return guess;
    guess = next;
  }
}

function bits(value: bigint): number {
  const hex = value.toString(16);
  return hex.length * 4 - (Math.clz32(Number.parseInt(hex.charAt(0), 16)) - 28);
}

/** value × 2^exponent by exact steps. */
function scaled(value: number, exponent: number): number {
  let result = value;
  let left = exponent;
  while (left >= 30) {
    result *= 1073741824;
    left -= 30;
  }
  while (left <= -30) {
    result /= 1073741824;
    left += 30;
  }
  return left >= 0 ? result * (1 << left) : result / (1 << -left);
}
