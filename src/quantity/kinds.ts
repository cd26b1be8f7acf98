import { type Dimension, sameDimension } from "./dimension.js";
import type { Unit } from "./unit.js";
import { unitRows } from "./unitTable.js";

/** A kind of quantity in words, with units that people use for it, as messages show them. */
export interface Kind {
  readonly name: string;
  readonly dimension: Dimension;
  readonly samples: string;
  /** the unit shown where none was chosen, readable by `readUnit` */
  readonly unit: string;
}

function kind(name: string, samples: string, unit: string, ...dimension: Dimension): Kind {
  return { name, dimension, samples, unit };
}

/** Kinds by name; where two share a dimension, the first is the one named in messages. */
export const kinds = {
  number: kind("number", "%, ppm", "", 0, 0, 0, 0, 0, 0, 0),
  time: kind("time", "s, min, h", "s", 0, 0, 1, 0, 0, 0, 0),
  length: kind("length", "cm, mm, nm …", "cm", 1, 0, 0, 0, 0, 0, 0),
  area: kind("area", "m², cm² …", "cm^2", 2, 0, 0, 0, 0, 0, 0),
  volume: kind("volume", "L, mL, m³ …", "mL", 3, 0, 0, 0, 0, 0, 0),
  mass: kind("mass", "g, mg, kg …", "g", 0, 1, 0, 0, 0, 0, 0),
  amount: kind("amount", "mol, mmol …", "mol", 0, 0, 0, 0, 0, 1, 0),
  temperature: kind("temperature", "°C, K", "degC", 0, 0, 0, 0, 1, 0, 0),
  concentration: kind("concentration", "mol/L, mmol/L, M …", "mol/L", -3, 0, 0, 0, 0, 1, 0),
  massConcentration: kind("mass concentration", "g/L, mg/L …", "g/L", -3, 1, 0, 0, 0, 0, 0),
  molality: kind("molality", "mol/kg, mmol/kg …", "mol/kg", 0, -1, 0, 0, 0, 1, 0),
  molarMass: kind("molar mass", "g/mol, kg/mol", "g/mol", 0, 1, 0, 0, 0, -1, 0),
  molarVolume: kind("molar volume", "L/mol, mL/mol …", "L/mol", 3, 0, 0, 0, 0, -1, 0),
  pressure: kind("pressure", "kPa, bar, mmHg …", "kPa", -1, 1, -2, 0, 0, 0, 0),
  energy: kind("energy", "J, kJ, cal …", "kJ", 2, 1, -2, 0, 0, 0, 0),
  molarEnergy: kind("molar energy", "kJ/mol, J/mol, kcal/mol …", "kJ/mol", 2, 1, -2, 0, 0, -1, 0),
  molarEntropy: kind("molar entropy", "J/(mol K) …", "J/(mol K)", 2, 1, -2, 0, -1, -1, 0),
  charge: kind("charge", "C, mC …", "C", 0, 0, 1, 1, 0, 0, 0),
  current: kind("current", "A, mA …", "A", 0, 0, 0, 1, 0, 0, 0),
  voltage: kind("voltage", "V, mV …", "V", 2, 1, -3, -1, 0, 0, 0),
  power: kind("power", "W, mW …", "W", 2, 1, -3, 0, 0, 0, 0),
  force: kind("force", "N, mN …", "N", 1, 1, -2, 0, 0, 0, 0),
  resistance: kind("resistance", "Ohm, kOhm …", "Ohm", 2, 1, -3, -2, 0, 0, 0),
  conductance: kind("conductance", "S, mS …", "mS", -2, -1, 3, 2, 0, 0, 0),
  conductivity: kind("conductivity", "mS/cm, µS/cm, S/m …", "mS/cm", -3, -1, 3, 2, 0, 0, 0),
  molarConductivity: kind("molar conductivity", "S cm^2/mol …", "S cm^2/mol", 0, -1, 3, 2, 0, -1, 0),
  reciprocalLength: kind("reciprocal length", "cm^-1, m^-1", "cm^-1", -1, 0, 0, 0, 0, 0, 0),
  frequency: kind("reciprocal time", "s^-1, min^-1, Hz …", "s^-1", 0, 0, -1, 0, 0, 0, 0),
  reactionRate: kind("rate of reaction", "mol/(L s), mmol/(L min) …", "mol/(L s)", -3, 0, -1, 0, 0, 1, 0),
  amountRate: kind("amount per time", "mol/s, mol/min …", "mol/s", 0, 0, -1, 0, 0, 1, 0),
  secondOrder: kind("second-order rate constant", "L/(mol s) …", "L/(mol s)", 3, 0, -1, 0, 0, -1, 0),
  absorptivity: kind("molar absorptivity", "L/(mol cm) …", "L/(mol cm)", 2, 0, 0, 0, 0, -1, 0),
  perConcentration: kind("reading per concentration", "L/mol, L/mmol …", "L/mol", 3, 0, 0, 0, 0, -1, 0),
  density: kind("density", "g/mL, g/cm³, kg/L …", "g/mL", -3, 1, 0, 0, 0, 0, 0),
  massRate: kind("mass per time", "g/s, mg/min …", "g/s", 0, 1, -1, 0, 0, 0, 0),
  volumeRate: kind("volume per time", "mL/s, mL/min …", "mL/s", 3, 0, -1, 0, 0, 0, 0),
  speed: kind("speed", "m/s …", "m/s", 1, 0, -1, 0, 0, 0, 0),
  acceleration: kind("acceleration", "m/s²", "m/s^2", 1, 0, -2, 0, 0, 0, 0),
  viscosity: kind("viscosity", "mPa s, cP …", "mPa s", -1, 1, -1, 0, 0, 0, 0),
} as const satisfies Record<string, Kind>;

export type KindName = keyof typeof kinds;

/**
 * The kind a dimension is called by in messages; null where it has no common name. The dimension taken from a row of
 * `kinds` is called by that row, so that a density is not called a mass concentration.
 */
export function kindOf(dimension: Dimension): Kind | null {
  const all = Object.values<Kind>(kinds);
  const own = all.find((entry) => entry.dimension === dimension);
  return own ?? all.find((entry) => sameDimension(entry.dimension, dimension)) ?? null;
}

/** Whether a unit is of a kind, as `isKind(unit, "time")`. */
export function isKind(unit: Unit, name: KindName): boolean {
  return sameDimension(unit.dimension, kinds[name].dimension);
}

/** "a unit of time" of a unit that is stated; a plain number and an unnamed dimension have words too. */
export function unitInWords(unit: Unit): string {
  if (unit.parts.length === 0) return "a plain number";
  const [first] = unit.parts;
  const angle = unitRows.some(({ symbol }) => symbol === first?.symbol && ["deg", "rad"].includes(symbol));
  const found = kindOf(unit.dimension);
  if (found === kinds.number) return angle ? "a unit of angle" : "a plain number";
  return found === null ? "a unit of something else" : `a unit of ${found.name}`;
}
