import type { Dimension } from "../quantity/dimension.js";
import { type KindName, kinds } from "../quantity/kinds.js";

/** What a quantity of a line may be: dimensions in order of liking, how it is called in messages, and its sign. */
export interface KindOfQuantity {
  /** begins the sentence "… needs a unit of …" */
  readonly name: string;
  /** null: decided later, by what the line belongs to */
  readonly dimensions: readonly Dimension[] | null;
  /** refused where the value, in SI, is below it */
  readonly atLeast?: "zero" | "above zero";
  /** where its units go by another name than others of their dimension: that name, samples, the usual one */
  readonly units?: { readonly kind: string; readonly samples: string; readonly usual: string };
  /** the value, in SI, is at most 1: what is a share of a whole */
  readonly ofWhole?: true;
  /** with its article and an example, as messages ask for it */
  readonly words: string;
}

const of = (name: string, words: string, ...names: KindName[]): KindOfQuantity => ({
  name,
  dimensions: names.map((kind) => kinds[kind].dimension),
  words,
});
const positive = (kind: KindOfQuantity): KindOfQuantity => ({ ...kind, atLeast: "above zero" });
const notNegative = (kind: KindOfQuantity): KindOfQuantity => ({ ...kind, atLeast: "zero" });

export const quantityKinds = {
  time: of("Time", "a time with its unit, such as 60 s,", "time"),
  duration: positive(of("The time", "a time with its unit, such as 2 s,", "time")),
  volume: positive(of("Volume", "a volume with its unit, such as 50.00 mL,", "volume")),
  temperature: notNegative(of("Temperature", "a temperature with its unit, such as 25.0 °C,", "temperature")),
  pressure: positive(of("Pressure", "a pressure with its unit, such as 100.8 kPa,", "pressure")),
  ionicStrength: notNegative(
    of("Ionic strength", "an ionic strength with its unit, such as 0.10 mol/L,", "concentration", "molality"),
  ),
  taken: notNegative(
    of(
      "What was taken",
      "a concentration, an amount or a mass with its unit, such as 0.100 mol/L,",
      "concentration",
      "amount",
      "mass",
      "volume",
      "massConcentration",
    ),
  ),
  stock: notNegative(
    of(
      "The stock",
      "the strength of the stock, such as 0.500 mol/L or 30 % by mass,",
      "concentration",
      "massConcentration",
      "number",
    ),
  ),
  purity: { ...positive(of("Purity", "a purity, such as 98 %,", "number")), ofWhole: true },
  density: {
    ...positive(of("Density", "a density with its unit, such as 1.11 g/mL,", "massConcentration")),
    units: { kind: "a unit of density", samples: "g/mL, kg/L …", usual: "g/mL" },
  },
  molarEnergy: of("The energy", "a molar energy with its unit, such as 52 kJ/mol,", "molarEnergy"),
  molarMass: positive(of("Molar mass", "a molar mass with its unit, such as 204.2 g/mol,", "molarMass")),
  absorptivity: notNegative(
    of("Absorptivity", "an absorptivity with its unit, such as 1.84e4 L/(mol cm),", "absorptivity"),
  ),
  length: positive(of("The length", "a length with its unit, such as 1.000 cm,", "length")),
  levelDifference: of("The level difference", "a length with its unit, such as 35 mm,", "length"),
  cellConstant: positive(
    of("The cell constant", "a cell constant with its unit, such as 1.02 cm^-1,", "reciprocalLength"),
  ),
  molarConductivity: positive(
    of("The conductivity", "a molar conductivity with its unit, such as 199.1 S cm^2/mol,", "molarConductivity"),
  ),
  share: notNegative(of("The share", "a share, such as 0.1 %,", "number")),
  concentration: notNegative(
    of("The concentration", "a concentration with its unit, such as 0.0200 mol/L,", "concentration"),
  ),
  event: positive(
    of(
      "The amount of the event",
      "a volume, a mass or an amount, such as 10.0 mL,",
      "volume",
      "mass",
      "amount",
      "concentration",
    ),
  ),
  rate: of("The rate", "a rate with its unit, such as 1.2e-5 mol/(L s),", "reactionRate"),
  rateConstant: {
    name: "k",
    dimensions: null,
    atLeast: "above zero",
    words: "a rate constant with its unit, such as 1.2e-3 s^-1,",
  },
  reading: { name: "The reading", dimensions: null, words: "a reading with its unit, such as 0.100 mol/L," },
  slope: { name: "The slope", dimensions: null, words: "a slope with its unit, such as 0.0213(2) L/µmol," },
  uncertainty: {
    name: "The uncertainty",
    dimensions: null,
    atLeast: "zero",
    words: "an uncertainty with its unit, such as 0.002 mol/L or 1 %,",
  },
} as const satisfies Record<string, KindOfQuantity>;

export type QuantityKind = keyof typeof quantityKinds;
