import type { Diagnostic, Findings, P, Q, Run } from "../../src/contract/findings.js";

/** Findings for the tests of pictures and pages; every figure in them is invented. */
const place = { line: 7, column: 3, endLine: 7, endColumn: 20 };

export function quantity(value: number, unit: string, text = `${value} ${unit}`): Q {
  return { value, u: null, unit, text };
}

function parameter(value: number, u: number, unit: string, text: string): P {
  return {
    ...quantity(value, unit, text),
    u,
    uRandom: u,
    uCommon: null,
    uCorrelated: null,
    interval95: [value - 2 * u, value + 2 * u],
    by: "t",
    fixed: false,
    role: "rate constant",
    bound: null,
  };
}

/** Readings that fall from 10 towards 0 mmol/L, `count` of them over 100 s. */
export function inventedRun(count = 21, changes: Partial<Run> = {}): Run {
  const time = Array.from({ length: count }, (_, i) => (100 * i) / (count - 1));
  const course = (t: number): number => 10 * Math.exp(-0.03 * t);
  const signal = time.map((t, i) => course(t) + (i % 2 === 0 ? 0.1 : -0.1));
  const block = (values: number[], unit = "mmol L^-1") => ({ unit, values });
  return {
    id: "run A",
    place,
    problems: [],
    name: "A",
    title: null,
    equation: "2 H2O2 -> 2 H2O + O2",
    conditions: {},
    taken: [],
    follow: [
      {
        id: "run A/follow c",
        place,
        problems: [],
        species: "H2O2",
        monitor: "concentration",
        column: "c",
        timeColumn: "t",
        details: [],
        points: count,
        used: count,
        sources: [],
        time: block(time, "s"),
        signal: block(signal),
      },
    ],
    rates: [
      {
        id: "run A/rate 1",
        place,
        problems: [],
        kind: "average",
        from: quantity(0, "s"),
        to: quantity(50, "s"),
        at: null,
        rate: quantity(0.078, "mmol L^-1 s^-1", "0.0780(20) mmol L^-1 s^-1"),
        species: { name: "H2O2", rate: quantity(-0.156, "mmol L^-1 s^-1", "-0.1560(40) mmol L^-1 s^-1") },
        signal: quantity(-0.156, "mmol L^-1 s^-1", "-0.1560(40) mmol L^-1 s^-1"),
        mark: { time: [0, 50], signal: [10, 2.2] },
      },
    ],
    fits: [inventedFit(1, time, signal, course)],
    comparisons: [],
    suitability: [],
    cautions: [],
    ...changes,
  };
}

function inventedFit(
  number: number,
  time: readonly number[],
  signal: readonly number[],
  course: (t: number) => number,
): Run["fits"][number] {
  const along = Array.from({ length: 121 }, (_, i) => (100 * i) / 120);
  const curve = along.map(course);
  const block = (values: number[], unit = "mmol L^-1") => ({ unit, values });
  return {
    id: `run A/fit ${number}`,
    place,
    problems: [],
    law: "order 1 in H2O2",
    orders: [{ species: "H2O2", value: 1, u: null, fixed: true }],
    follow: "run A/follow c",
    on: "signal",
    weights: "constant",
    uKind: "scaled",
    degreesOfFreedom: time.length - 2,
    parameters: { k: parameter(5.502e-4, 7.3e-6, "s^-1", "5.502(73)e-4 s^-1") },
    kPrime: null,
    covariance: null,
    budget: [
      { source: "scatter of the readings", kind: "random", share: 0.7 },
      { source: "scale of c", kind: "common", share: 0.3 },
    ],
    halfLife: { ...quantity(1260, "s", "1260(17) s"), species: "H2O2" },
    window: [quantity(0, "s"), quantity(100, "s")],
    points: time.length,
    residual: null,
    reducedChiSquare: null,
    conversion: 0.342,
    aicc: null,
    tests: [],
    condition: null,
    correlation: null,
    iterations: 5,
    stop: "converged",
    verdict: "k = 5.502(73)e-4 s^-1, from 21 readings.",
    curve: {
      time: block(along, "s"),
      signal: block(curve),
      low: block(curve.map((c) => c - 0.2)),
      high: block(curve.map((c) => c + 0.2)),
    },
    residuals: block(signal.map((reading, i) => reading - course(time[i] ?? 0))),
  };
}

export function refusedFit(run: Run): Run["fits"][number] {
  const { curve: _curve, residuals: _residuals, ...fit } = run.fits[0] ?? inventedFit(1, [], [], () => 0);
  const verdict = "No rate constant: all readings are the same, so nothing is seen to react.";
  return { ...fit, id: "run A/fit 2", parameters: {}, halfLife: null, budget: [], stop: "refused", verdict };
}

export function diagnostic(
  message: string,
  item: string | null,
  severity: Diagnostic["severity"] = "warning",
): Diagnostic {
  return { ...place, code: "fit-few-half-lives", severity, message, item, mends: [] };
}

export function findingsWith(runs: Run[], diagnostics: Diagnostic[] = [], path = "runs/peroxide.raterun"): Findings {
  const data = [{ path: "peroxide.csv", sha256: "0".repeat(64), rows: 21, columns: ["t / s", "c / mmol/L"] }];
  const description = { path, meaning: "f".repeat(64), diagnostics, data, runs, series: [], mechanisms: [] };
  return { ratewright: "0.0.0", language: 1, method: "1", descriptions: [description] };
}

/** Texts that try to leave the place they are put in. */
export const hostileTexts: readonly string[] = [
  "<script>alert(1)</script>",
  "</title></svg><img src=x onerror=alert(1)>",
  `" onmouseover="alert(1)`,
  "' onfocus='alert(1)",
  "](javascript:alert(1))",
  "![x](https://example.org/x.png)",
  "[x]: javascript:alert(1)",
  "a | b\n# head\n- item",
  "`code` **bold** _slant_ ~~gone~~",
  "$(alert) &lt;b&gt; &#x3C;b>",
  "https://example.org www.example.org a@example.org",
  "<!-- -->]]>",
  "a\u0000b\u001b[31m\u202egnp.exe\ud800",
];
