import { chargeText } from "../formula.js";
import { anions, cations, type IonRow } from "./ions.js";

/** Ions that one formula unit gives in water. */
export interface Ion {
  /** normal form: `SO4^2-` */
  readonly key: string;
  readonly count: number;
}

/**
 * The ions that a common strong acid, strong base or soluble salt gives in water, by the normal form of its formula
 * (`KI`, `(NH4)2SO4`, `CuSO4.5H2O`; `CH3COONa` too); null where the handbook does not know it as one. Sulfuric acid
 * gives H^+ and HSO4^-. Common practice (the solubility rules and the list of strong acids of any general chemistry
 * textbook).
 */
export function ionsOf(formula: string): readonly Ion[] | null {
  const anhydrous = formula.replace(/\.\d*H2O$/, "");
  return electrolytes.get(anhydrous) ?? null;
}

const strongAcids = ["Cl", "Br", "I", "NO3", "ClO3", "ClO4", "HSO4", "MnO4", "IO4", "BrO3"];
const strongBases = ["Li", "Na", "K", "Rb", "Cs", "Ca", "Sr", "Ba"];
const alkali = ["Li", "Na", "K", "Rb", "Cs", "NH4"];
/** Anions whose salts dissolve with every cation of the table but those named. */
const dissolving: Readonly<Record<string, readonly string[]>> = {
  NO3: [],
  ClO3: [],
  ClO4: [],
  MnO4: ["Ag"],
  BrO3: ["Ag", "Pb", "Ba"],
  CH3COO: ["Ag"],
  HCOO: ["Pb", "Ag"],
  Cl: ["Ag", "Pb"],
  Br: ["Ag", "Pb"],
  I: ["Ag", "Pb", "Cu", "Fe3"],
  SO4: ["Ag", "Ca", "Sr", "Ba", "Pb"],
  SCN: ["Ag", "Cu", "Pb"],
  S2O3: ["Ag", "Pb", "Ba", "Cu", "Fe3"],
  S2O8: [],
  NO2: ["Ag", "Fe3", "Al", "Cr"],
};

const electrolytes: ReadonlyMap<string, readonly Ion[]> = new Map(
  cations.flatMap((cation) =>
    anions.filter((anion) => dissolves(cation, anion)).flatMap((anion) => spellings(cation, anion)),
  ),
);

function dissolves(cation: IonRow, anion: IonRow): boolean {
  if (cation.body === "H") return strongAcids.includes(anion.body);
  if (anion.body === "OH") return strongBases.includes(cation.body);
  if (alkali.includes(cation.body)) return true;
  const refused = dissolving[anion.body];
  if (refused === undefined) return false;
  return !refused.includes(cation.body) && !refused.includes(`${cation.body}${cation.charge}`);
}

/** Each way to write the salt, with its ions. */
function spellings(cation: IonRow, anion: IonRow): [string, readonly Ion[]][] {
  const common = divisor(cation.charge, -anion.charge);
  const positive = -anion.charge / common;
  const negative = cation.charge / common;
  const ions = [
    { key: cation.body + chargeText(cation.charge), count: positive },
    { key: anion.body + chargeText(anion.charge), count: negative },
  ];
  const first = times(cation.body, positive);
  const last = times(anion.body, negative);
  const joined = cation.body === "H" && anion.body.startsWith("H") ? `H2${anion.body.slice(1)}` : first + last;
  const written = [joined];
  if (anion.body.startsWith("[")) written.push(joined.replace(/[[\]]/g, ""));
  if (anion.body.endsWith("COO")) written.push(last + first);
  if (anion.body === "CH3COO") written.push(first + times("C2H3O2", negative));
  if (anion.body === "SCN") written.push(first + times("NCS", negative));
  return written.map((text) => [text, ions]);
}

function times(body: string, count: number): string {
  if (count === 1) return body;
  return /^[A-Z][a-z]?$/.test(body) ? `${body}${count}` : `(${body})${count}`;
}

function divisor(a: number, b: number): number {
  return b === 0 ? a : divisor(b, a % b);
}
