import { fromSI, intervalFromSI } from "./conversion.js";
import { formatQuantity } from "./formatNumber.js";
import { toSuperscript } from "./plainText.js";
import { combined, type Quantity } from "./quantity.js";

/** A quantity in its own unit, two significant digits of its combined uncertainty: `0.1000(20) mol L^-1`. */
export function quantityText({ value, unit, sources }: Quantity): string {
  const u = combined(sources);
  return formatQuantity(fromSI(value, unit), u === null ? null : intervalFromSI(u, unit), unit.text);
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
        .replace(/Ohm$/, "Ω");
      if (exponent === undefined) return printed;
      return printed + (exponent.includes(".") ? `^${exponent}` : toSuperscript(exponent));
    })
    .join("·");
}
