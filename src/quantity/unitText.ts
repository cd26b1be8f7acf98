import type { Notation } from "./notation.js";
import { toSuperscript } from "./plainText.js";
import type { Unit } from "./unit.js";

/**
 * A unit as it is written: `mol L^-1 s^-1` or `mol·L⁻¹·s⁻¹`, "" for a plain number. `readUnit` reads either back as the
 * same unit (SI Brochure, 9th edition, 5.2: products by a space or a raised dot, negative exponents).
 */
export function unitText(unit: Unit, notation: Notation): string {
  return notation === "ascii" ? unit.text : printedUnit(unit.text);
}

/** A unit's ASCII text with the signs of print: `mol L^-1 s^-1` to `mol·L⁻¹·s⁻¹`, `degC` to `°C`, `uL` to `µL`. */
export function printedUnit(text: string): string {
  return text
    .split(" ")
    .map((part) => {
      const [symbol = "", exponent] = part.split("^");
      const printed = symbol
        .replace(/^deg/, "°")
        .replace(/^u(?=[A-Za-z])/, "µ")
        .replace(/Ohm$/, "Ω")
        .replace(/^angstrom$/, "Å");
      if (exponent === undefined) return printed;
      return printed + (exponent.includes(".") ? `^${exponent}` : toSuperscript(exponent));
    })
    .join("·");
}
