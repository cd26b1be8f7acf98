import type { CellFault, FaultKind } from "./columns.js";
import type { ElapsedTime } from "./elapsedTime.js";

/** Rows read so far, in arrays that grow. */
export interface RowStore {
  readonly width: number;
  rows: number;
  values: Float64Array[];
  lines: Uint32Array;
  readonly faults: CellFault[];
  faultCount: number;
  readonly tallies: GrowingTally[];
  /** the same, by kind and column */
  readonly tallyOf: Map<FaultKind, GrowingTally[]>;
  /** readers of the columns that hold times; null where none does */
  readonly times: readonly (ElapsedTime | null)[] | null;
}

interface GrowingTally {
  readonly first: CellFault;
  count: number;
}

/** Room for about `expected` rows of `width` columns; `times` reads those that hold times. */
export function rowStore(width: number, expected: number, times: RowStore["times"]): RowStore {
  const capacity = Math.max(16, Math.ceil(expected));
  return {
    width,
    rows: 0,
    values: Array.from({ length: width }, () => new Float64Array(capacity)),
    lines: new Uint32Array(capacity),
    faults: [],
    faultCount: 0,
    tallies: [],
    tallyOf: new Map(),
    times,
  };
}

/** Makes room for one more row. */
export function makeRoom(store: RowStore): void {
  if (store.rows < store.lines.length) return;
  const capacity = Math.ceil(store.lines.length * 1.5);
  store.values = store.values.map((values) => {
    const larger = new Float64Array(capacity);
    larger.set(values);
    return larger;
  });
  const lines = new Uint32Array(capacity);
  lines.set(store.lines);
  store.lines = lines;
}

/** Faults kept; the others are only counted. */
const keptFaults = 1_000;
const keptText = 40;

export function addFault(store: RowStore, kind: FaultKind, column: number, text: string): void {
  store.faultCount++;
  const byColumn = store.tallyOf.get(kind);
  const tally = byColumn?.[column];
  if (tally !== undefined) tally.count++;
  if (tally !== undefined && store.faults.length >= keptFaults) return;
  const found = { kind, row: store.rows, column, text: text.slice(0, keptText) };
  if (store.faults.length < keptFaults) store.faults.push(found);
  if (tally !== undefined) return;
  const begun = { first: found, count: 1 };
  store.tallies.push(begun);
  if (byColumn === undefined) store.tallyOf.set(kind, sparse(column, begun));
  else byColumn[column] = begun;
}

function sparse<T>(index: number, item: T): T[] {
  const items: T[] = [];
  items[index] = item;
  return items;
}

/** The arrays at their final length; room that was not used is given back where it is more than an eighth. */
export function trimmed(store: RowStore): { values: Float64Array[]; lines: Uint32Array } {
  const { rows, values, lines } = store;
  if (lines.length <= rows * 1.125) {
    return { values: values.map((column) => column.subarray(0, rows)), lines: lines.subarray(0, rows) };
  }
  return { values: values.map((column) => column.slice(0, rows)), lines: lines.slice(0, rows) };
}
