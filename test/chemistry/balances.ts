/**
 * Equations without coefficients, and as they balance. Those of any general or analytical chemistry textbook (common
 * practice); each answer can be checked by counting atoms and charges.
 */
export const balances: readonly (readonly [
  group: string,
  rows: readonly (readonly [skeleton: string, answer: string])[],
])[] = [
  [
    "redox in acid",
    [
      ["MnO4^- + H2C2O4 + H^+ -> Mn^2+ + CO2 + H2O", "2 MnO4^- + 5 H2C2O4 + 6 H^+ -> 2 Mn^2+ + 10 CO2 + 8 H2O"],
      ["Cr2O7^2- + Fe^2+ + H^+ -> Cr^3+ + Fe^3+ + H2O", "Cr2O7^2- + 6 Fe^2+ + 14 H^+ -> 2 Cr^3+ + 6 Fe^3+ + 7 H2O"],
      ["Cr2O7^2- + I^- + H^+ -> Cr^3+ + I2 + H2O", "Cr2O7^2- + 6 I^- + 14 H^+ -> 2 Cr^3+ + 3 I2 + 7 H2O"],
      ["Cr2O7^2- + SO3^2- + H^+ -> Cr^3+ + SO4^2- + H2O", "Cr2O7^2- + 3 SO3^2- + 8 H^+ -> 2 Cr^3+ + 3 SO4^2- + 4 H2O"],
      ["IO3^- + I^- + H^+ -> I2 + H2O", "IO3^- + 5 I^- + 6 H^+ -> 3 I2 + 3 H2O"],
      ["ClO3^- + I^- + H^+ -> Cl^- + I2 + H2O", "ClO3^- + 6 I^- + 6 H^+ -> Cl^- + 3 I2 + 3 H2O"],
      ["BrO3^- + SO3^2- -> Br^- + SO4^2-", "BrO3^- + 3 SO3^2- -> Br^- + 3 SO4^2-"],
      ["NO2^- + I^- + H^+ -> NO + I2 + H2O", "2 NO2^- + 2 I^- + 4 H^+ -> 2 NO + I2 + 2 H2O"],
      ["PbO2 + Mn^2+ + H^+ -> Pb^2+ + MnO4^- + H2O", "5 PbO2 + 2 Mn^2+ + 4 H^+ -> 5 Pb^2+ + 2 MnO4^- + 2 H2O"],
      [
        "MnO4^- + [Fe(CN)6]^4- + H^+ -> Mn^2+ + [Fe(CN)6]^3- + H2O",
        "MnO4^- + 5 [Fe(CN)6]^4- + 8 H^+ -> Mn^2+ + 5 [Fe(CN)6]^3- + 4 H2O",
      ],
      ["Zn + NO3^- + H^+ -> Zn^2+ + NH4^+ + H2O", "4 Zn + NO3^- + 10 H^+ -> 4 Zn^2+ + NH4^+ + 3 H2O"],
      [
        "As2S3 + NO3^- + H^+ + H2O -> H3AsO4 + SO4^2- + NO",
        "3 As2S3 + 28 NO3^- + 10 H^+ + 4 H2O -> 6 H3AsO4 + 9 SO4^2- + 28 NO",
      ],
    ],
  ],
  [
    "redox in base",
    [
      ["MnO4^- + CN^- + H2O -> MnO2 + OCN^- + OH^-", "2 MnO4^- + 3 CN^- + H2O -> 2 MnO2 + 3 OCN^- + 2 OH^-"],
      ["MnO4^- + SO3^2- + OH^- -> MnO4^2- + SO4^2- + H2O", "2 MnO4^- + SO3^2- + 2 OH^- -> 2 MnO4^2- + SO4^2- + H2O"],
      ["CrO2^- + H2O2 + OH^- -> CrO4^2- + H2O", "2 CrO2^- + 3 H2O2 + 2 OH^- -> 2 CrO4^2- + 4 H2O"],
      ["Br2 + OH^- -> Br^- + BrO^- + H2O", "Br2 + 2 OH^- -> Br^- + BrO^- + H2O"],
      ["Zn + OH^- + H2O -> [Zn(OH)4]^2- + H2", "Zn + 2 OH^- + 2 H2O -> [Zn(OH)4]^2- + H2"],
      ["NO3^- + Al + OH^- + H2O -> NH3 + [Al(OH)4]^-", "3 NO3^- + 8 Al + 5 OH^- + 18 H2O -> 3 NH3 + 8 [Al(OH)4]^-"],
      ["P4 + OH^- + H2O -> PH3 + H2PO2^-", "P4 + 3 OH^- + 3 H2O -> PH3 + 3 H2PO2^-"],
      ["ClO^- + S2O3^2- + OH^- -> Cl^- + SO4^2- + H2O", "4 ClO^- + S2O3^2- + 2 OH^- -> 4 Cl^- + 2 SO4^2- + H2O"],
    ],
  ],
  [
    "hydrates",
    [
      ["Na2CO3·10H2O -> Na2CO3 + H2O", "Na2CO3·10H2O -> Na2CO3 + 10 H2O"],
      ["CoCl2.6H2O + SOCl2 -> CoCl2 + SO2 + HCl", "CoCl2.6H2O + 6 SOCl2 -> CoCl2 + 6 SO2 + 12 HCl"],
      ["CaSO4·2H2O -> (CaSO4)2·H2O + H2O", "2 CaSO4·2H2O -> (CaSO4)2·H2O + 3 H2O"],
      [
        "KMnO4 + FeSO4·7H2O + H2SO4 -> K2SO4 + MnSO4 + Fe2(SO4)3 + H2O",
        "2 KMnO4 + 10 FeSO4·7H2O + 8 H2SO4 -> K2SO4 + 2 MnSO4 + 5 Fe2(SO4)3 + 78 H2O",
      ],
      ["H2C2O4.2H2O + NaOH -> Na2C2O4 + H2O", "H2C2O4.2H2O + 2 NaOH -> Na2C2O4 + 4 H2O"],
    ],
  ],
  [
    "complexes",
    [
      ["AgCl + NH3 -> [Ag(NH3)2]^+ + Cl^-", "AgCl + 2 NH3 -> [Ag(NH3)2]^+ + Cl^-"],
      ["[Co(NH3)5Br]^2+ + OH^- -> [Co(NH3)5OH]^2+ + Br^-", "[Co(NH3)5Br]^2+ + OH^- -> [Co(NH3)5OH]^2+ + Br^-"],
      ["[Ni(H2O)6]^2+ + NH3 -> [Ni(NH3)6]^2+ + H2O", "[Ni(H2O)6]^2+ + 6 NH3 -> [Ni(NH3)6]^2+ + 6 H2O"],
      ["AgBr + S2O3^2- -> [Ag(S2O3)2]^3- + Br^-", "AgBr + 2 S2O3^2- -> [Ag(S2O3)2]^3- + Br^-"],
      ["Fe^3+ + [Fe(CN)6]^4- -> Fe4[Fe(CN)6]3", "4 Fe^3+ + 3 [Fe(CN)6]^4- -> Fe4[Fe(CN)6]3"],
      ["Au + CN^- + O2 + H2O -> [Au(CN)2]^- + OH^-", "4 Au + 8 CN^- + O2 + 2 H2O -> 4 [Au(CN)2]^- + 4 OH^-"],
    ],
  ],
  [
    "others",
    [
      ["CH3COOC2H5 + OH^- -> CH3COO^- + C2H5OH", "CH3COOC2H5 + OH^- -> CH3COO^- + C2H5OH"],
      ["C12H22O11 + H2O -> C6H12O6", "C12H22O11 + H2O -> 2 C6H12O6"],
      ["S2O3^2- + H^+ -> S + SO2 + H2O", "S2O3^2- + 2 H^+ -> S + SO2 + H2O"],
      ["CO(NH2)2 + H2O -> NH4^+ + CO3^2-", "CO(NH2)2 + 2 H2O -> 2 NH4^+ + CO3^2-"],
      ["CaC2 + D2O -> C2D2 + Ca(OD)2", "CaC2 + 2 D2O -> C2D2 + Ca(OD)2"],
      ["NH3 + O2 -> NO + H2O", "4 NH3 + 5 O2 -> 4 NO + 6 H2O"],
    ],
  ],
];
