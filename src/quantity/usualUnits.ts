import type { Dimension } from "./dimension.js";
import { type KindName, kindOf, kinds } from "./kinds.js";
import { readUnit } from "./readUnit.js";
import { isFault } from "./shifted.js";
import type { Unit } from "./unit.js";

/** Units that people write for a kind, the commoner first: a choice of common practice, not of any standard. */
const usual: Partial<Readonly<Record<KindName, string>>> = {
  number: "%, ppm",
  time: "s, min, h, ms, d",
  length: "cm, mm, nm, m, µm",
  volume: "mL, L, µL, m^3, cm^3",
  mass: "g, mg, kg, µg",
  amount: "mmol, mol, µmol",
  temperature: "°C, K",
  concentration: "mol/L, mmol/L, µmol/L, mol/m^3, M, mM",
  massConcentration: "g/L, mg/L, g/mL, kg/m^3",
  density: "g/mL, g/cm^3, kg/L, kg/m^3",
  molality: "mol/kg, mmol/kg",
  molarMass: "g/mol, kg/mol",
  molarVolume: "L/mol, mL/mol, m^3/mol",
  pressure: "kPa, hPa, mbar, bar, atm, mmHg, Torr, Pa",
  energy: "kJ, J, kcal, cal",
  molarEnergy: "kJ/mol, J/mol, kcal/mol",
  molarEntropy: "J/(mol K), kJ/(mol K), cal/(mol K)",
  conductance: "mS, µS, S",
  conductivity: "mS/cm, µS/cm, S/m",
  molarConductivity: "S cm^2/mol, S m^2/mol, mS m^2/mol",
  reciprocalLength: "cm^-1, m^-1",
  frequency: "s^-1, min^-1, h^-1",
  reactionRate: "mol/(L s), mmol/(L s), mmol/(L min), mol/(m^3 s)",
  amountRate: "mol/s, mmol/s, mmol/min",
  secondOrder: "L/(mol s), L/(mol min), m^3/(mol s)",
  absorptivity: "L/(mol cm), m^2/mol",
  perConcentration: "L/mol, L/mmol, L/µmol",
  massRate: "g/s, mg/s, mg/min",
  volumeRate: "mL/s, mL/min",
};

const read = new Map<KindName, readonly WrittenUnit[]>();

/** A unit with the way people write it. */
export interface WrittenUnit {
  readonly text: string;
  readonly unit: Unit;
}

/** Units people write for quantities of this dimension, the commoner first; none where it has no common name. */
export function usualUnits(dimension: Dimension): readonly WrittenUnit[] {
  const kind = kindOf(dimension);
  const name = (Object.keys(kinds) as KindName[]).find((candidate) => kinds[candidate] === kind);
  return name === undefined ? [] : unitsOfKind(name);
}

export function unitsOfKind(name: KindName): readonly WrittenUnit[] {
  const before = read.get(name);
  if (before !== undefined) return before;
  const units = (usual[name] ?? kinds[name].unit).split(", ").flatMap((text) => {
    const reading = readUnit(text);
    return text === "" || isFault(reading) ? [] : [{ text, unit: reading.unit }];
  });
  read.set(name, units);
  return units;
}
