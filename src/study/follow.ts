import type { Quantity } from "../quantity/quantity.js";
import type { Fact, StudyItem } from "./fact.js";
import type { Species } from "./reaction.js";

/** What was followed, as which signal, and what the monitor needs to know; SI, null where it is not stated. */
export interface Follow extends StudyItem {
  readonly species: Species;
  readonly monitor: string;
  /** name of the column */
  readonly column: string;
  readonly readability: Fact<Quantity> | null;
  readonly responseTime: Fact<Quantity> | null;
  /** what the signal reads without reaction */
  readonly blank: Fact<Quantity> | null;
  readonly readingAtStart: Fact<Quantity> | null;
  readonly readingAtInfinity: Fact<Quantity> | null;
  /** name of a calibration */
  readonly calibratedBy: Fact<string> | null;
  /** how a gas was collected, and the temperature of the burette */
  readonly collected: Fact<{ readonly wet: boolean; readonly temperature: Quantity }> | null;
  readonly barometer: Fact<Quantity> | null;
  readonly levelDifference: Fact<Quantity> | null;
  readonly gauge: boolean;
  readonly cellConstant: Fact<Quantity> | null;
  readonly compensatedTo: Fact<Quantity> | null;
  readonly uncompensated: boolean;
  readonly conductivities: readonly { readonly species: Species; readonly value: Quantity }[];
  readonly wavelength: Fact<Quantity> | null;
  readonly pathLength: Fact<Quantity> | null;
  readonly strayLight: Fact<Quantity> | null;
  readonly titrant: Fact<{ readonly species: Species; readonly concentration: Quantity }> | null;
  readonly aliquot: Fact<Quantity> | null;
  /** the equation of the titration as it is written */
  readonly titratedBy: Fact<string> | null;
}
