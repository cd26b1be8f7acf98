import type { Origin } from "../contract/problem.js";
import type { Quantity } from "../quantity/quantity.js";
import type { Unit } from "../quantity/unit.js";
import type { DataFile } from "./dataFile.js";
import type { Fact, StudyItem } from "./fact.js";
import type { Follow } from "./follow.js";
import type { Reaction, Species } from "./reaction.js";
import type { FitWish, RateWish } from "./wish.js";

export type { ColumnFact, DataFile } from "./dataFile.js";
export type { Follow } from "./follow.js";
export type { EndPoint, FitWish, RateWish } from "./wish.js";

export type Role = "catalyst" | "inert" | "buffer";

/** A share of a mixture, and of what: 30 % by mass. */
export interface Share {
  readonly value: Quantity;
  readonly basis: "mass" | "amount" | "volume";
}

/** What was put in: a concentration in the mixture, an amount, a mass, or a volume of a stock; SI. */
export interface Taken {
  readonly species: Species;
  readonly given: Quantity;
  /**
   * of the stock, where `given` is a volume of one: a concentration, or a share of it; where `given` is itself a share of
   * the mixture, that
   */
  readonly stock:
    | { readonly kind: "concentration"; readonly value: Quantity }
    | ({ readonly kind: "share" } & Share)
    | null;
  /** share of the substance in what was weighed, by mass */
  readonly purity: Quantity | null;
  readonly density: Quantity | null;
  /** ions it gives in water, where the line names them */
  readonly ions: readonly Species[] | null;
  readonly role: Role | null;
  readonly origin: Origin;
}

/** A timed event: when it was seen, and what it means. */
export interface TimedEvent extends StudyItem {
  readonly what: string;
  readonly times: readonly Quantity[];
  readonly after:
    | { readonly kind: "used up"; readonly species: Species }
    | {
        readonly kind: "collected" | "consumed" | "formed";
        readonly species: Species;
        readonly amount: Quantity;
      }
    | null;
}

/** What is known from elsewhere, or expected. `species` null: as v = (1/ν) dc/dt. */
export type Given = Fact<{ readonly what: "rate" | "k"; readonly value: Quantity; readonly species: Species | null }>;
export type Expected = Fact<
  | { readonly what: "k" | "half-life"; readonly value: Quantity }
  | { readonly what: "readings"; readonly every: Quantity; readonly to: Quantity }
>;

/** Conditions of a run; null where they are not stated. */
export interface Conditions {
  readonly volume: Fact<Quantity> | null;
  readonly temperature: Fact<Quantity> | null;
  /** name of the column that holds the temperature */
  readonly temperatureColumn: Fact<string> | null;
  readonly pressure: Fact<Quantity> | null;
  readonly ionicStrength: Fact<Quantity> | null;
  readonly headSpace: Fact<Quantity> | null;
  readonly purgedWith: Fact<Species> | null;
  readonly activationEnergy: Fact<Quantity> | null;
}

/** Units in which results come out, where the description sets them. */
export interface ResultsIn {
  readonly concentration: Unit;
  readonly time: Unit;
}

/** One run: what was mixed, under which conditions, what was followed and what is wanted of it. */
export interface Run extends StudyItem, Conditions {
  readonly name: string;
  readonly title: string | null;
  readonly date: Fact<string> | null;
  readonly operator: Fact<string> | null;
  readonly instrument: Fact<string> | null;
  readonly solvent: Fact<string> | null;
  readonly notes: readonly Fact<string>[];
  readonly resultsIn: ResultsIn | null;
  readonly reaction: Reaction | null;
  readonly taken: readonly Taken[];
  readonly data: DataFile | null;
  readonly follow: readonly Follow[];
  readonly events: readonly TimedEvent[];
  readonly rates: readonly RateWish[];
  readonly fits: readonly FitWish[];
  readonly given: readonly Given[];
  readonly expected: readonly Expected[];
  /** name of the run whose signal is taken off */
  readonly background: Fact<string> | null;
}
