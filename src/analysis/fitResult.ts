import type { Run } from "../contract/findings.js";
import type { Origin } from "../contract/problem.js";
import type { Species } from "../study/reaction.js";
import type { FitWish, Follow } from "../study/run.js";

export type FitFinding = Run["fits"][number];

/** What every fit says of itself, with nothing computed yet. */
export function emptyFit(wish: FitWish, follow: Follow, place: (origin: Origin) => FitFinding["place"]): FitFinding {
  return {
    id: wish.id,
    place: place(wish.origin),
    problems: [],
    law: wish.lawText,
    orders: ordersOf(wish),
    follow: follow.id,
    on: "signal",
    weights: "constant",
    uKind: "scaled",
    degreesOfFreedom: 0,
    parameters: {},
    kPrime: null,
    covariance: null,
    budget: [],
    halfLife: null,
    window: null,
    points: 0,
    residual: null,
    reducedChiSquare: null,
    conversion: null,
    aicc: null,
    tests: [],
    condition: null,
    correlation: null,
    iterations: 0,
    stop: "refused",
    verdict: "",
  };
}

/** The orders that the line fixes; a free one has no value before it is fitted. */
function ordersOf({ law }: FitWish): FitFinding["orders"] {
  if (law.kind !== "orders") return [];
  return law.orders.flatMap(({ order, species }) =>
    order === "free" ? [] : [{ species: species.key, value: order, u: null, fixed: true }],
  );
}

/** The species of a plain first-order law; null for any other law, which is kept but not computed yet. */
export function firstOrderIn({ law, reversible }: FitWish): Species | null {
  if (law.kind !== "orders" || law.joined !== "alone" || reversible !== null) return null;
  const [only] = law.orders;
  return only?.order === 1 ? only.species : null;
}

/** Why a fit gives no rate constant, and what to do. */
export interface Refusal {
  readonly stop: "limit" | "singular" | "bound" | "refused";
  readonly reason: string;
  readonly remedy: string;
}

export function refusal(stop: Refusal["stop"], reason: string, remedy: string): Refusal {
  return { stop, reason, remedy };
}
