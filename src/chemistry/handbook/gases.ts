/** A gas and what is dangerous about it. */
export interface GasRow {
  /** formula in ASCII, as it is usually written */
  readonly formula: string;
  readonly name: string;
  /** toxic: acute toxicity category 1 to 3, or a limit at the workplace of 10 ppm or less; unstable: may explode by itself */
  readonly flags: readonly ("toxic" | "flammable" | "oxidising" | "corrosive" | "unstable")[];
  /** simple: displaces oxygen; chemical: stops its use in the body */
  readonly asphyxiant: "simple" | "chemical" | "no";
  /** its density beside air's; a dilute mixture moves with the air */
  readonly thanAir: "heavier" | "lighter" | "same";
  /**
   * Whether a product written without a state is taken to come off as a gas. False for what stays in solution or
   * condenses near room temperature (HCl, NH3, HCN, Br2 …).
   */
  readonly unmarked: boolean;
  /** lowest and highest mole fraction in air that burns, mol/mol, the widest of the figures */
  readonly burns?: readonly [low: number, high: number];
  /** groups of the table of pairs */
  readonly groups?: readonly string[];
  readonly note?: string;
}

/**
 * Gases of small batch reactions. Flags, notes, `unmarked` and `groups`: from memory. Densities: from molar masses against
 * dry air, 28.96 g/mol. `burns`: IEC 60079-20-1:2010 and NFPA 497 (2008), both as tabulated in the open-source Python
 * library chemicals 1.5.2; PH3 and AsH3 low from Wikidata there (the least checked of its tables), PH3 high and SiH4
 * from memory, AsH3 high from Wikidata. Exposure limits are left out: they differ by country and are lowered over time.
 */
// biome-ignore format: a table reads best with one row a line
export const gases: readonly GasRow[] = [
  { formula: "H2", name: "hydrogen", flags: ["flammable"], asphyxiant: "simple", thanAir: "lighter", unmarked: true, burns: [0.04, 0.77], note: "burns with an almost invisible flame; very low ignition energy" },
  { formula: "O2", name: "oxygen", flags: ["oxidising"], asphyxiant: "no", thanAir: "heavier", unmarked: true, note: "enriched air makes clothing and grease burn fiercely" },
  { formula: "N2", name: "nitrogen", flags: [], asphyxiant: "simple", thanAir: "same", unmarked: true },
  { formula: "Ar", name: "argon", flags: [], asphyxiant: "simple", thanAir: "heavier", unmarked: true },
  { formula: "CO", name: "carbon monoxide", flags: ["toxic", "flammable"], asphyxiant: "chemical", thanAir: "same", unmarked: true, burns: [0.109, 0.74], note: "no smell" },
  { formula: "CO2", name: "carbon dioxide", flags: [], asphyxiant: "simple", thanAir: "heavier", unmarked: true, note: "harmful by itself above a few percent; collects in low places" },
  { formula: "NO", name: "nitrogen monoxide", flags: ["toxic", "oxidising", "corrosive"], asphyxiant: "no", thanAir: "same", unmarked: true, note: "turns to NO2 in air" },
  { formula: "NO2", name: "nitrogen dioxide", flags: ["toxic", "oxidising", "corrosive"], asphyxiant: "no", thanAir: "heavier", unmarked: true, note: "delayed lung injury; in part N2O4, which is denser still" },
  { formula: "N2O", name: "dinitrogen monoxide", flags: ["oxidising"], asphyxiant: "simple", thanAir: "heavier", unmarked: true, note: "narcotic" },
  { formula: "SO2", name: "sulfur dioxide", flags: ["toxic", "corrosive"], asphyxiant: "no", thanAir: "heavier", unmarked: true },
  { formula: "SO3", name: "sulfur trioxide", flags: ["toxic", "oxidising", "corrosive"], asphyxiant: "no", thanAir: "heavier", unmarked: false, note: "reacts violently with water; fumes" },
  { formula: "H2S", name: "hydrogen sulfide", flags: ["toxic", "flammable"], asphyxiant: "chemical", thanAir: "heavier", unmarked: true, burns: [0.04, 0.455], note: "the sense of smell fails at dangerous concentrations" },
  { formula: "Cl2", name: "chlorine", flags: ["toxic", "oxidising", "corrosive"], asphyxiant: "no", thanAir: "heavier", unmarked: true, groups: ["halogen"] },
  { formula: "NH3", name: "ammonia", flags: ["toxic", "flammable", "corrosive"], asphyxiant: "no", thanAir: "lighter", unmarked: false, burns: [0.15, 0.336] },
  { formula: "HCl", name: "hydrogen chloride", flags: ["toxic", "corrosive"], asphyxiant: "no", thanAir: "heavier", unmarked: false },
  { formula: "HBr", name: "hydrogen bromide", flags: ["toxic", "corrosive"], asphyxiant: "no", thanAir: "heavier", unmarked: false },
  { formula: "HI", name: "hydrogen iodide", flags: ["toxic", "corrosive"], asphyxiant: "no", thanAir: "heavier", unmarked: false },
  { formula: "HF", name: "hydrogen fluoride", flags: ["toxic", "corrosive"], asphyxiant: "no", thanAir: "lighter", unmarked: false, note: "its molecules join near room temperature and make it denser; burns need calcium gluconate" },
  { formula: "HCN", name: "hydrogen cyanide", flags: ["toxic", "flammable"], asphyxiant: "chemical", thanAir: "lighter", unmarked: false, burns: [0.054, 0.46], note: "absorbed through the skin; boils at 26 °C" },
  { formula: "HN3", name: "hydrogen azide", flags: ["toxic", "unstable"], asphyxiant: "no", thanAir: "heavier", unmarked: false, note: "explosive as gas, liquid and strong solution; boils at about 36 °C" },
  { formula: "CH4", name: "methane", flags: ["flammable"], asphyxiant: "simple", thanAir: "lighter", unmarked: true, burns: [0.044, 0.17] },
  { formula: "C2H6", name: "ethane", flags: ["flammable"], asphyxiant: "simple", thanAir: "same", unmarked: true, burns: [0.024, 0.155] },
  { formula: "C3H8", name: "propane", flags: ["flammable"], asphyxiant: "simple", thanAir: "heavier", unmarked: true, burns: [0.017, 0.109] },
  { formula: "C2H4", name: "ethene", flags: ["flammable"], asphyxiant: "simple", thanAir: "same", unmarked: true, burns: [0.023, 0.36] },
  { formula: "C3H6", name: "propene", flags: ["flammable"], asphyxiant: "simple", thanAir: "heavier", unmarked: true, burns: [0.02, 0.111] },
  { formula: "C4H8", name: "butene (figures of 2-methylpropene)", flags: ["flammable"], asphyxiant: "simple", thanAir: "heavier", unmarked: true, burns: [0.016, 0.1], note: "given by the acid dehydration or elimination of tert-butyl compounds" },
  { formula: "C2H2", name: "ethyne (acetylene)", flags: ["flammable", "unstable"], asphyxiant: "simple", thanAir: "lighter", unmarked: true, burns: [0.023, 1], note: "can decompose without air, hence the upper limit 1; explosive acetylides with copper, silver, mercury" },
  { formula: "PH3", name: "phosphine", flags: ["toxic", "flammable", "corrosive"], asphyxiant: "no", thanAir: "heavier", unmarked: true, burns: [0.0179, 0.98], note: "may ignite in air by itself" },
  { formula: "AsH3", name: "arsine", flags: ["toxic", "flammable"], asphyxiant: "no", thanAir: "heavier", unmarked: true, burns: [0.051, 0.78], note: "destroys red blood cells" },
  { formula: "SiH4", name: "silane", flags: ["toxic", "flammable"], asphyxiant: "no", thanAir: "heavier", unmarked: true, burns: [0.0137, 0.96], note: "ignites in air by itself" },
  { formula: "O3", name: "ozone", flags: ["toxic", "oxidising", "unstable"], asphyxiant: "no", thanAir: "heavier", unmarked: true },
  { formula: "ClO2", name: "chlorine dioxide", flags: ["toxic", "oxidising", "corrosive", "unstable"], asphyxiant: "no", thanAir: "heavier", unmarked: false, note: "may decompose explosively above about 0.1 mol/mol" },
  { formula: "NOCl", name: "nitrosyl chloride", flags: ["toxic", "oxidising", "corrosive"], asphyxiant: "no", thanAir: "heavier", unmarked: true, note: "from aqua regia" },
  { formula: "F2", name: "fluorine", flags: ["toxic", "oxidising", "corrosive"], asphyxiant: "no", thanAir: "heavier", unmarked: true, groups: ["halogen"] },
  { formula: "Br2", name: "bromine vapour", flags: ["toxic", "oxidising", "corrosive"], asphyxiant: "no", thanAir: "heavier", unmarked: false },
  { formula: "COCl2", name: "carbonyl chloride (phosgene)", flags: ["toxic", "corrosive"], asphyxiant: "no", thanAir: "heavier", unmarked: true, note: "delayed lung injury" },
  { formula: "ClCN", name: "cyanogen chloride", flags: ["toxic", "corrosive"], asphyxiant: "chemical", thanAir: "heavier", unmarked: true, note: "from cyanide and hypochlorite or chlorine below pH 10" },
  { formula: "NH2Cl", name: "chloramine", flags: ["toxic", "corrosive"], asphyxiant: "no", thanAir: "heavier", unmarked: false, note: "from ammonia and hypochlorite; also di- and trichloramine" },
  { formula: "NCl3", name: "nitrogen trichloride", flags: ["toxic", "corrosive", "unstable"], asphyxiant: "no", thanAir: "heavier", unmarked: false, note: "explosive oil or vapour" },
  { formula: "CH3NH2", name: "methylamine", flags: ["toxic", "flammable"], asphyxiant: "no", thanAir: "heavier", unmarked: false, burns: [0.042, 0.207], groups: ["amine"] },
  { formula: "(CH3)2NH", name: "dimethylamine", flags: ["toxic", "flammable"], asphyxiant: "no", thanAir: "heavier", unmarked: false, burns: [0.028, 0.144], groups: ["amine"] },
  { formula: "(CH3)3N", name: "trimethylamine", flags: ["toxic", "flammable"], asphyxiant: "no", thanAir: "heavier", unmarked: false, burns: [0.02, 0.12], groups: ["amine"] },
  { formula: "CH3Cl", name: "chloromethane", flags: ["flammable"], asphyxiant: "no", thanAir: "heavier", unmarked: true, burns: [0.076, 0.19], note: "suspected carcinogen" },
  { formula: "C2H5Cl", name: "chloroethane", flags: ["flammable"], asphyxiant: "no", thanAir: "heavier", unmarked: true, burns: [0.036, 0.154], note: "suspected carcinogen; narcotic" },
];
