/**
 * A share as a percentage with two significant digits, three from 95 % on, never with an exponent: `100 %`, `38 %`,
 * `0.60 %`; "under 0.01 %" for what would round to less.
 */
export function percentText(share: number): string {
  const percent = 100 * share;
  if (percent > 0 && percent < 0.01) return "under 0.01 %";
  const size = Math.abs(percent);
  const decimals = size >= 99.95 ? 0 : size >= 95 ? 1 : size >= 9.95 ? 0 : size >= 0.995 ? 1 : size > 0 ? 2 : 0;
  return `${percent.toFixed(decimals).replace("-", "\u2212")} %`;
}
