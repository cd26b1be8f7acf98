/** An ion that puts whatever holds it into groups of the table of pairs. */
export interface IonGroupRow {
  /** formula without its charge, as it stands in a salt */
  readonly body: string;
  readonly sign: "+" | "-";
  readonly groups: readonly string[];
  /** `name` of the reagent whose hazards stand for soluble salts of the ion that have no row of their own */
  readonly like?: string;
}

function row(body: string, sign: "+" | "-", groups: readonly string[], like?: string): IonGroupRow {
  return like === undefined ? { body, sign, groups } : { body, sign, groups, like };
}

/**
 * What ions are dangerous as, so that sodium peroxodisulfate and S2O8^2- are known where the table of substances has
 * the potassium salt only. Groups are those that the reagents of that table have for the sake of the ion; common practice.
 */
export const ionGroups: readonly IonGroupRow[] = [
  row("H", "+", ["acid", "strong acid"]),
  row("H3O", "+", ["acid", "strong acid"]),
  row("HSO4", "-", ["acid"]),
  row("OH", "-", ["alkali", "strong alkali"], "sodium hydroxide"),
  row("CO3", "-", ["carbonate"]),
  row("HCO3", "-", ["carbonate"]),
  row("ClO", "-", ["hypochlorite", "oxidiser"], "sodium hypochlorite solution, 5 % active chlorine or more"),
  row("ClO2", "-", ["chlorite", "oxidiser"], "sodium chlorite"),
  row("ClO3", "-", ["chlorate", "oxidiser"], "potassium chlorate"),
  row("BrO3", "-", ["bromate", "oxidiser"], "potassium bromate"),
  row("IO3", "-", ["iodate", "oxidiser"], "potassium iodate"),
  row("NO3", "-", ["nitrate", "oxidiser"], "potassium nitrate"),
  row("NO2", "-", ["nitrite", "oxidiser"], "sodium nitrite"),
  row("MnO4", "-", ["permanganate", "oxidiser"], "potassium permanganate"),
  row("Cr2O7", "-", ["dichromate", "chromium(VI)", "oxidiser"], "potassium dichromate"),
  row("CrO4", "-", ["chromium(VI)", "oxidiser"], "potassium chromate"),
  row("S2O8", "-", ["persulfate", "oxidiser"], "potassium peroxodisulfate"),
  row("N3", "-", ["azide"], "sodium azide"),
  row("CN", "-", ["cyanide"], "potassium cyanide"),
  row("SCN", "-", ["thiocyanate"], "potassium thiocyanate"),
  row("[Fe(CN)6]", "-", ["complex cyanide"], "potassium hexacyanoferrate(III)"),
  row("S", "-", ["sulfide", "reducing agent"], "sodium sulfide"),
  row("HS", "-", ["sulfide", "reducing agent"], "sodium sulfide"),
  row("SO3", "-", ["sulfite", "reducing agent"], "sodium sulfite"),
  row("HSO3", "-", ["sulfite", "reducing agent"], "sodium hydrogensulfite"),
  row("S2O5", "-", ["sulfite", "reducing agent"], "sodium disulfite (metabisulfite)"),
  row("S2O4", "-", ["dithionite", "reducing agent"], "sodium dithionite"),
  row("S2O3", "-", ["thiosulfate", "reducing agent"]),
  row("I", "-", ["iodide", "peroxide catalyst", "reducing agent"], "potassium iodide"),
  row("BH4", "-", ["hydride", "water-reactive", "reducing agent"], "sodium borohydride"),
  row("NH4", "+", ["ammonium salt"]),
  row("Ag", "+", ["silver salt", "heavy metal salt"]),
  row("Cu", "+", ["copper salt", "heavy metal salt", "peroxide catalyst"], "copper(II) sulfate pentahydrate"),
  row("Fe", "+", ["iron salt", "peroxide catalyst"]),
  row("Co", "+", ["heavy metal salt", "peroxide catalyst"], "cobalt(II) chloride"),
  row("Ni", "+", ["heavy metal salt"], "nickel(II) sulfate"),
  row("Pb", "+", ["heavy metal salt"], "lead(II) nitrate"),
  row("Hg", "+", ["heavy metal salt"]),
  row("Hg2", "+", ["heavy metal salt"]),
];
