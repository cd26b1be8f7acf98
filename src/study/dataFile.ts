import type { Origin } from "../contract/problem.js";
import type { Quantity } from "../quantity/quantity.js";
import type { Unit } from "../quantity/unit.js";
import type { Fact } from "./fact.js";

/** A column of the run's data file, found by its header cell or by its number. */
export interface ColumnFact {
  readonly name: string;
  readonly by: Fact<{ readonly header: string } | { readonly number: number }>;
  /** as the line states it; null where the header must */
  readonly unit: Fact<Unit> | null;
  /** uncertainty of each reading; in the column's unit, or a share of the reading (`%`) */
  readonly random: Fact<Quantity> | null;
  /** uncertainty all readings share: an offset in the column's unit, or a share (`%`) that scales them */
  readonly common: Fact<Quantity> | null;
  readonly origin: Origin;
}

/** Readings that are left out, and why. Times are those of the file, s. */
export type Exclusion = Fact<
  { readonly reason: string } & (
    | { readonly line: number }
    /** `clock`: clock times of the file's day, as 13:55:00 */
    | { readonly from: Quantity; readonly to: Quantity; readonly clock: boolean }
  )
>;

/** The data file of a run; `path` is as written, relative to the description. */
export interface DataFile {
  readonly path: string;
  /** where the path stands, with its quotes */
  readonly pathOrigin: Origin;
  readonly columns: readonly ColumnFact[];
  /** how the file is to be read where detection is not enough; null: as detected */
  readonly delimiter: string | null;
  readonly decimalComma: boolean | null;
  readonly skip: number | null;
  readonly encoding: string | null;
  readonly exclusions: readonly Exclusion[];
  /** the file's time at which the reaction began, s; `clock`: written as a clock time, as 13:49:30 */
  readonly timeZero: (Fact<Quantity> & { readonly clock: boolean }) | null;
  readonly origin: Origin;
}
