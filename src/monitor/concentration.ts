import { problem } from "../contract/problem.js";
import { isKind, kinds, unitInWords } from "../quantity/kinds.js";
import { combined } from "../quantity/quantity.js";
import { molarMassOf } from "./molarMassOf.js";
import { type Monitor, unrelated } from "./monitor.js";

/** The readings are the concentration itself: c = S; of a mass concentration c = S/M. */
export const concentration: Monitor = {
  name: "concentration",
  relate(_run, follow, signal) {
    if (isKind(signal.unit, "concentration"))
      return { relation: { slope: 1, zero: 0, causes: new Map() }, problems: [] };
    const { origin, column, species } = follow;
    if (!isKind(signal.unit, "massConcentration")) {
      const args = {
        column,
        unit: signal.unit.text === "" ? "no unit" : signal.unit.text,
        unitKind: unitInWords(signal.unit),
        monitor: "concentration",
        samples: kinds.concentration.samples,
      };
      return unrelated(problem("signal-wrong-unit", args, origin));
    }
    const molar = molarMassOf(species);
    if (molar === null) {
      const args = { column, unit: signal.unit.text, species: species.key };
      return unrelated(problem("signal-needs-formula", args, origin));
    }
    const u = combined(molar.sources);
    const causes = new Map(u === null ? [] : [[`molar mass of ${species.key}`, u / molar.value]]);
    return { relation: { slope: molar.value, zero: 0, causes }, problems: [] };
  },
};
