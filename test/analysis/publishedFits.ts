/** Published fits of y = infinity (1 - exp(-k t)): data and certified value and standard error of each parameter. */
export interface CertifiedFit {
  readonly name: string;
  readonly source: string;
  readonly unit: string;
  readonly t: readonly number[];
  readonly y: readonly number[];
  readonly k: readonly [number, number];
  readonly infinity: readonly [number, number];
  readonly residual: number;
  readonly degreesOfFreedom: number;
}

export const certifiedFits: readonly CertifiedFit[] = [
  {
    name: "Misra1a",
    source:
      "NIST Statistical Reference Datasets, Nonlinear Regression (NIST/ITL StRD), data set Misra1a; data from: Misra, D., NIST (1978). Dental Research Monomolecular Adsorption Study.",
    unit: "min",
    t: [77.6, 114.9, 141.1, 190.8, 239.9, 289.0, 332.8, 378.4, 434.8, 477.3, 536.8, 593.1, 689.1, 760.0],
    y: [10.07, 14.73, 17.94, 23.93, 29.61, 35.18, 40.02, 44.82, 50.76, 55.05, 61.01, 66.4, 75.47, 81.78],
    k: [0.00055015643181, 7.2668688436e-6],
    infinity: [238.94212918, 2.7070075241],
    residual: 0.1018787633,
    degreesOfFreedom: 12,
  },
  {
    name: "BoxBOD",
    source:
      "NIST Statistical Reference Datasets, Nonlinear Regression (NIST/ITL StRD), data set BoxBOD; data from: Box, G. P., W. G. Hunter, and J. S. Hunter (1978). Statistics for Experimenters. New York, NY: Wiley, pp. 483-487.",
    unit: "min",
    t: [1.0, 2.0, 3.0, 5.0, 7.0, 10.0],
    y: [109.0, 149.0, 149.0, 191.0, 213.0, 224.0],
    k: [0.54723748542, 0.10455993237],
    infinity: [213.80940889, 12.354515176],
    residual: 17.088072423,
    degreesOfFreedom: 4,
  },
  {
    name: "BOD",
    source:
      "R package datasets, data frame BOD; original: Marske (1967) M.S. thesis, University of Wisconsin-Madison, reproduced in Bates and Watts (1988) Nonlinear Regression Analysis and Its Applications, Wiley, appendix A1.4; data read from R 4.2.2 datasets; estimates computed with R 4.2.2 and mpmath",
    unit: "d",
    t: [1, 2, 3, 4, 5, 7],
    y: [8.3, 10.3, 19.0, 16.0, 15.6, 19.8],
    k: [0.531091376965, 0.203082100435],
    infinity: [19.1425752846, 2.49591733221],
    residual: 2.54903252637,
    degreesOfFreedom: 4,
  },
];

/** Published decays c = c0 exp(-k′ t) with the answers of an independent nonlinear fit, equal weights. */
export interface ClassicDecay {
  readonly name: string;
  readonly source: string;
  readonly reaction: string;
  readonly species: string;
  readonly number: number;
  readonly t: readonly number[];
  readonly c: readonly number[];
  readonly kPrime: readonly [number, number];
  readonly start: readonly [number, number];
  readonly residual: number;
  readonly halfLife: number;
}

export const classicDecays: readonly ClassicDecay[] = [
  {
    name: "N2O5 gas at 318 K",
    source:
      "table in NCERT Chemistry, class XII part I, chemical kinetics chapter; behind it Daniels and Johnston 1921; data read from public textbook-question pages (shaalaa.com 9119 and 2899: first nine points; the tenth, 0.29 at 3600 s, from log10 c = -2.5376 on wiredfaculty.com)",
    reaction: "2 N2O5 -> 4 NO2 + O2",
    species: "N2O5",
    number: 2,
    t: [0, 400, 800, 1200, 1600, 2000, 2400, 2800, 3200, 3600],
    c: [0.0163, 0.0136, 0.0114, 0.0093, 0.0078, 0.0064, 0.0053, 0.0043, 0.0035, 0.0029],
    kPrime: [0.000472804940488, 3.91664299992e-6],
    start: [0.0164146931788, 7.4066630703e-5],
    residual: 9.6339033427e-5,
    halfLife: 1466.03201702,
  },
  {
    name: "hydrogen peroxide decomposition",
    source: "Petrucci et al., General Chemistry, chemical kinetics chapter; data from memory",
    reaction: "2 H2O2 -> 2 H2O + O2",
    species: "H2O2",
    number: 2,
    t: [0, 200, 400, 600, 1200, 1800, 3000],
    c: [2.32, 2.01, 1.72, 1.49, 0.98, 0.62, 0.25],
    kPrime: [0.000731372555547, 6.01308777044e-6],
    start: [2.3191355255, 0.0075057409451],
    residual: 0.0101444060804,
    halfLife: 947.734742442,
  },
];
