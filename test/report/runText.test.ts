import assert from "node:assert/strict";
import { descriptionText } from "../../src/report/descriptionText.js";
import { countWords } from "../../src/report/diagnosticText.js";
import { wrappedText } from "../../src/report/wrappedText.js";
import { diagnostic, findingsWith, inventedRun, refusedFit } from "./invented.js";

describe("report in plain text", () => {
  it("reads as sentences, its tables hold figures only", () => {
    const run = inventedRun(21, { title: "first try" });
    const [description] = findingsWith([{ ...run, fits: [...run.fits, refusedFit(run)] }]).descriptions;
    assert.ok(description !== undefined);
    assert.equal(
      descriptionText(description),
      `runs/peroxide.raterun
=====================

run A — first try
  reaction  2 H2O2 -> 2 H2O + O2
  followed  H2O2 as concentration from column c; readings: all 21 used

  rates
                              v                          dc(H2O2)/dt
    average from 0 s to 50 s  0.0780(20) mmol L^-1 s^-1  -0.1560(40) mmol L^-1 s^-1

  fit 1: order 1 in H2O2, 21 readings from 0 s to 100 s
    k          5.502(73)e-4 s^-1  95 %: 5.356e-4 to 5.648e-4
    half-life  1260(17) s         of H2O2

    conversion     34 %
    variance of k  70 % scatter of the readings (random), 30 % scale of c (common)
    covariance     scaled by the variance of the residuals

    k = 5.502(73)e-4 s^-1, from 21 readings.

  fit 2: order 1 in H2O2, 21 readings from 0 s to 100 s
    No rate constant: all readings are the same, so nothing is seen to react.
`,
    );
  });

  it("counts in English", () => {
    const found = (severity: "error" | "warning" | "information", count: number) =>
      Array.from({ length: count }, () => diagnostic("Words.", null, severity));
    assert.equal(countWords([]), "nothing to mend");
    assert.equal(countWords(found("information", 1)), "1 piece of information");
    assert.equal(
      countWords([...found("information", 2), ...found("error", 1), ...found("warning", 3)]),
      "1 error, 3 warnings, 2 pieces of information",
    );
  });

  it("breaks long sentences between words, and never within one", () => {
    const lines = wrappedText(`${"word ".repeat(50)}${"x".repeat(150)} end`, "  - ");
    assert.ok(lines.slice(0, -2).every((line) => line.length <= 110));
    assert.ok(lines.every((line, i) => line.startsWith(i === 0 ? "  - word" : "    ")));
    assert.ok(lines.includes(`    ${"x".repeat(150)}`));
    assert.equal(lines.map((line) => line.slice(4)).join(" "), `${"word ".repeat(50)}${"x".repeat(150)} end`);
  });
});
