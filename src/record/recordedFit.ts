import type { Run } from "../contract/findings.js";
import { itemWords, type Name } from "./names.js";
import { maybeQuantity, recordedCovariance, recordedParameters, recordedQuantity } from "./recordedQuantity.js";
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
    kPrime: maybeQuantity(() => name(id, "k′"), kPrime),
    halfLife:
      halfLife === null ? null : { ...recordedQuantity(name(id, "half-life"), halfLife), species: halfLife.species },
    covariance: recordedCovariance(id, fit.covariance, name),
    budget: {
      what: name(id, "what the variance of k is made of"),
      sources: fit.budget.map(({ source }) => source),
      kinds: fit.budget.map(({ kind }) => kind),
      shares: fit.budget.map(({ share }) => roundedDecimals(share)),
    },
    agreement: recordedAgreement(fit, name(id, "agreement")),
  };
}

function recordedAgreement(fit: Run["fits"][number], what: string): RecordedFit["agreement"] {
  const { residual, reducedChiSquare, conversion, aicc, condition, correlation, tests } = fit;
  return {
    what,
    ...(residual === null ? {} : { residual: roundedMeasure(residual.value), unit: residual.unit }),
    ...(reducedChiSquare === null ? {} : { reducedChiSquare: roundedMeasure(reducedChiSquare) }),
    ...(conversion === null ? {} : { conversion: roundedDecimals(conversion) }),
    ...(aicc === null ? {} : { aicc: roundedDecimals(aicc) }),
    ...(condition === null ? {} : { condition: roundedMeasure(condition) }),
    ...(correlation === null ? {} : { correlation: roundedDecimals(correlation) }),
    tests: tests.map((test) => test.name),
    statistics: tests.map(({ statistic }) => roundedDecimals(statistic)),
    p: tests.map(({ p }) => (p === null ? null : roundedDecimals(p))),
  };
}
