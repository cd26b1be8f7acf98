import type { Dimension } from "./dimension.js";

/** One unit symbol without prefix. */
export interface UnitRow {
  readonly symbol: string;
  /** SI units in one, exact: decimal numbers joined by `*` and `/`, left to right */
  readonly factor: string;
  readonly dimension: Dimension;
  /** which prefixes it takes */
  readonly prefixes: "all" | "none" | readonly string[];
  /** kelvin at its zero, exact, for affine temperatures */
  readonly offset?: string;
  /** other spellings, read as this one */
  readonly aliases?: readonly string[];
}

const plain: Dimension = [0, 0, 0, 0, 0, 0, 0];
const length: Dimension = [1, 0, 0, 0, 0, 0, 0];
const volume: Dimension = [3, 0, 0, 0, 0, 0, 0];
const mass: Dimension = [0, 1, 0, 0, 0, 0, 0];
const time: Dimension = [0, 0, 1, 0, 0, 0, 0];
const frequency: Dimension = [0, 0, -1, 0, 0, 0, 0];
const temperature: Dimension = [0, 0, 0, 0, 1, 0, 0];
const force: Dimension = [1, 1, -2, 0, 0, 0, 0];
const pressure: Dimension = [-1, 1, -2, 0, 0, 0, 0];
const energy: Dimension = [2, 1, -2, 0, 0, 0, 0];
const conductance: Dimension = [-2, -1, 3, 2, 0, 0, 0];
const concentration: Dimension = [-3, 0, 0, 0, 0, 1, 0];
const activity: Dimension = [0, 0, -1, 0, 0, 1, 0];

const siUnits: readonly (readonly [string, Dimension])[] = [
  ["m", length],
  ["s", time],
  ["A", [0, 0, 0, 1, 0, 0, 0]],
  ["K", temperature],
  ["mol", [0, 0, 0, 0, 0, 1, 0]],
  ["cd", [0, 0, 0, 0, 0, 0, 1]],
  ["Hz", frequency],
  ["N", force],
  ["Pa", pressure],
  ["J", energy],
  ["W", [2, 1, -3, 0, 0, 0, 0]],
  ["C", [0, 0, 1, 1, 0, 0, 0]],
  ["V", [2, 1, -3, -1, 0, 0, 0]],
  ["F", [-2, -1, 4, 2, 0, 0, 0]],
  ["S", conductance],
  ["Wb", [2, 1, -2, -1, 0, 0, 0]],
  ["T", [0, 1, -2, -1, 0, 0, 0]],
  ["H", [2, 1, -2, -2, 0, 0, 0]],
  ["lm", [0, 0, 0, 0, 0, 0, 1]],
  ["lx", [-2, 0, 0, 0, 0, 0, 1]],
  ["Bq", frequency],
  ["Gy", [2, 0, -2, 0, 0, 0, 0]],
  ["Sv", [2, 0, -2, 0, 0, 0, 0]],
  ["kat", activity],
  ["rad", plain],
  ["sr", plain],
];

/**
 * Units read by themselves. Factors: SI Brochure, 9th edition, tables 4 and 8; NIST Special Publication 811 (2008),
 * appendix B (atm, Torr, mmHg, psi, calories, poise, stokes, inch, pound); dalton CODATA 2022. `M` is molar,
 * `cal` the thermochemical calorie, `U` the enzyme unit, 1 µmol/min.
 */
export const unitRows: readonly UnitRow[] = [
  ...siUnits.map(([symbol, dimension]) => ({ symbol, factor: "1", dimension, prefixes: "all" as const })),
  { symbol: "Ohm", factor: "1", dimension: [2, 1, -3, -2, 0, 0, 0], prefixes: "all", aliases: ["ohm", "Ω", "\u2126"] },
  { symbol: "g", factor: "0.001", dimension: mass, prefixes: "all" },
  { symbol: "t", factor: "1000", dimension: mass, prefixes: ["k", "M", "G"] },
  { symbol: "Da", factor: "1.66053906892e-27", dimension: mass, prefixes: ["k", "M", "m"] },
  { symbol: "u", factor: "1.66053906892e-27", dimension: mass, prefixes: "none" },
  { symbol: "lb", factor: "0.45359237", dimension: mass, prefixes: "none" },
  { symbol: "oz", factor: "0.45359237/16", dimension: mass, prefixes: "none" },
  { symbol: "gr", factor: "6.479891e-5", dimension: mass, prefixes: "none" },
  { symbol: "L", factor: "0.001", dimension: volume, prefixes: "all", aliases: ["l"] },
  { symbol: "gal_US", factor: "0.003785411784", dimension: volume, prefixes: "none" },
  { symbol: "floz_US", factor: "0.003785411784/128", dimension: volume, prefixes: "none" },
  { symbol: "angstrom", factor: "1e-10", dimension: length, prefixes: "none", aliases: ["Å", "\u212b"] },
  { symbol: "in", factor: "0.0254", dimension: length, prefixes: "none" },
  { symbol: "ft", factor: "0.3048", dimension: length, prefixes: "none" },
  { symbol: "min", factor: "60", dimension: time, prefixes: "none" },
  { symbol: "h", factor: "3600", dimension: time, prefixes: "none" },
  { symbol: "d", factor: "86400", dimension: time, prefixes: "none" },
  { symbol: "wk", factor: "604800", dimension: time, prefixes: "none" },
  { symbol: "rpm", factor: "1/60", dimension: frequency, prefixes: "none" },
  { symbol: "degC", factor: "1", dimension: temperature, prefixes: "none", offset: "273.15" },
  { symbol: "degF", factor: "5/9", dimension: temperature, prefixes: "none", offset: "459.67*5/9" },
  { symbol: "bar", factor: "100000", dimension: pressure, prefixes: "all" },
  { symbol: "atm", factor: "101325", dimension: pressure, prefixes: "none" },
  { symbol: "Torr", factor: "101325/760", dimension: pressure, prefixes: ["m", "u"] },
  { symbol: "mmHg", factor: "13.5951*9.80665", dimension: pressure, prefixes: "none" },
  { symbol: "inHg", factor: "13.5951*9.80665*25.4", dimension: pressure, prefixes: "none" },
  { symbol: "mmH2O", factor: "9.80665", dimension: pressure, prefixes: "none" },
  { symbol: "cmH2O", factor: "98.0665", dimension: pressure, prefixes: "none" },
  { symbol: "psi", factor: "0.45359237*9.80665/0.00064516", dimension: pressure, prefixes: "none" },
  { symbol: "kgf", factor: "9.80665", dimension: force, prefixes: "none" },
  { symbol: "dyn", factor: "1e-5", dimension: force, prefixes: "none" },
  { symbol: "g_n", factor: "9.80665", dimension: [1, 0, -2, 0, 0, 0, 0], prefixes: "none" },
  { symbol: "cal", factor: "4.184", dimension: energy, prefixes: ["k", "m"], aliases: ["cal_th"] },
  { symbol: "cal_IT", factor: "4.1868", dimension: energy, prefixes: ["k"] },
  { symbol: "cal_15", factor: "4.1858", dimension: energy, prefixes: ["k"] },
  { symbol: "eV", factor: "1.602176634e-19", dimension: energy, prefixes: "all" },
  { symbol: "erg", factor: "1e-7", dimension: energy, prefixes: "none" },
  { symbol: "mho", factor: "1", dimension: conductance, prefixes: ["m", "u", "n"] },
  { symbol: "P", factor: "0.1", dimension: [-1, 1, -1, 0, 0, 0, 0], prefixes: ["c", "m"] },
  { symbol: "St", factor: "0.0001", dimension: [2, 0, -1, 0, 0, 0, 0], prefixes: ["c", "m"] },
  { symbol: "M", factor: "1000", dimension: concentration, prefixes: ["k", "d", "c", "m", "u", "n", "p", "f"] },
  { symbol: "U", factor: "1e-6/60", dimension: activity, prefixes: ["k", "m", "u"] },
  { symbol: "deg", factor: "3.14159265358979323846264338/180", dimension: plain, prefixes: ["m"], aliases: ["°"] },
  { symbol: "%", factor: "0.01", dimension: plain, prefixes: "none" },
  { symbol: "‰", factor: "0.001", dimension: plain, prefixes: "none" },
  { symbol: "ppm", factor: "1e-6", dimension: plain, prefixes: "none" },
  { symbol: "ppb", factor: "1e-9", dimension: plain, prefixes: "none" },
  { symbol: "AU", factor: "1", dimension: plain, prefixes: ["m"] },
];

/** Words people write for a unit, and the symbol they mean: the first mend where the word is not known. */
export const meantSymbols: Readonly<Record<string, string>> = {
  sec: "s",
  secs: "s",
  second: "s",
  seconds: "s",
  mins: "min",
  minute: "min",
  minutes: "min",
  hr: "h",
  hrs: "h",
  hour: "h",
  hours: "h",
  day: "d",
  days: "d",
  week: "wk",
  weeks: "wk",
  litre: "L",
  litres: "L",
  liter: "L",
  liters: "L",
  millilitre: "mL",
  millilitres: "mL",
  milliliter: "mL",
  milliliters: "mL",
  cc: "mL",
  ccm: "mL",
  gram: "g",
  grams: "g",
  gm: "g",
  mole: "mol",
  moles: "mol",
  mols: "mol",
  molar: "mol/L",
  celsius: "degC",
  kelvin: "K",
  kelvins: "K",
  percent: "%",
  metre: "m",
  meter: "m",
  micron: "um",
  joule: "J",
  joules: "J",
  calorie: "cal",
  calories: "cal",
  torr: "Torr",
  degrees: "deg",
};

/** Symbols worth proposing where a word is not a unit, the commoner first. */
export const proposable: readonly string[] =
  "s min h d ms mL L uL m cm mm nm um dm K degC mol mmol umol kmol g mg kg ug mol M mM uM nM Pa kPa MPa hPa bar mbar atm Torr mmHg J kJ cal kcal eV S mS uS V mV A mA W Hz N C % ppm Ohm deg rad kat U Da kDa psi".split(
    " ",
  );
