import { count, list, nullable, numeric, object, oneOf, optional, sha256, text, truth, type ValueOf } from "./shape.js";

const what = text("what the line is about, in words, different on every line of the record");
const id = text("name of the item; the lines of the description are found by it");

const number = {
  text: text("the quantity as a person reads it, rounded to two digits of its uncertainty"),
  value: numeric("down to the fourth digit of u; ten significant digits where u is null"),
  u: nullable(numeric("one standard uncertainty, four significant digits; null where none is known")),
  unit: text("ASCII style of the SI Brochure: mol L^-1 s^-1"),
};
const quantityFields = { what, ...number };
const quantity = object("a quantity", quantityFields);

const parameterFields = {
  what,
  name: text("k, start, infinity, order …"),
  ...number,
  uRandom: optional(numeric("part of u from scatter")),
  uCommon: optional(numeric("part of u from causes that all readings share")),
  uCorrelated: optional(numeric("u if neighbouring readings are taken to depend on each other")),
  interval95: optional(list("ends of the 95 % interval", numeric("in the unit of the parameter"))),
  by: optional(oneOf("how the interval was found", "t", "profile")),
  fixed: optional(truth("true where it was stated, not fitted")),
  bound: optional(oneOf("the bound it lies on", "low", "high")),
};
const parameter = object("a parameter; what does not apply to it is left out", parameterFields);

const covariance = object("covariance of the parameters that were fitted", {
  what,
  with: list("the parameters of rows and columns", text("a name")),
  rows: list(
    "the matrix, in the units of both parameters",
    list("a row", numeric("down to the fourth digit of the product of both u")),
  ),
});

const follow = object("a followed signal", {
  id,
  species: text("the species"),
  monitor: text("how it was followed"),
  column: text("the column of the signal"),
  timeColumn: nullable(text("the column of the time")),
  readings: object("how many readings there are", {
    what,
    points: count("readings in the column"),
    used: count("readings used"),
  }),
  sources: list(
    "what the uncertainty is made of",
    object("a cause", { ...quantityFields, kind: oneOf("whether all readings share it", "common", "random") }),
  ),
});

const rate = object("a rate", {
  id,
  kind: oneOf("which rate", "average", "instantaneous", "initial", "event"),
  from: nullable(quantity),
  to: nullable(quantity),
  at: nullable(quantity),
  rate: nullable(quantity),
  species: nullable(object("rate of change of a species, signed", { ...quantityFields, name: text("the species") })),
  signal: nullable(quantity),
});

const fit = object("a fit of a rate law", {
  id,
  law: text("the law, in words"),
  orders: list(
    "the orders of the law",
    object("an order", {
      what,
      species: text("the species"),
      value: numeric("the order"),
      u: nullable(numeric("one standard uncertainty")),
      fixed: truth("whether it was stated"),
    }),
  ),
  follow: text("the followed signal"),
  on: oneOf("what was fitted", "signal", "concentration"),
  weights: text("how the readings were weighed"),
  uKind: oneOf("whether uncertainties follow from stated ones or from the scatter", "absolute", "scaled"),
  stop: oneOf("how the fit ended", "converged", "limit", "singular", "bound", "refused"),
  window: nullable(
    object("the span of time used", {
      what,
      from: numeric("its begin"),
      to: numeric("its end"),
      unit: text("of both"),
    }),
  ),
  readings: object("how many readings were fitted", {
    what,
    points: count("readings fitted"),
    degreesOfFreedom: count("readings less parameters"),
  }),
  parameters: list("the parameters; none where the fit is refused", parameter),
  kPrime: nullable(object("|ν| k, the rate constant of the species", quantityFields)),
  halfLife: nullable(object("half-life", { ...quantityFields, species: text("the species") })),
  covariance: nullable(covariance),
  budget: object("what the variance of the rate constant is made of, one entry a cause in each list", {
    what,
    sources: list("the causes", text("a cause")),
    kinds: list("whether all readings share them", oneOf("kind", "common", "random")),
    shares: list("their shares", numeric("four decimals")),
  }),
  agreement: object("how well law and readings agree; what was not computed is left out", {
    what,
    residual: optional(numeric("standard deviation of the residuals, six significant digits")),
    unit: optional(text("of the residual")),
    reducedChiSquare: optional(numeric("six significant digits")),
    conversion: optional(numeric("share of the species used up, four decimals")),
    aicc: optional(numeric("corrected information criterion, four decimals")),
    condition: optional(numeric("condition number, six significant digits")),
    correlation: optional(numeric("of neighbouring residuals, four decimals")),
    tests: list("tests of the residuals", text("name of a test")),
    statistics: list("their statistics", numeric("four decimals")),
    p: list("their p values", nullable(numeric("four decimals"))),
  }),
});

const run = object("a run", {
  id,
  title: nullable(text("its title")),
  equation: text("the reaction"),
  taken: list(
    "what was taken, and behind each what it makes at the start",
    object("an amount taken, or a concentration at the start", {
      ...quantityFields,
      species: text("the species"),
      stock: optional(text("strength of the stock it was taken of")),
      limiting: optional(truth("true where it runs out first")),
      start: optional(truth("true for a concentration at the start")),
    }),
  ),
  conditions: list("the conditions", object("a condition", { ...quantityFields, name: text("volume, temperature …") })),
  follow: list("the followed signals", follow),
  rates: list("the rates", rate),
  fits: list("the fits", fit),
  comparisons: list(
    "laws compared",
    object("a comparison", {
      what,
      fits: list("the fits", text("its name")),
      weights: list("their weights of evidence", numeric("four decimals")),
      decision: oneOf("what follows", "decided", "favoured", "the data cannot tell"),
    }),
  ),
  suitability: list(
    "how well the monitors suit",
    object("a monitor", {
      what,
      monitor: text("the monitor"),
      verdict: oneOf("whether it sees the reaction", "clear", "weak", "blind", "unknown"),
    }),
  ),
  cautions: list(
    "cautions",
    object("a caution", { what, code: text("its code"), species: list("the species", text("a species")) }),
  ),
});

const series = object("a series of runs", {
  id,
  orders: list(
    "orders found",
    object("an order", {
      ...parameterFields,
      species: text("the species"),
      from: oneOf("what it follows from", "initial rate", "k", "event", "joint fit"),
      runs: list("the runs", text("a run")),
    }),
  ),
  rateConstants: list("rate constants of the orders", parameter),
  temperature: list("what follows from the temperatures", parameter),
  temperatureCovariance: nullable(covariance),
  replicates: nullable(parameter),
});

const mechanism = object("a mechanism", {
  id,
  parameters: list("its parameters", parameter),
  residual: nullable(quantity),
});

/** Number of this form of record. A record of another form is not read. */
export const recordForm = 1;

/** Everything a record holds, in the order of its lines. */
export const recordShape = object("Record of a run description, written by ratewright record", {
  raterecord: oneOf("form of the record", recordForm),
  description: text("file name of the description"),
  ratewright: text("version of the program"),
  language: count("version of the language"),
  method: text("version of the way numbers are computed"),
  data: list(
    "the data files",
    object("a data file", {
      what,
      path: text("as seen from the description"),
      rows: count("rows of readings"),
      sha256: sha256("SHA-256 of its bytes"),
    }),
  ),
  diagnostics: list(
    "what is to be mended or known",
    object("a diagnostic", {
      what,
      severity: oneOf("how grave", "error", "warning", "information"),
      code: text("its code"),
      item: nullable(text("the item it belongs to")),
      times: count("how often it stands"),
    }),
  ),
  meaning: sha256("SHA-256 of what the description means; comments and spaces play no part"),
  runs: list("the runs", run),
  series: list("the series", series),
  mechanisms: list("the mechanisms", mechanism),
});

/** A record as plain data. */
export type RunRecord = ValueOf<typeof recordShape>;
export type RecordedRun = RunRecord["runs"][number];
export type RecordedFit = RecordedRun["fits"][number];
export type RecordedRate = RecordedRun["rates"][number];
export type RecordedFollow = RecordedRun["follow"][number];
export type RecordedSeries = RunRecord["series"][number];
export type RecordedMechanism = RunRecord["mechanisms"][number];
export type RecordedQuantity = ValueOf<typeof quantity>;
export type RecordedParameter = ValueOf<typeof parameter>;
export type RecordedCovariance = ValueOf<typeof covariance>;
