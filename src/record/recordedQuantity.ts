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

/** What does not apply to a parameter is left out. */
export function recordedParameter(what: string, name: string, found: P): RecordedParameter {
  const { u, interval95, by, fixed, bound } = found;
  const { what: words, ...quantity } = recordedQuantity(what, found);
  const parts = { uRandom: found.uRandom, uCommon: found.uCommon, uCorrelated: found.uCorrelated };
  const known = Object.entries(parts).flatMap(([key, part]) => (part === null ? [] : [[key, roundedPart(part, u)]]));
  return {
    what: words,
    name,
    ...quantity,
    ...Object.fromEntries(known),
    ...(interval95 === null ? {} : { interval95: interval95.map((end) => roundedValue(end, u)) }),
    ...(by === null ? {} : { by }),
    ...(fixed ? { fixed } : {}),
    ...(bound === null ? {} : { bound }),
  };
}

export function recordedParameters(
  item: string,
  parameters: Readonly<Record<string, P>>,
  name: Name,
): RecordedParameter[] {
  return Object.entries(parameters).map(([key, found]) => recordedParameter(name(item, key), key, found));
}

/** The place of the last digit of each entry follows from the two variances. */
export function recordedCovariance(
  item: string,
  found: { readonly names: readonly string[]; readonly matrix: readonly (readonly number[])[] } | null,
  name: Name,
): RecordedCovariance | null {
  if (found === null) return null;
  const u = found.matrix.map((row, index) => Math.sqrt(row[index] ?? 0));
  return {
    what: name(item, "covariance"),
    with: found.names,
    rows: found.matrix.map((row, index) =>
      row.map((entry, column) => roundedCovariance(entry, u[index] ?? 0, u[column] ?? 0)),
    ),
  };
}
