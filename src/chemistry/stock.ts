import { type Fault, fault, type Span } from "../contract/problem.js";
import type { Basis } from "../quantity/basis.js";
import { checkDimension } from "../quantity/checkDimension.js";
import { fromSI } from "../quantity/conversion.js";
import { formatQuantity } from "../quantity/formatNumber.js";
import { isKind, kinds } from "../quantity/kinds.js";
import { propagated, quotientOf } from "../quantity/propagated.js";
import type { Quantity } from "../quantity/quantity.js";
import { noUnit, unitOf } from "../quantity/unitOf.js";

/** How strong a solution is: a concentration (of amount or mass), or the share of the substance in it. */
export type Strength =
  | { readonly kind: "concentration"; readonly value: Quantity }
  | { readonly kind: "share"; readonly value: Quantity; readonly basis: Basis };

/** What else may be known of a stock; null where it is not. */
export interface StockFacts {
  /** the species as messages name it */
  readonly species: string;
  readonly molarMass: Quantity | null;
  /** of the stock itself */
  readonly density: Quantity | null;
  /** of the pure substance: a share by volume is the volume of that in the volume of the stock */
  readonly pureDensity: Quantity | null;
  /** of what it is dissolved in, for a share by amount */
  readonly solventMolarMass: Quantity | null;
}

const concentrationUnit =
  unitOf([
    { symbol: "mol", exponent: 1 },
    { symbol: "L", exponent: -1 },
  ]) ?? noUnit;
const amountUnit = unitOf([{ symbol: "mol", exponent: 1 }]) ?? noUnit;

/**
 * c = w·ρ/M of a share by mass w, the density ρ of the mixture and the molar mass M; null for M = 0. Sources of all
 * three are kept by name (definition of mass fraction and concentration: IUPAC Green Book, 3rd edition, 2.10).
 */
export function massFractionToConcentration(share: Quantity, density: Quantity, molarMass: Quantity): Quantity | null {
  return quotientOf([share, density], [molarMass], concentrationUnit);
}

/** c = φ·ρ₀/M of a share by volume φ and the density ρ₀ of the pure substance; null for M = 0. */
export function volumeFractionToConcentration(
  share: Quantity,
  pureDensity: Quantity,
  molarMass: Quantity,
): Quantity | null {
  return quotientOf([share, pureDensity], [molarMass], concentrationUnit);
}

/**
 * c = x·ρ/(x·M + (1 − x)·Mₛ) of a share by amount x in one solvent of molar mass Mₛ, and the density ρ of the mixture;
 * null where the mean molar mass is not positive.
 */
export function amountFractionToConcentration(
  share: Quantity,
  density: Quantity,
  molarMass: Quantity,
  solventMolarMass: Quantity,
): Quantity | null {
  const [x, rho, m, s] = [share.value, density.value, molarMass.value, solventMolarMass.value];
  const mean = x * m + (1 - x) * s;
  if (!(mean > 0)) return null;
  const value = (x * rho) / mean;
  return propagated(value, concentrationUnit, [
    { of: share, slope: (rho * s) / (mean * mean) },
    { of: density, slope: x / mean },
    { of: molarMass, slope: (-value * x) / mean },
    { of: solventMolarMass, slope: (-value * (1 - x)) / mean },
  ]);
}

/**
 * Concentration of a stock, mol m⁻³ shown in mol/L. Refuses, in words at `span`, a share beyond 0 … 100 %, a strength
 * of another dimension, and one that needs a density or a molar mass that is not known.
 */
export function stockConcentration(strength: Strength, facts: StockFacts, span: Span): Quantity | Fault {
  const { value } = strength;
  if (strength.kind === "concentration") {
    const dimensions = [kinds.concentration.dimension, kinds.massConcentration.dimension];
    const wrong = checkDimension(value.unit, { name: "A stock", dimensions }, span);
    if (wrong !== null || isKind(value.unit, "concentration")) return wrong ?? value;
  } else if (value.value > 1 || value.value < 0) {
    return fault("share-beyond-whole", { share: written(value) }, span);
  }
  const { species, molarMass, density, pureDensity, solventMolarMass } = facts;
  const what = strength.kind === "share" ? `${written(value)} by ${strength.basis}` : written(value);
  if (molarMass === null || molarMass.value <= 0) return fault("stock-needs-molar-mass", { what, species }, span);
  if (strength.kind === "concentration") return quotientOf([value], [molarMass], concentrationUnit) ?? value;
  const needed = strength.basis === "volume" ? pureDensity : density;
  const solvent = strength.basis === "amount" ? solventMolarMass : molarMass;
  if (needed === null && strength.basis === "volume") return fault("stock-needs-pure-density", { what, species }, span);
  if (needed === null) return fault("stock-needs-density", { what, species }, span);
  if (solvent === null || solvent.value <= 0) return fault("stock-needs-solvent", { what, species }, span);
  const found =
    strength.basis === "mass"
      ? massFractionToConcentration(value, needed, molarMass)
      : strength.basis === "volume"
        ? volumeFractionToConcentration(value, needed, molarMass)
        : amountFractionToConcentration(value, needed, molarMass, solvent);
  return found ?? fault("stock-needs-molar-mass", { what, species }, span);
}

/** n = V·c, mol: the amount in a volume of a solution. */
export function amountInVolume(volume: Quantity, concentration: Quantity): Quantity {
  return propagated(volume.value * concentration.value, amountUnit, [
    { of: volume, slope: concentration.value },
    { of: concentration, slope: volume.value },
  ]);
}

/** n = m·w/M, mol: the amount in a mass of purity w (a share by mass; null: pure); null for M = 0. */
export function amountInMass(mass: Quantity, purity: Quantity | null, molarMass: Quantity): Quantity | null {
  return quotientOf(purity === null ? [mass] : [mass, purity], [molarMass], amountUnit);
}

/** c = n/V, mol m⁻³ shown in mol/L: an amount in the volume of the mixture; null for V = 0. */
export function concentrationOf(amount: Quantity, volume: Quantity): Quantity | null {
  return quotientOf([amount], [volume], concentrationUnit);
}

function written({ value, unit }: Quantity): string {
  return formatQuantity(fromSI(value, unit), null, unit.text);
}
