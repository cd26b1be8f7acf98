import { problem } from "../contract/problem.js";
import type { FitWish } from "../study/run.js";
import { type EndContext, stoichiometricInfinity, stoichiometricStart } from "./endPoints.js";
import type { Estimates } from "./estimates.js";
import type { FirstOrderFit } from "./fitFirstOrder.js";
import { type Notes, note } from "./notes.js";
import { type Estimate, rootOfSquares, totalUncertainty } from "./parameter.js";
import { lineIn } from "./runInput.js";
import { shown } from "./shown.js";
import { standardUncertainty, type Uncertain } from "./stoichiometry.js";

/** Share of the whole change below which a difference is no more than a blank or a slow mixing may do. */
const worthAWord = 0.1;

/**
 * Says where a start or an infinity that was fitted, measured or stated is not what was taken gives: by more than three
 * standard uncertainties of both and a tenth of the whole change. A unit or a factor that is wrong shows here.
 */
export function sayDifferences(
  context: EndContext,
  wish: FitWish,
  of: string,
  { start, infinity }: FirstOrderFit,
  estimates: Estimates,
  notes: Notes,
): void {
  const byAmounts = { start: stoichiometricStart(context), infinity: stoichiometricInfinity(context, of) };
  const byHand = {
    start: start.kind !== "fixed" || start.raw !== undefined,
    infinity: infinity.kind !== "fixed" || infinity.raw !== undefined,
  };
  const change = Math.abs(estimates.infinity.value - estimates.start.value);
  for (const end of ["start", "infinity"] as const) {
    const expected = byAmounts[end];
    const found = estimates[end];
    if (expected === null || !byHand[end] || found.bound !== null || !differs(found, expected, change)) continue;
    const { unit } = context.signal;
    const args = {
      end,
      found: shown(found.value, totalUncertainty(found), unit).text,
      expected: shown(expected.value, standardUncertainty(expected), unit).text,
    };
    note(notes, wish.id, problem("fit-end-differs", args, lineIn(context.run, wish)));
  }
}

function differs(found: Estimate, expected: Uncertain, change: number): boolean {
  const difference = Math.abs(found.value - expected.value);
  const u = rootOfSquares([totalUncertainty(found) ?? 0, standardUncertainty(expected) ?? 0]);
  return difference > 3 * u && difference > worthAWord * change;
}
