import { problem } from "../contract/problem.js";
import { failure, success } from "../contract/result.js";
import { isKind, kinds, unitInWords } from "../quantity/kinds.js";
import { molarMassOf } from "./molarMassOf.js";
import type { Monitor } from "./monitor.js";

/** The readings are the concentration itself: c = S; of a mass concentration c = S/M. */
export const concentration: Monitor = {
  name: "concentration",
  relate(_run, follow, signal) {
    if (isKind(signal.unit, "concentration")) return success({ slope: 1, zero: 0 });
    const { origin, column, species } = follow;
    if (!isKind(signal.unit, "massConcentration")) {
      const args = {
        column,
        unit: signal.unit.text === "" ? "no unit" : signal.unit.text,
        unitKind: unitInWords(signal.unit),
        monitor: "concentration",
        samples: kinds.concentration.samples,
      };
      return failure(problem("signal-wrong-unit", args, origin));
    }
    const molar = molarMassOf(species);
    if (molar === null) {
      const args = { column, unit: signal.unit.text, species: species.key };
      return failure(problem("signal-needs-formula", args, origin));
    }
    return success({ slope: molar.value, zero: 0 });
  },
};
