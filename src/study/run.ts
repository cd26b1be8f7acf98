import type { Origin } from "../contract/problem.js";
import type { Quantity } from "../quantity/quantity.js";
import type { Unit } from "../quantity/unit.js";
import type { Fact, StudyItem } from "./fact.js";
import type { Reaction, Species } from "./reaction.js";

export type Role = "catalyst" | "inert" | "buffer";

/** What was put in: an amount-of-substance concentration in the mixture, an amount or a mass, SI. */
export interface Taken {
  readonly species: Species;
  readonly given: Quantity;
  readonly role: Role | null;
  readonly origin: Origin;
}

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
  readonly origin: Origin;
}

export interface Follow extends StudyItem {
  readonly species: Species;
  readonly monitor: string;
  /** name of the column */
  readonly column: string;
}

export type RateWish = StudyItem &
  (
    | { readonly kind: "average"; readonly from: Quantity; readonly to: Quantity }
    | { readonly kind: "instantaneous"; readonly at: Quantity }
    | { readonly kind: "initial" }
  );

/** How the signal at time zero or at infinity enters a fit. */
export type EndPoint =
  | { readonly kind: "free" }
  | { readonly kind: "default" }
  | { readonly kind: "fixed"; readonly value: Quantity | null; readonly origin: Origin };

export interface FitWish extends StudyItem {
  readonly order: number;
  readonly species: Species;
  /** times, SI */
  readonly window: { readonly from: Quantity; readonly to: Quantity; readonly origin: Origin } | null;
  readonly start: EndPoint;
  readonly infinity: EndPoint;
}

/** One run: what was mixed, under which conditions, what was followed and what is wanted of it. */
export interface Run extends StudyItem {
  readonly name: string;
  readonly title: string | null;
  readonly date: Fact<string> | null;
  readonly notes: readonly Fact<string>[];
  readonly reaction: Reaction | null;
  readonly volume: Fact<Quantity> | null;
  readonly temperature: Fact<Quantity> | null;
  readonly taken: readonly Taken[];
  readonly data: DataFile | null;
  readonly follow: readonly Follow[];
  readonly rates: readonly RateWish[];
  readonly fits: readonly FitWish[];
}
