/**
 * The one result: hover, preview, tables, JSON and record are views of it and compute nothing.
 * What cannot be computed is `null`, never `NaN`. Keys may be added; none is renamed.
 */
export interface Findings {
  ratewright: string;
  language: 1;
  method: string;
  descriptions: Description[];
}
export interface Place {
  line: number;
  column: number;
  endLine: number;
  endColumn: number;
} // from 1; columns in UTF-16 units
export interface Q {
  value: number;
  u: number | null;
  unit: string;
  text: string;
} // u one standard uncertainty; value is never rounded; text is ready to show: "1.234(5) s^-1"
export interface P extends Q {
  uRandom: number | null;
  uCommon: number | null;
  uCorrelated: number | null;
  interval95: [number, number] | null;
  by: "t" | "profile" | null;
  fixed: boolean;
  role: "rate constant" | "order" | "start" | "infinity" | "other";
  bound: "low" | "high" | null;
}
export interface Block {
  unit: string;
  values: (number | null)[];
}
export interface Diagnostic extends Place {
  code: string;
  severity: "error" | "warning" | "information";
  message: string;
  item: string | null;
  /** ways to put it right, likeliest first */
  mends: { title: string; edits: (Place & { text: string })[] }[];
}

export interface Description {
  path: string;
  meaning: string /* SHA-256 of the meaning, not the spaces */;
  diagnostics: Diagnostic[];
  data: { path: string; sha256: string; rows: number; columns: string[] }[];
  runs: Run[];
  series: Series[];
  mechanisms: Mechanism[];
}

export interface Item {
  id: string /* stable: "run A/fit 1" */;
  place: Place;
  problems: string[] /* codes of the diagnostics that belong to it */;
}
export interface Run extends Item {
  name: string;
  title: string | null;
  equation: string;
  /** the line of the equation */
  equationPlace?: Place;
  conditions: { [name: string]: Q };
  taken: {
    species: string;
    given: Q;
    /** the strength of the stock a volume was taken of, ready to show; null where it was none */
    stock: string | null;
    concentration: Q | null;
    limiting: boolean;
    /** the line that says so, in this run or in the one it is like */
    place?: Place;
  }[];
  /** the line of each condition, by its name */
  conditionPlaces?: { [name: string]: Place };
  follow: (Item & {
    species: string;
    monitor: string;
    column: string;
    /** name of the column that is the time; null where there is none */
    timeColumn: string | null;
    points: number;
    used: number;
    /** what else the description says of the signal, ready to show: `["blank", "1.20(10) mL"]`, `["left out", "line 17: bubble"]` */
    details: { name: string; text: string }[];
    /** what the uncertainty is made of, and the line that states it */
    sources: { name: string; kind: "common" | "random"; u: Q; place?: Place }[];
    signal?: Block;
    time?: Block;
    concentration?: Block;
    u?: Block;
    /** line of the data file that each reading stands on, from 1 */
    lines?: number[];
    /** readings that the description leaves out, and why; `places` are its lines that say so */
    leftOut?: { time: Block; signal: Block; lines: number[]; why: string[]; places: Place[] };
  })[]; // curves
  rates: (Item & {
    kind: "average" | "instantaneous" | "initial" | "event";
    from: Q | null;
    to: Q | null;
    at: Q | null;
    rate: Q | null; // v = (1/nu) dc/dt
    species: { name: string; rate: Q } | null; // signed
    signal: Q | null;
    mark: { time: [number, number]; signal: [number, number] } | null;
  })[]; // the chord or tangent to draw
  fits: (Item & {
    law: string;
    orders: { species: string; value: number; u: number | null; fixed: boolean }[];
    follow: string;
    on: "signal" | "concentration";
    weights: string;
    uKind: "absolute" | "scaled";
    degreesOfFreedom: number;
    parameters: { [name: string]: P } /* "k", "start", "infinity", "order" … */;
    kPrime: P | null;
    covariance: { names: string[]; matrix: number[][] } | null;
    budget: { source: string; kind: "common" | "random"; share: number }[];
    halfLife: (Q & { species: string }) | null;
    window: [Q, Q] | null;
    points: number;
    residual: Q | null;
    reducedChiSquare: number | null;
    conversion: number | null;
    aicc: number | null;
    tests: { name: string; statistic: number; p: number | null; text: string }[];
    condition: number | null;
    correlation: number | null /* lag 1 of the residuals */;
    iterations: number;
    stop: "converged" | "limit" | "singular" | "bound" | "refused";
    verdict: string;
    curve?: { time: Block; signal: Block; low: Block; high: Block };
    residuals?: Block;
  })[];
  comparisons: {
    follow: string;
    fits: string[];
    weights: number[];
    decision: "decided" | "favoured" | "the data cannot tell";
    text: string;
  }[];
  suitability: {
    monitor: string;
    change: Q | null;
    readability: Q | null;
    verdict: "clear" | "weak" | "blind" | "unknown";
    reason: string;
  }[];
  cautions: { code: string; text: string; species: string[] }[];
}
export interface Series extends Item {
  name: string;
  orders: {
    species: string;
    order: P;
    from: "initial rate" | "k" | "event" | "joint fit";
    runs: string[];
    rateConstant: P | null;
  }[];
  points?: { run: string; x: Q; y: Q }[];
  line?: { x: Block; y: Block; low: Block; high: Block };
  temperature: {
    activationEnergy: P;
    preExponential: P;
    enthalpy: P;
    entropy: P;
    gibbs: P;
    lnK: P;
    at: Q;
    standardConcentration: Q;
    covariance: { names: string[]; matrix: number[][] };
  } | null;
  replicates: { k: P; between: Q | null; birge: number } | null;
  verdict: string;
}
export interface Mechanism extends Item {
  name: string;
  parameters: { [name: string]: P };
  residual: Q | null;
  verdict: string;
}
