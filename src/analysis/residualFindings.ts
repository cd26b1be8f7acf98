import { log } from "../numerics/elementary.js";
import { durbinWatson, lagOneCorrelation, runsTest } from "../numerics/residualTests.js";
import type { Unit } from "../quantity/unit.js";
import type { FirstOrderFit } from "./fitFirstOrder.js";
import type { FitFinding } from "./fitResult.js";
import { shown } from "./shown.js";

type ResidualFindings = Pick<FitFinding, "residual" | "reducedChiSquare" | "aicc" | "tests" | "correlation">;

/** What the residuals of a fit say: how large they are, and whether they look like chance. */
export function residualFindings({ fit, used }: FirstOrderFit, unit: Unit): ResidualFindings {
  const { weights } = used;
  const { degreesOfFreedom: left } = fit;
  // A measured infinity stands behind the readings and is none of their sequence.
  const residuals = fit.residuals.subarray(0, used.value.length);
  const squares = residuals.reduce((sum, residual) => sum + residual * residual, 0);
  const standardised = weights === null ? residuals : residuals.map((r, i) => r * Math.sqrt(weights[i] ?? 1));
  // Residuals of the size of rounding say nothing of the readings.
  const size = used.value.reduce((sum, reading) => sum + reading * reading, 0);
  const isRounding = squares <= 1e-20 * size;
  return {
    residual: left > 0 ? shown(Math.sqrt(squares / left), null, unit) : null,
    reducedChiSquare: weights === null || left <= 0 ? null : fit.chiSquare / left,
    aicc: correctedAkaike(fit.chiSquare, fit.residuals.length, fit.free.length, weights !== null),
    tests: isRounding ? [] : residualTests(standardised),
    correlation: isRounding ? null : lagOneCorrelation(standardised),
  };
}

/**
 * Akaike's criterion with the correction for few readings (C. M. Hurvich and C.-L. Tsai, Biometrika 76 (1989) 297-307);
 * where the scatter is estimated it counts as a parameter. Null where there are too few readings, or no scatter at all.
 */
function correctedAkaike(chiSquare: number, n: number, free: number, absolute: boolean): number | null {
  const count = absolute ? free : free + 1;
  const left = n - count - 1;
  if (left <= 0 || (!absolute && !(chiSquare > 0))) return null;
  const misfit = absolute ? chiSquare : n * log(chiSquare / n);
  return misfit + 2 * count + (2 * count * (count + 1)) / left;
}

function residualTests(residuals: Float64Array): FitFinding["tests"] {
  const tests: FitFinding["tests"] = [];
  const runs = runsTest(residuals);
  if (runs !== null) {
    const text = `${runs.runs} runs of one sign, ${runs.expected.toFixed(1)} expected; p = ${runs.p.toPrecision(2)}`;
    tests.push({ name: "runs test", statistic: runs.z, p: runs.p, text });
  }
  const watson = durbinWatson(residuals);
  if (watson !== null) {
    const text = `${watson.toFixed(2)}; near 2 where neighbouring residuals are independent`;
    tests.push({ name: "Durbin-Watson", statistic: watson, p: null, text });
  }
  return tests;
}
