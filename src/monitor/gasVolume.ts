import { problem } from "../contract/problem.js";
import { isKind, kinds, unitInWords } from "../quantity/kinds.js";
import { combined, type Quantity } from "../quantity/quantity.js";
import type { Follow, Run } from "../study/run.js";
import { henryConstant } from "./henryConstant.js";
import { type Monitor, unrelated } from "./monitor.js";
import { waterVapour } from "./waterVapour.js";

/** Molar gas constant, J mol⁻¹ K⁻¹: exact since 2019 (CODATA 2018). */
const gasConstant = 8.31446261815324;
/** Standard acceleration of free fall, m s⁻², and the density of water near 20 °C, kg m⁻³ (a level of water, not of mercury). */
const pressureOfLevel = 9.80665 * 998.2;

/** What the amount of a collected gas follows from; SI. */
export interface Burette {
  readonly barometer: Quantity;
  readonly temperature: Quantity;
  /** collected over water and not dried: the gas is saturated with water vapour */
  readonly wet: boolean;
  /** how much higher the water stands inside than outside */
  readonly levelDifference: Quantity | null;
}

/** Amount of gas per volume, mol m⁻³, and its relative shift by each cause. */
export interface GasDensity {
  readonly value: number;
  readonly causes: ReadonlyMap<string, number>;
}

/**
 * n/V = (p − ρ g h − p_H2O(T)) / (R T) of a gas in a burette: ideal gas law (IUPAC Green Book, 3rd edition, 2.11), vapour
 * pressure of water by Wagner and Pruss 1993 where it is wet. Null where the temperature is beyond the equation of the
 * vapour pressure, or no pressure is left for the gas.
 */
export function gasDensity({ barometer, temperature, wet, levelDifference }: Burette): GasDensity | null {
  const vapour = wet ? waterVapour(temperature.value) : { pressure: 0, slope: 0 };
  if (vapour === null) return null;
  const pressure = barometer.value - pressureOfLevel * (levelDifference?.value ?? 0) - vapour.pressure;
  if (!(pressure > 0) || !(temperature.value > 0)) return null;
  const causes = new Map<string, number>();
  const put = (name: string, quantity: Quantity | null, relative: number): void => {
    const u = quantity === null ? null : combined(quantity.sources);
    if (u !== null && u !== 0) causes.set(name, u * relative);
  };
  put("barometer", barometer, 1 / pressure);
  put("temperature of the burette", temperature, -1 / temperature.value - vapour.slope / pressure);
  put("level difference", levelDifference, -pressureOfLevel / pressure);
  return { value: pressure / (gasConstant * temperature.value), causes };
}

/** The readings are the volume of a gas given off, levelled or with a known difference of levels. */
export const gasVolume: Monitor = {
  name: "gas volume",
  relate(run, follow, signal) {
    const { origin, column, collected, barometer } = follow;
    if (!isKind(signal.unit, "volume")) {
      const unit = signal.unit.text === "" ? "no unit" : signal.unit.text;
      const unitKind = unitInWords(signal.unit);
      const args = { column, unit, unitKind, monitor: "gas volume", samples: kinds.volume.samples };
      return unrelated(problem("signal-wrong-unit", args, origin));
    }
    const end = follow.block.end;
    const insert = (line: string) => [{ text: line, edits: [{ start: end, end, text: `\n    ${line}` }] }];
    if (collected === null) {
      return unrelated(problem("gas-lacks-collected", {}, origin, insert("collected wet at 22.0 °C")));
    }
    if (barometer === null) return unrelated(problem("gas-lacks-barometer", {}, origin, insert("barometer 101.3 kPa")));
    if (run.volume === null) return unrelated(problem("gas-lacks-volume", { run: run.name }, origin));
    const { temperature, wet } = collected.value;
    const levelDifference = follow.levelDifference?.value ?? null;
    const density = gasDensity({ barometer: barometer.value, temperature, wet, levelDifference });
    if (density === null) return unrelated(problem("gas-no-pressure", {}, collected.origin));
    const mixture = run.volume.value;
    // S = V_gas = c · V_mixture / (n/V): causes of n/V act the other way round on the slope.
    const causes = new Map([...density.causes].map(([name, share]) => [name, -share] as const));
    const uVolume = combined(mixture.sources);
    if (uVolume !== null && uVolume !== 0) causes.set("volume", uVolume / mixture.value);
    const relation = { slope: mixture.value / density.value, zero: 0, causes };
    return { relation, problems: dissolvedShare(run, follow, signal.value) };
  },
};

/** From this share on, what stays dissolved is worth a word. */
const worthAWord = 0.05;

/** Gas that stays dissolved is not collected: H R T V_liquid / V_gas of what is (Henry's law), where that is much. */
function dissolvedShare(run: Run, follow: Follow, readings: Float64Array) {
  const temperature = run.temperature?.value.value ?? 298.15;
  const henry = henryConstant(follow.species.key, temperature);
  const largest = readings.reduce((most, value) => Math.max(most, value), 0);
  const gas = (run.headSpace?.value.value ?? 0) + largest;
  if (henry === null || run.volume === null || !(gas > 0)) return [];
  const share = (henry * gasConstant * temperature * run.volume.value.value) / gas;
  if (share < worthAWord) return [];
  const args = { gas: follow.species.key, percent: `${(100 * share).toPrecision(2)} %` };
  return [problem("gas-dissolves", args, follow.origin)];
}
