/** One unit of this language and the UCUM codes it is a product of, each with its exponent. */
export interface CodedUnit {
  readonly symbol: string;
  readonly codes: readonly (readonly [code: string, exponent: number])[];
  /** the prefixes that both sides know before it */
  readonly prefixes: readonly string[];
}

const none: readonly string[] = [""];
const few: readonly string[] = ["", "k", "m", "u"];
const many: readonly string[] = ["", "k", "M", "G", "T", "h", "d", "c", "m", "u", "n", "p", "f", "a"];

function coded(symbol: string, code: string, prefixes: readonly string[] = none): CodedUnit {
  return { symbol, codes: [[code, 1]], prefixes };
}

/**
 * Units that may stand for each other, by kind, with their UCUM codes (ucum-essence.xml; the molar is mol/L there, the
 * reciprocal minute stands for rpm). All of the table of units but those of `apart`. The prefixes ronna, quetta, ronto
 * and quecto are not in that version of UCUM and are left out.
 */
export const groups: readonly (readonly CodedUnit[])[] = [
  [coded("m", "m", many), coded("angstrom", "Ao"), coded("in", "[in_i]"), coded("ft", "[ft_i]")],
  [coded("g", "g", many), coded("t", "t", ["", "k", "M"]), coded("lb", "[lb_av]"), coded("oz", "[oz_av]")],
  [coded("g", "g", many), coded("gr", "[gr]")],
  [coded("L", "L", many), coded("gal_US", "[gal_us]"), coded("floz_US", "[foz_us]")],
  [coded("s", "s", many), coded("min", "min"), coded("h", "h"), coded("d", "d"), coded("wk", "wk")],
  [coded("mol", "mol", many)],
  [coded("A", "A", many)],
  [coded("K", "K", many)],
  [coded("cd", "cd", few)],
  [coded("Hz", "Hz", many), coded("Bq", "Bq", few), { symbol: "rpm", codes: [["min", -1]], prefixes: none }],
  [coded("N", "N", many), coded("dyn", "dyn"), coded("kgf", "kgf")],
  [coded("Pa", "Pa", many), coded("bar", "bar", few), coded("atm", "atm"), coded("psi", "[psi]")],
  [coded("Pa", "Pa", many), coded("mmH2O", "mm[H2O]"), coded("cmH2O", "cm[H2O]")],
  [coded("J", "J", many), coded("erg", "erg"), coded("cal", "cal_th", ["", "k", "m"])],
  [coded("J", "J", many), coded("cal_IT", "cal_IT", ["", "k"]), coded("cal_15", "cal_[15]", ["", "k"])],
  [coded("W", "W", many)],
  [coded("C", "C", many)],
  [coded("V", "V", many)],
  [coded("F", "F", many)],
  [coded("S", "S", many), coded("mho", "mho", ["", "m", "u"])],
  [coded("Ohm", "Ohm", many)],
  [coded("Wb", "Wb", few)],
  [coded("T", "T", few)],
  [coded("H", "H", few)],
  [coded("lm", "lm", few)],
  [coded("lx", "lx", few)],
  [coded("Gy", "Gy", few), coded("Sv", "Sv", few)],
  [coded("kat", "kat", few), coded("U", "U", few)],
  [coded("P", "P", ["", "c", "m"])],
  [coded("St", "St", ["", "c", "m"])],
  [coded("g_n", "[g]")],
  [coded("rad", "rad", few), coded("deg", "deg")],
  [coded("sr", "sr")],
  [coded("%", "%"), coded("‰", "[ppth]"), coded("ppm", "[ppm]"), coded("ppb", "[ppb]")],
  [
    ...["", "k", "d", "c", "m", "u", "n", "p"].map((prefix) => ({
      symbol: `${prefix}M`,
      codes: [
        [`${prefix}mol`, 1],
        ["L", -1],
      ] as const,
      prefixes: none,
    })),
  ],
];

/** Units of the table that are not compared in `groups`, and why. */
export const apart: Readonly<Record<string, string>> = {
  Torr: "133.322 Pa in the library, 101325/760 Pa here",
  mmHg: "UCUM's metre of mercury is 133.3220 kPa, the conventional one 133.322387415 kPa",
  inHg: "the same",
  u: "the library keeps the value of 1986; CODATA 2022 here",
  Da: "UCUM has no dalton",
  eV: "the library keeps the value of 1986; exact since 2019 here",
  degC: "has a zero point of its own: compared as a point",
  degF: "has a zero point of its own: compared as a point",
  AU: "a reading of absorbance here, the astronomic unit in UCUM",
};
