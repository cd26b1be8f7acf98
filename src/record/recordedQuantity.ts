import type { P, Q } from "../contract/findings.js";
import type { Name } from "./names.js";
import type { RecordedCovariance, RecordedParameter, RecordedQuantity } from "./recordShape.js";
import { roundedCovariance, roundedPart, roundedU, roundedValue } from "./rounded.js";

/** A quantity with the digits a record keeps. */
export function recordedQuantity(what: string, { text, value, u, unit }: Q): RecordedQuantity {
  return { what, text, value: roundedValue(value, u), u: roundedU(u), unit };
}

/** A quantity that may be missing. */
export function maybeQuantity(what: () => string, quantity: Q | null): RecordedQuantity | null {
  return quantity === null ? null : recordedQuantity(what(), quantity);
}

export function recordedParameter(what: string, name: string, found: P): RecordedParameter {
  const { u, interval95, by, fixed, role, bound } = found;
  const { what: words, ...quantity } = recordedQuantity(what, found);
  return {
    what: words,
    name,
    ...quantity,
    uRandom: roundedPart(found.uRandom, u),
    uCommon: roundedPart(found.uCommon, u),
    uCorrelated: roundedPart(found.uCorrelated, u),
    interval95: interval95 === null ? null : interval95.map((end) => roundedValue(end, u)),
    by,
    fixed,
    role,
    bound,
  };
}

export function recordedParameters(
  item: string,
  parameters: Readonly<Record<string, P>>,
  name: Name,
): RecordedParameter[] {
  return Object.entries(parameters).map(([key, found]) => recordedParameter(name(item, key), key, found));
}

/** A row for each parameter; the place of its last digits follows from the two variances. */
export function recordedCovariance(
  item: string,
  found: { readonly names: readonly string[]; readonly matrix: readonly (readonly number[])[] } | null,
  name: Name,
): RecordedCovariance {
  if (found === null) return [];
  const { names, matrix } = found;
  const u = matrix.map((row, index) => Math.sqrt(row[index] ?? 0));
  return matrix.map((row, index) => ({
    what: name(item, `covariance of ${names[index] ?? ""}`),
    name: names[index] ?? "",
    with: [...names],
    values: row.map((entry, column) => roundedCovariance(entry, u[index] ?? 0, u[column] ?? 0)),
  }));
}
