/** What a species is made of and its charge. */
export interface Formula {
  /** atoms of each element (D and T count as their own), in order of appearance */
  readonly parts: ReadonlyMap<string, number>;
  /** in elementary charges */
  readonly charge: number;
  /** the one ASCII form: `SO4^2-`, `CuSO4.5H2O`, `[Co(NH3)5Br]^2+`, `H^+` */
  readonly text: string;
}

/** The charge as formulas write it: `^2-`, `^+`, "" for none. */
export function chargeText(charge: number): string {
  if (charge === 0) return "";
  const size = Math.abs(charge);
  return `^${size === 1 ? "" : size}${charge < 0 ? "-" : "+"}`;
}

/** A formula's ASCII text with the signs of print: `SO4^2-` to `SO₄²⁻`, `CuSO4.5H2O` to `CuSO₄·5H₂O`. */
export function printedFormula(text: string): string {
  const [body = "", charge = ""] = text.split("^");
  const below = body.replace(/(?<=[A-Za-z)\]}])\d+/g, (digits) =>
    [...digits].map((digit) => "₀₁₂₃₄₅₆₇₈₉".charAt(Number(digit))).join(""),
  );
  const above = [...charge].map((sign) => "⁺⁻⁰¹²³⁴⁵⁶⁷⁸⁹".charAt("+-0123456789".indexOf(sign))).join("");
  return below.replaceAll(".", "·") + above;
}
