import type { Mechanism, P, Series } from "../contract/findings.js";
import type { Name } from "./names.js";
import { maybeQuantity, recordedCovariance, recordedParameter, recordedParameters } from "./recordedQuantity.js";
import type { RecordedMechanism, RecordedParameter, RecordedSeries } from "./recordShape.js";

/** A series of runs as a record has it. */
export function recordedSeries({ id, orders, temperature, replicates }: Series, name: Name): RecordedSeries {
  return {
    id,
    orders: orders.map(({ species, order, from, runs }) => ({
      ...recordedParameter(name(id, `order in ${species}`), "order", order),
      species,
      from,
      runs,
    })),
    rateConstants: orders.flatMap(({ species, rateConstant }) =>
      rateConstant === null ? [] : [recordedParameter(name(id, `k with the order in ${species}`), "k", rateConstant)],
    ),
    temperature: temperature === null ? [] : temperatureParameters(id, temperature, name),
    temperatureCovariance: recordedCovariance(id, temperature?.covariance ?? null, name),
    replicates: replicates === null ? null : recordedParameter(name(id, "k of the replicates"), "k", replicates.k),
  };
}

function temperatureParameters(id: string, found: NonNullable<Series["temperature"]>, name: Name): RecordedParameter[] {
  const parameters: readonly (readonly [words: string, key: string, value: P])[] = [
    ["activation energy", "activationEnergy", found.activationEnergy],
    ["pre-exponential factor", "preExponential", found.preExponential],
    ["enthalpy of activation", "enthalpy", found.enthalpy],
    ["entropy of activation", "entropy", found.entropy],
    ["Gibbs energy of activation", "gibbs", found.gibbs],
    ["ln k", "lnK", found.lnK],
  ];
  return parameters.map(([words, key, value]) => recordedParameter(name(id, words), key, value));
}

/** A mechanism as a record has it. */
export function recordedMechanism({ id, parameters, residual }: Mechanism, name: Name): RecordedMechanism {
  return {
    id,
    parameters: recordedParameters(id, parameters, name),
    residual: maybeQuantity(() => name(id, "residual standard deviation"), residual),
  };
}
