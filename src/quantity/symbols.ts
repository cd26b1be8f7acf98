import type { Dimension } from "./dimension.js";
import { decimal, type Fraction, fraction, over, times } from "./fraction.js";
import { prefixes } from "./prefixes.js";
import { type UnitRow, unitRows } from "./unitTable.js";

/** What one symbol with its prefix stands for. */
export interface KnownSymbol {
  /** the one spelling used in `UnitPart.symbol` */
  readonly symbol: string;
  /** SI units in one, exact */
  readonly factor: Fraction;
  readonly offset: Fraction | null;
  readonly dimension: Dimension;
}

const rows = new Map<string, UnitRow>(
  unitRows.flatMap((row) => [row.symbol, ...(row.aliases ?? [])].map((name): [string, UnitRow] => [name, row])),
);
const known = new Map<string, KnownSymbol>();

/** The symbol `text`, prefix and all, in any spelling; null where it is none. A whole symbol wins over a prefix. */
export function symbolOf(text: string): KnownSymbol | null {
  const found = known.get(text);
  if (found !== undefined) return found;
  const made = whole(text) ?? prefixed(text);
  if (made !== null) known.set(text, made);
  return made;
}

/** For `kmin`: the unit that takes no such prefix, `min`; null where `text` is no prefix before a unit. */
export function prefixRefused(text: string): string | null {
  return split(text, () => true)?.row.symbol ?? null;
}

function whole(text: string): KnownSymbol | null {
  const row = rows.get(text);
  if (row === undefined) return null;
  const offset = row.offset === undefined ? null : exact(row.offset);
  return { symbol: row.symbol, factor: exact(row.factor), offset, dimension: row.dimension };
}

function prefixed(text: string): KnownSymbol | null {
  const parts = split(
    text,
    ({ prefixes: taken }, prefix) => taken === "all" || (taken !== "none" && taken.includes(prefix)),
  );
  if (parts === null) return null;
  const { prefix, power, row } = parts;
  const ten = 10n ** BigInt(Math.abs(power));
  const size = power < 0 ? fraction(1n, ten) : fraction(ten);
  return {
    symbol: prefix + row.symbol,
    factor: times(size, exact(row.factor)),
    offset: null,
    dimension: row.dimension,
  };
}

function split(
  text: string,
  takes: (row: UnitRow, prefix: string) => boolean,
): { prefix: string; power: number; row: UnitRow } | null {
  for (const length of [1, 2]) {
    const prefix = text.slice(0, length);
    const power = prefixes.get(prefix);
    const row = rows.get(text.slice(length));
    if (power !== undefined && row !== undefined && takes(row, prefix)) return { prefix, power, row };
  }
  return null;
}

/** A factor as the table writes it: `13.5951*9.80665`, `5/9`. */
function exact(text: string): Fraction {
  const [first = "1", ...rest] = text.split(/(?=[*/])/);
  return rest.reduce((value, step) => {
    const number = decimal(step.slice(1));
    return step.startsWith("/") ? over(value, number) : times(value, number);
  }, decimal(first));
}
