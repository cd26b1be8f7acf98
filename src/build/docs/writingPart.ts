import { code } from "./prose.js";

/** Something written, and what it means. */
interface Writing {
  readonly write: string;
  readonly means: string;
}

/** Ways to write a number with its uncertainty and unit; a test reads each. */
export const numberWritings: readonly Writing[] = [
  { write: "0.100(2) mol/L", means: "0.100 mol/L with a standard uncertainty of 0.002 mol/L" },
  { write: "0.0500 +/- 0.0005 mol/L", means: "the same, written out; `±` is `+/-`" },
  { write: "0.100 mol/L ± 2 %", means: "a standard uncertainty of 2 % of the value" },
  { write: "50.00 mL within 0.05 mL", means: "a tolerance: u = 0.05/√3 mL (JCGM 100:2008, 4.3.7)" },
  { write: "12.5e-3 mol/L", means: "12.5 × 10^-3; `12.5×10^-3` is read too" },
  { write: "1.0(1)e-3 s^-1", means: "(1.0 ± 0.1) × 10^-3 s^-1" },
  { write: "1 min 30 s", means: "a time of several parts, from the larger to the smaller" },
  { write: "00:01:30", means: "hours, minutes, seconds" },
  { write: "25.0 °C", means: "degrees Celsius; `degC` is `°C`" },
];

/** Ways to write a species; a test reads each. */
export const speciesWritings: readonly Writing[] = [
  { write: "H2O2", means: "counts stand behind what they count" },
  { write: "SO4^2-", means: "a charge stands behind `^`; raised signs are read too" },
  { write: "OH-", means: "a bare sign without a digit before it is a single charge" },
  { write: "[Co(NH3)5Br]^2+", means: "brackets, of a complex or inside a formula" },
  { write: "CuSO4·5H2O", means: "a hydrate; `.` is `·`" },
  { write: "O2(g)", means: "a state: `(s)`, `(l)`, `(g)` or `(aq)`" },
];

/** Words that join the parts of lines and therefore cannot be names; a test tries each. */
export const connectives: readonly string[] =
  "in from as at to of is by like using and with after within reads purity density giving".split(" ");

const table = (writings: readonly Writing[]): string =>
  ["| written | means |", "| --- | --- |", ...writings.map(({ write, means }) => `| ${code(write)} | ${means} |`)].join(
    "\n",
  );

export function numbersPart(): string[] {
  return [
    "## How numbers are written",
    "Decimals take a point; a comma between digits is an error, since it could be a decimal sign or a thousands mark. One standard uncertainty is stated, in one of these ways. Dates are written year first: `2026-11-03`.",
    table(numberWritings),
  ];
}

export function namesPart(): string[] {
  return [
    "## How names are made",
    "Runs, columns, species and whatever else a line declares go by names of letters, digits, `_`, `-` and `′`; capitals count. A name is declared once for its kind, columns once in each run. A declared name goes before a formula of the same letters.",
    `These words join the parts of lines and cannot be names: ${connectives.map(code).join(" ")}.`,
  ];
}

export function speciesPart(): string[] {
  return [
    "## How species are written",
    table(speciesWritings),
    "A digit before a bare sign is asked about: `Fe3+` could be `Fe^3+` or `Fe3^+`. Equations take `->` where the reaction goes one way and `<=>` where it goes back too; coefficients are whole numbers or fractions such as `1/2`, and what goes by a name without a formula is declared by a `species` line.",
  ];
}
