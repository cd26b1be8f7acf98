import assert from "node:assert/strict";
import type { Run } from "../../src/study/run.js";
import { boundText, saidOf } from "../support/checkText.js";

const sample = `ratewright 1
# Iodide-catalysed decomposition of hydrogen peroxide, followed by the gas it gives off
reaction  2 H2O2(aq) -> 2 H2O(l) + O2(g)

run A "0.050 M iodide, 25 °C"
  date         2026-11-03
  volume       50.00 mL within 0.05 mL
  temperature  25.0(1) °C
  taken        H2O2  0.100(2) mol/L
  taken        KI    0.0500 +/- 0.0005 mol/L  as catalyst
  data         "data/a.csv"
    column     t    "time / s"   s
    column     gas  "V / mL"     mL
  follow       O2 as gas volume from gas
    collected  wet at 22.0 °C
    barometer  100.8(1) kPa
    blank      1.2 mL
  rate         from 0 s to 60 s
  rate         at 20 s
  rate         initial
  fit          order 1 in H2O2
    window     5 s to 600 s
    infinity   free

run B like A "0.025 M iodide"
  taken        KI    0.0250 +/- 0.0005 mol/L  as catalyst
  data         "data/b.csv"

series iodide
  across       A, B, "more/*.raterun"
  order        in KI by initial rate
`;

const runOf = (text: string, name: string): Run => {
  const source = boundText(text).study.runs.find(
    (candidate) => candidate.kind === "run" && candidate.run.name === name,
  );
  assert.ok(source?.kind === "run");
  return source.run;
};

const grave = (text: string): string[] =>
  boundText(text)
    .problems.filter(({ severity }) => severity !== "information")
    .map(({ code, origin }) => `${code} “${text.slice(origin.start, origin.end)}”`);

describe("the whole language", () => {
  it("the sample of the language parses without error or warning and means what it says", () => {
    assert.deepEqual(grave(sample), []);
    const b = runOf(sample, "B");
    const [follow] = b.follow;
    assert.equal(follow?.monitor, "gas volume");
    assert.equal(follow?.collected?.value.wet, true);
    assert.equal(follow?.collected?.value.temperature.value, 295.15);
    assert.equal(follow?.barometer?.value.value, 100_800);
    assert.ok(Math.abs((follow?.blank?.value.value ?? 0) - 1.2e-6) < 1e-18);
    assert.deepEqual(
      b.taken.map(({ species, given, role }) => [species.key, given.value, role]),
      [
        ["H2O2", 100, null],
        ["KI", 25, "catalyst"],
      ],
    );
    const { series } = boundText(sample).study;
    assert.deepEqual(
      series.map(({ name, across, orders }) => [
        name,
        across.map(({ kind }) => kind),
        orders.map(({ by, species }) => [species.key, by]),
      ]),
      [["iodide", ["here", "here", "files"], [["KI", "initial rate"]]]],
    );
  });

  it("a file with every kind of line has no error, and each line that is only kept says so", () => {
    const text = `ratewright 1
results in mmol/L, min
species dye is C25H30N3Cl
  absorptivity 8.7(2)e4 L/(mol cm) at 590 nm
  pKa 9.4
species cat
  molar mass 204.2 g/mol
  ion charge 2+
reaction main is dye + OH^- <=> C25H31N3O + Cl^-
  enthalpy -12.5 kJ/mol
reaction scavenge is 2 S2O3^2- + I2 -> S4O6^2- + 2 I^-
  fast
calibration iodine of I2
  standard 10.0 µmol/L reads 0.213, 0.215
  standard 20.0 µmol/L reads 0.430
  quadratic
calibration line of I2
  slope 0.0213(2) L/µmol
  intercept 0.002(1)
operator "bench 2"
run A
  instrument "photometer"
  solvent "water"
  pressure 101.3 kPa
  ionic strength 0.10 mol/L
  head space 25 mL
  purged with N2
  activation energy 52(2) kJ/mol
  volume 50.0 mL
  temperature from T
  taken dye 5.0 mL of 0.50 mmol/L
  taken NaOH 10.0 mL of 4.0 % by mass density 1.04 g/mL
  taken cat 2.0 mg purity 98 % as catalyst
  taken KNO3 0.10 mol/L as inert giving K^+, NO3^-
  data "a.csv"
    delimiter ";"
    decimal comma
    skip 4 lines
    encoding "windows-1252"
    exclude line 17 because "bubble"
    exclude 30 s to 45 s because "stirrer off"
    time zero 3.0(5) s
    column t 1 s
    column T 2 °C
    column A "A 590"
      random 0.002
      common 1 %
  follow dye as absorbance from A
    readability 0.001
    response time 2 s
    blank 0.012(2)
    reading at start 0.87
    reading at infinity 0.021(2)
    calibrated by line
    wavelength 590 nm
    path length 1.000 cm
    stray light 0.1 %
  observed "blue" at 31.2 s, 30.8 s
    after I2 used up
  rate at 20 s using A
  fit order 1 in dye, order 1 in OH^-
    excess OH^-
    reversible K 4.2
    weights stated
    errors correlated
    robust
    start fixed 0.87
    infinity measured
  fit order free in dye using A
    reversible free
  fit saturation in dye
  given rate 1.2e-5 mol/(L s)
  given k 0.62(3) L/(mol s) of dye
run C like A
  taken cat none
  observed "clear" at 1 min 30 s
    after 0.10 mmol of dye consumed
  expect k 0.6 L/(mol s)
  expect half-life 90 s
  expect readings every 10 s to 600 s
  background A
rows of "runs.csv" like A
  named by "run"
  taken NaOH from "c(NaOH) / mol L^-1"
  temperature 25 °C
  observed "blue" from "t / s"
series s "orders"
  across A, C, "more/*.raterun", "other.raterun:B"
  order in OH^- by k
  order in dye by events
  replicates A, C
  arrhenius at 25 °C
  salt effect
  control C
mechanism m "two steps"
  across A, C
  step one is dye + OH^- -> C25H31N3O + Cl^-
    forward 0.62 L/(mol s)
    reverse free per run
  step two is I2 + 2 S2O3^2- -> 2 I^- + S4O6^2-
    forward free in common
`;
    assert.deepEqual(grave(text), []);
    const kept = boundText(text).problems.filter(
      ({ code }) => code === "not-computed-yet" || code === "fit-not-computed",
    );
    assert.ok(kept.length > 25, String(kept.length));
    const a = runOf(text, "A");
    assert.deepEqual(
      a.fits.map(({ lawText }) => lawText),
      ["order 1 in dye, order 1 in OH^-", "order free in dye", "saturation in dye"],
    );
    assert.equal(a.data?.exclusions.length, 2);
    assert.equal(a.data?.timeZero?.value.value, 3);
    assert.deepEqual(
      runOf(text, "C").taken.map(({ species }) => species.key),
      ["dye", "NaOH", "KNO3"],
    );
    const { mechanisms, calibrations, species } = boundText(text).study;
    assert.deepEqual(
      mechanisms[0]?.steps.map(({ forward, reverse }) => [forward?.kind, reverse?.kind ?? null]),
      [
        ["value", "free"],
        ["free", null],
      ],
    );
    assert.deepEqual(
      calibrations.map(({ name, standards, quadratic }) => [name, standards.length, quadratic]),
      [
        ["iodine", 2, true],
        ["line", 0, false],
      ],
    );
    assert.deepEqual(
      species.map(({ key, charge, pKa, molarMass }) => [key, charge, pKa, molarMass?.value.value ?? null]),
      [
        ["dye", null, 9.4, null],
        ["cat", 2, null, 0.2042],
      ],
    );
  });

  it("fit laws are told apart: together, one after the other, side by side", () => {
    const base = "reaction A -> B\nspecies A\nspecies B\nspecies C\nreaction B -> C\nrun X\n  fit ";
    const laws = [
      "order 1 in A, then order 1 in B",
      "order 1 in A beside order 1 in B",
      "order 0.5 in A, order 1 in B",
    ];
    for (const law of laws) {
      const [fit] = runOf(`${base}${law}\n`, "X").fits;
      assert.equal(fit?.lawText, law);
    }
    assert.deepEqual(
      laws.map((law) => {
        const bound = runOf(`${base}${law}\n`, "X").fits[0]?.law;
        return bound?.kind === "orders" ? bound.joined : null;
      }),
      ["then", "beside", "and"],
    );
  });

  it("a bare blank joins the one inherited follow line: blank-ambiguous where there are several, or none", () => {
    const two = `reaction 2 H2O2 -> 2 H2O + O2
run A
  data "a.csv"
    column c 1 mol/L
    column d 2 mol/L
  follow H2O2 as concentration from c
  rate initial
run B like A
  blank 0.001 mol/L
`;
    assert.equal(runOf(two, "B").follow[0]?.blank?.value.value, 1);
    assert.equal(runOf(two, "A").follow[0]?.blank, null);
    assert.deepEqual(grave(two), []);
    const several = two.replace("  rate", "  follow O2 as concentration from d\n  rate");
    assert.deepEqual(grave(several), ["blank-ambiguous “blank 0.001 mol/L”"]);
    const none = "run A\n  blank 0.001 mol/L\n";
    assert.deepEqual(grave(none), ["blank-ambiguous “blank 0.001 mol/L”"]);
  });

  it("a volume needs the strength of its stock, and only a volume has one: taken-volume-of-what, stock-without-volume", () => {
    const text = (taken: string): string =>
      `reaction 2 H2O2 -> 2 H2O + O2\nrun A\n  volume 50 mL\n  taken H2O2 ${taken}\n`;
    assert.deepEqual(grave(text("5.0 mL of 30 % by mass density 1.11 g/mL")), []);
    assert.deepEqual(grave(text("5.0 mL of 0.5 mol/L")), []);
    assert.deepEqual(grave(text("5.0 mL")), ["taken-volume-of-what “5.0 mL”"]);
    assert.deepEqual(grave(text("5.0 mmol of 0.5 mol/L")), ["stock-without-volume “0.5 mol/L”"]);
    assert.deepEqual(grave(text("5.0 mL of 30 % by mass")), ["stock-needs-density “30 % by mass”"]);
    assert.deepEqual(grave(text("5.0 mL of 30 %")), ["share-of-what “%”"]);
    assert.deepEqual(grave(text("5.0 mL of 30 % by weight")), ["share-basis “by weight”"]);
  });

  it("results come out in one unit of concentration and one of time: results-units", () => {
    assert.deepEqual(grave("results in min, mmol/L\n"), []);
    assert.deepEqual(grave("results in mmol/L, mL\n"), ["results-units “mmol/L, mL”"]);
    assert.deepEqual(grave("results in mmol/L\n"), ["results-units “mmol/L”"]);
  });

  it("a value from a header stands in a table of runs only: header-outside-table", () => {
    const text = 'run A\n  taken KI from "c / mol/L"\nrows of "r.csv" like A\n  taken KI from "c / mol/L"\n';
    assert.deepEqual(grave(text), ['header-outside-table “from "c / mol/L"”']);
  });

  it("names of runs, columns and calibrations must be there, wherever they are used", () => {
    const text = `reaction 2 H2O2 -> 2 H2O + O2
calibration iodine of I2
run A
  data "a.csv"
    column t 1 s
    column c 2 mol/L
  follow H2O2 as concentration from c
    calibrated by iodin
  rate at 5 s using d
series s
  across A, B
  control Q
`;
    assert.deepEqual(
      saidOf(text)
        .filter((said) => said.startsWith("name-unknown"))
        .map((said) => /“(.+?)”/.exec(said)?.[1]),
      ["iodin", "d", "B", "Q"],
    );
  });

  it("a run line behind a series belongs to nothing", () => {
    assert.deepEqual(grave("run A\nseries s\n  volume 5 mL\n"), ["line-misplaced “volume”"]);
  });
});
