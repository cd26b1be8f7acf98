/**
 * Exponents of the seven base quantities, in the order length, mass, time, electric current, thermodynamic
 * temperature, amount of substance, luminous intensity (SI Brochure, 9th edition, table 2). Halves occur in the
 * units of rate constants of fractional order.
 */
export type Dimension = readonly [number, number, number, number, number, number, number];

export const dimensionless: Dimension = [0, 0, 0, 0, 0, 0, 0];

export function sameDimension(a: Dimension, b: Dimension): boolean {
  return a.every((exponent, index) => exponent === b[index]);
}

export function product(a: Dimension, b: Dimension): Dimension {
  return combine(a, b, 1);
}

export function quotient(a: Dimension, b: Dimension): Dimension {
  return combine(a, b, -1);
}

export function raised(a: Dimension, exponent: number): Dimension {
  return combine(dimensionless, a, exponent);
}

function combine(a: Dimension, b: Dimension, weight: number): Dimension {
  const at = (index: number): number => (a[index] ?? 0) + weight * (b[index] ?? 0);
  return [at(0), at(1), at(2), at(3), at(4), at(5), at(6)];
}
