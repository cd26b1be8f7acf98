import { toSuperscript } from "./plainText.js";

/** How signs are written: `±`, `°C`, `·`, `⁻¹`, `×10⁻³` and U+2212, or `+/-`, `degC`, space, `^-1`, `e-3` and `-`. */
export type Notation = "unicode" | "ascii";

/** A number's ASCII text in a notation: `-5.502(73)e-4` to `−5.502(73)×10⁻⁴`, `+/-` to `±`. */
export function numberText(ascii: string, notation: Notation): string {
  if (notation === "ascii") return ascii;
  return ascii
    .replace("+/-", "±")
    .replace(/e\+?(-?\d+)/g, (_, exponent: string) => `×10${toSuperscript(exponent)}`)
    .replace(/-/g, "\u2212");
}
