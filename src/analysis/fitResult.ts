import type { Run } from "../contract/findings.js";
import type { Origin } from "../contract/problem.js";
import type { FitWish, Follow } from "../study/run.js";

export type FitFinding = Run["fits"][number];

/** What every fit says of itself, with nothing computed yet. */
export function emptyFit(wish: FitWish, follow: Follow, place: (origin: Origin) => FitFinding["place"]): FitFinding {
  return {
    id: wish.id,
    place: place(wish.origin),
    problems: [],
    law: `order ${wish.order} in ${wish.species.key}`,
    orders: [{ species: wish.species.key, value: wish.order, u: null, fixed: true }],
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

/** Why a fit gives no rate constant, and what to do. */
export interface Refusal {
  readonly stop: "limit" | "singular" | "bound" | "refused";
  readonly reason: string;
  readonly remedy: string;
}

export function refusal(stop: Refusal["stop"], reason: string, remedy: string): Refusal {
  return { stop, reason, remedy };
}
