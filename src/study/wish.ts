import type { Origin } from "../contract/problem.js";
import type { Quantity } from "../quantity/quantity.js";
import type { Fact, StudyItem } from "./fact.js";
import type { Species } from "./reaction.js";

export type RateWish = StudyItem & {
  /** the column it is of, where the line names one */
  readonly using: string | null;
} & (
    | { readonly kind: "average"; readonly from: Quantity; readonly to: Quantity }
    | { readonly kind: "instantaneous"; readonly at: Quantity }
    | { readonly kind: "initial" }
  );

/** How the signal at time zero or at infinity enters a fit. */
export type EndPoint =
  | { readonly kind: "free" }
  | { readonly kind: "default" }
  | { readonly kind: "measured"; readonly origin: Origin }
  | { readonly kind: "fixed"; readonly value: Quantity | null; readonly origin: Origin };

/** A rate law as the description names it. */
export type Law =
  | {
      readonly kind: "orders";
      /** how the orders stand together; of one order "alone" */
      readonly joined: "alone" | "and" | "then" | "beside";
      readonly orders: readonly { readonly order: number | "free"; readonly species: Species }[];
    }
  | { readonly kind: "saturation"; readonly species: Species };

export interface FitWish extends StudyItem {
  readonly law: Law;
  /** the law in the words of the language */
  readonly lawText: string;
  readonly using: string | null;
  /** times, SI */
  readonly window: { readonly from: Quantity; readonly to: Quantity; readonly origin: Origin } | null;
  readonly start: EndPoint;
  readonly infinity: EndPoint;
  readonly excess: readonly Fact<Species>[];
  readonly reversible: Fact<"free" | number> | null;
  readonly weights: Fact<string> | null;
  readonly errors: Fact<string> | null;
  readonly robust: boolean;
}
