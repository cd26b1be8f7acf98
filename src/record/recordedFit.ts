import type { Run } from "../contract/findings.js";
import { itemWords, type Name } from "./names.js";
import {
  maybeQuantity,
  recordedCovariance,
  recordedParameter,
  recordedParameters,
  recordedQuantity,
} from "./recordedQuantity.js";
import type { RecordedFit } from "./recordShape.js";
import { roundedDecimals, roundedMeasure, roundedU, roundedValue } from "./rounded.js";

/** A fit as a record has it: no place, no curve, no sentence that repeats the numbers. */
export function recordedFit(fit: Run["fits"][number], name: Name): RecordedFit {
  const { id, law, kPrime, halfLife, window } = fit;
  return {
    id,
    law,
    orders: fit.orders.map(({ species, value, u, fixed }) => ({
      what: name(id, `order in ${species}`),
      species,
      value: roundedValue(value, u),
      u: roundedU(u),
      fixed,
    })),
    follow: itemWords(fit.follow),
    on: fit.on,
    weights: fit.weights,
    uKind: fit.uKind,
    stop: fit.stop,
    window:
      window === null
        ? null
        : {
            what: name(id, "window"),
            from: roundedValue(window[0].value, null),
            to: roundedValue(window[1].value, null),
            unit: window[0].unit,
          },
    readings: { what: name(id, "readings"), points: fit.points, degreesOfFreedom: fit.degreesOfFreedom },
    parameters: recordedParameters(id, fit.parameters, name),
    kPrime: kPrime === null ? null : recordedParameter(name(id, "k′"), "k′", kPrime),
    halfLife:
      halfLife === null ? null : { ...recordedQuantity(name(id, "half-life"), halfLife), species: halfLife.species },
    covariance: recordedCovariance(id, fit.covariance, name),
    budget: fit.budget.map(({ source, kind, share }) => ({
      what: name(id, `share of ${source} in the variance of k`),
      source,
      kind,
      share: roundedDecimals(share) ?? 0,
    })),
    residual: maybeQuantity(() => name(id, "residual standard deviation"), fit.residual),
    agreement: {
      what: name(id, "agreement"),
      reducedChiSquare: roundedMeasure(fit.reducedChiSquare),
      conversion: roundedDecimals(fit.conversion),
      aicc: roundedDecimals(fit.aicc),
      condition: roundedMeasure(fit.condition),
      correlation: roundedDecimals(fit.correlation),
    },
    tests: fit.tests.map((test) => ({
      what: name(id, test.name),
      name: test.name,
      statistic: roundedDecimals(test.statistic) ?? 0,
      p: roundedDecimals(test.p),
    })),
  };
}
