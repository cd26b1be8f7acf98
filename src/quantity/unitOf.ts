import { type Dimension, dimensionless, product, raised } from "./dimension.js";
import { type Fraction, one, power, times, toNumber, toNumberRaised } from "./fraction.js";
import { symbolOf } from "./symbols.js";
import type { Unit, UnitPart } from "./unit.js";

/** A plain number: factor 1, no dimension, no text. */
export const noUnit: Unit = { dimension: dimensionless, factor: 1, offset: 0, parts: [], text: "" };

/**
 * The unit made of `parts`, in their order, equal symbols merged; exponents keep three decimals. The factor is
 * computed exactly and rounded once. A lone °C keeps its zero point; in a product it counts as a difference. Null
 * where a symbol is not known or the factor leaves the range of numbers.
 */
export function unitOf(parts: readonly UnitPart[]): Unit | null {
  const merged = merge(parts);
  let dimension: Dimension = dimensionless;
  let whole: Fraction = one;
  let factor = 1;
  for (const { symbol, exponent } of merged) {
    const known = symbolOf(symbol);
    if (known === null) return null;
    dimension = product(dimension, raised(known.dimension, exponent));
    const thousandths = Math.round(exponent * 1000);
    const common = divisor(Math.abs(thousandths), 1000);
    if (common === 1000) whole = times(whole, power(known.factor, exponent));
    else factor *= toNumberRaised(known.factor, thousandths / common, 1000 / common);
  }
  factor *= toNumber(whole);
  if (!Number.isFinite(factor) || factor === 0) return null;
  const [first] = merged;
  const lone = merged.length === 1 && first !== undefined && first.exponent === 1 ? symbolOf(first.symbol) : null;
  const offset = lone?.offset ? toNumber(lone.offset) : 0;
  return {
    dimension: dimension.map(tidy) as unknown as Dimension,
    factor,
    offset,
    parts: merged,
    text: textOf(merged),
  };
}

/** SI Brochure style in ASCII: `mol L^-1 s^-1`, `L^0.5 mol^-0.5 s^-1`. */
function textOf(parts: readonly UnitPart[]): string {
  return parts.map(({ symbol, exponent }) => (exponent === 1 ? symbol : `${symbol}^${exponent}`)).join(" ");
}

function merge(parts: readonly UnitPart[]): UnitPart[] {
  const exponents = new Map<string, number>();
  for (const { symbol, exponent } of parts) {
    const name = symbolOf(symbol)?.symbol ?? symbol;
    exponents.set(name, (exponents.get(name) ?? 0) + exponent);
  }
  return [...exponents]
    .map(([symbol, exponent]) => ({ symbol, exponent: tidy(exponent) }))
    .filter(({ exponent }) => exponent !== 0);
}

/** Three decimals, no negative zero. */
function tidy(exponent: number): number {
  return Math.round(exponent * 1000) / 1000 + 0;
}

function divisor(a: number, b: number): number {
  return a === 0 ? b : divisor(b % a, a);
}
