import { henryConstants } from "../chemistry/handbook/henry.js";
import { exp } from "../numerics/elementary.js";

/**
 * Concentration of a dissolved gas in water over its pressure, mol/(m³ Pa), at `temperature` (K): H(T) = H exp(b (1/T −
 * 1/298.15 K)), R. Sander, Atmos. Chem. Phys. 23 (2023) 10901, of the formula `gas`. Null for a gas that is not in the
 * handbook, and outside 0 to 100 °C, where it is not to be trusted.
 */
export function henryConstant(gas: string, temperature: number): number | null {
  const found = henryConstants.find((row) => row.gas === gas);
  if (found === undefined || !(temperature >= 273.15 && temperature <= 373.15)) return null;
  return found.constant * exp(found.slope * (1 / temperature - 1 / 298.15));
}
