/** One ion by its formula in ASCII, its charge and its English name. */
export interface IonRow {
  /** formula without its charge, as it stands in a salt: `SO4` */
  readonly body: string;
  readonly charge: number;
  readonly name: string;
}

function row(body: string, charge: number, name: string): IonRow {
  return { body, charge, name };
}

/**
 * Cations of common salts. Common practice; names after the IUPAC Red Book 2005, tables IR-4.1 and IX (from memory).
 */
export const cations: readonly IonRow[] = [
  row("H", 1, "hydrogen ion"),
  row("Li", 1, "lithium ion"),
  row("Na", 1, "sodium ion"),
  row("K", 1, "potassium ion"),
  row("Rb", 1, "rubidium ion"),
  row("Cs", 1, "caesium ion"),
  row("NH4", 1, "ammonium"),
  row("Ag", 1, "silver ion"),
  row("Mg", 2, "magnesium ion"),
  row("Ca", 2, "calcium ion"),
  row("Sr", 2, "strontium ion"),
  row("Ba", 2, "barium ion"),
  row("Mn", 2, "manganese(II)"),
  row("Fe", 2, "iron(II)"),
  row("Fe", 3, "iron(III)"),
  row("Co", 2, "cobalt(II)"),
  row("Ni", 2, "nickel(II)"),
  row("Cu", 2, "copper(II)"),
  row("Zn", 2, "zinc ion"),
  row("Cd", 2, "cadmium ion"),
  row("Pb", 2, "lead(II)"),
  row("Sn", 2, "tin(II)"),
  row("Al", 3, "aluminium ion"),
  row("Cr", 3, "chromium(III)"),
  row("Ce", 3, "cerium(III)"),
];

/** Anions of common salts and bases; the same source. */
export const anions: readonly IonRow[] = [
  row("OH", -1, "hydroxide"),
  row("F", -1, "fluoride"),
  row("Cl", -1, "chloride"),
  row("Br", -1, "bromide"),
  row("I", -1, "iodide"),
  row("I3", -1, "triiodide"),
  row("NO3", -1, "nitrate"),
  row("NO2", -1, "nitrite"),
  row("ClO", -1, "hypochlorite"),
  row("ClO2", -1, "chlorite"),
  row("ClO3", -1, "chlorate"),
  row("ClO4", -1, "perchlorate"),
  row("BrO3", -1, "bromate"),
  row("IO3", -1, "iodate"),
  row("IO4", -1, "periodate"),
  row("MnO4", -1, "permanganate"),
  row("HCO3", -1, "hydrogencarbonate"),
  row("HSO4", -1, "hydrogensulfate"),
  row("HSO3", -1, "hydrogensulfite"),
  row("H2PO4", -1, "dihydrogenphosphate"),
  row("CH3COO", -1, "acetate"),
  row("HCOO", -1, "formate"),
  row("CN", -1, "cyanide"),
  row("SCN", -1, "thiocyanate"),
  row("N3", -1, "azide"),
  row("SO4", -2, "sulfate"),
  row("SO3", -2, "sulfite"),
  row("S2O3", -2, "thiosulfate"),
  row("S2O8", -2, "peroxodisulfate"),
  row("S4O6", -2, "tetrathionate"),
  row("CO3", -2, "carbonate"),
  row("CrO4", -2, "chromate"),
  row("Cr2O7", -2, "dichromate"),
  row("HPO4", -2, "hydrogenphosphate"),
  row("C2O4", -2, "oxalate"),
  row("PO4", -3, "phosphate"),
  row("[Fe(CN)6]", -3, "hexacyanidoferrate(III)"),
  row("[Fe(CN)6]", -4, "hexacyanidoferrate(II)"),
];

/** Ions met in formulas and not in the two tables above; of two with the same letters the likelier stands first. */
export const otherIons: readonly IonRow[] = [
  row("H3O", 1, "oxonium"),
  row("Hg2", 2, "mercury(I)"),
  row("Hg", 2, "mercury(II)"),
  row("Cu", 1, "copper(I)"),
  row("Co", 3, "cobalt(III)"),
  row("Mn", 3, "manganese(III)"),
  row("Ce", 4, "cerium(IV)"),
  row("Sn", 4, "tin(IV)"),
  row("V", 3, "vanadium(III)"),
  row("Ti", 3, "titanium(III)"),
  row("VO", 2, "oxidovanadium(IV)"),
  row("VO2", 1, "dioxidovanadium(V)"),
  row("UO2", 2, "uranyl"),
  row("O", -2, "oxide"),
  row("O2", -1, "superoxide"),
  row("O2", -2, "peroxide"),
  row("S", -2, "sulfide"),
  row("N", -3, "nitride"),
  row("HS", -1, "hydrogensulfide"),
  row("HO2", -1, "hydrogenperoxide"),
  row("IO", -1, "hypoiodite"),
  row("BrO", -1, "hypobromite"),
  row("Br3", -1, "tribromide"),
  row("MnO4", -2, "manganate"),
  row("BH4", -1, "tetrahydroborate"),
];
