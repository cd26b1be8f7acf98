/** Significant digits that a record keeps of an uncertainty, and of a value down to the same place. */
const digitsOfU = 4;
/** Significant digits of a value without uncertainty. */
const digitsOfValue = 10;
/** A value keeps no more than this, however small its uncertainty: further digits differ between machines. */
const most = 12;
/** Significant digits of what describes a fit rather than results from it: its condition, a test's statistic. */
const digitsOfMeasure = 6;

/** The power of ten of the last digit that is kept beside a standard uncertainty; null where none is stated. */
export function placeOf(u: number | null): number | null {
  return u === null || u === 0 ? null : exponentOf(u) - digitsOfU + 1;
}

/** A value down to the place of the fourth digit of `u`; to 10 significant digits where there is none. */
export function roundedValue(value: number, u: number | null): number {
  const place = placeOf(u);
  return place === null ? significant(value, digitsOfValue) : roundedAt(value, place);
}

/** An uncertainty to four significant digits. */
export function roundedU(u: number | null): number | null {
  return u === null ? null : significant(u, digitsOfU);
}

/** A part of an uncertainty down to the place of the whole: what cancels but for the last bits is 0. */
export function roundedPart(part: number, u: number | null): number {
  return roundedValue(part, u ?? part);
}

/** A covariance down to the place that belongs to the product of the two uncertainties. */
export function roundedCovariance(covariance: number, uRow: number, uColumn: number): number {
  return roundedValue(covariance, uRow * uColumn);
}

export function roundedMeasure(value: number): number {
  return significant(value, digitsOfMeasure);
}

/** Down to the fourth decimal: shares, correlations, differences of information criteria. */
export function roundedDecimals(value: number): number {
  return roundedAt(value, -4);
}

/** How far two kept values may lie apart and still be the same: one unit of the last digit, which rounding may tip. */
export function lastDigit(value: number, u: number | null): number {
  return 1.5 * Number(`1e${placeOf(u) ?? exponentOf(value) - digitsOfValue + 1}`);
}

/** The same for a number that is kept to so many significant digits. */
export function lastSignificant(value: number, kind: "u" | "measure"): number {
  return 1.5 * Number(`1e${exponentOf(value) - (kind === "u" ? digitsOfU : digitsOfMeasure) + 1}`);
}

/** The same for what is kept to the fourth decimal. */
export const lastDecimal = 1.5e-4;

function roundedAt(value: number, place: number): number {
  if (value === 0) return 0;
  const digits = exponentOf(value) - place + 1;
  return digits < 1 ? 0 : significant(value, Math.min(digits, most));
}

/** Without a sign where it is zero. */
function significant(value: number, digits: number): number {
  return Number(value.toPrecision(digits)) + 0;
}

/** The power of ten of the leading digit; 0 for 0. */
function exponentOf(value: number): number {
  return Number(value.toExponential(15).split("e")[1]);
}
