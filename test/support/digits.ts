import assert from "node:assert/strict";

/** Correct significant digits of `value` against `certified`: −log10 of the relative difference, 16 where equal. */
export function correctDigits(value: number, certified: number): number {
  if (value === certified) return 16;
  return -Math.log10(Math.abs(value - certified) / Math.abs(certified));
}

/** Asserts that a value has at least so many correct digits. */
export function assertDigits(what: string, value: number | null | undefined, certified: number, least: number): void {
  assert.ok(typeof value === "number", `${what} is missing`);
  const digits = correctDigits(value, certified);
  assert.ok(digits >= least, `${what}: ${value} against ${certified}, ${digits.toFixed(1)} digits, ${least} wanted`);
}
