import { problem } from "../contract/problem.js";
import type { Species } from "../study/reaction.js";
import type { FitWish, Follow, Run } from "../study/run.js";
import { curveOf, residualCurve } from "./curves.js";
import type { EndContext } from "./endPoints.js";
import { fitFirstOrder, type UsedReadings } from "./fitFirstOrder.js";
import { emptyFit, type FitFinding, firstOrderIn, type Refusal } from "./fitResult.js";
import { judgeFit } from "./judgeFit.js";
import { type Notes, note } from "./notes.js";
import { isOf, lineIn, type RunInput } from "./runInput.js";
import { resultUnits, shown } from "./shown.js";

/** A fit as findings show it, and the change of the signal over the whole reaction that it found (SI). */
export interface FitOutcome {
  readonly finding: FitFinding;
  readonly change: number | null;
}

/** The fits that a run wants of one signal, in the order of the text. */
export function fitsOf(
  run: Run,
  follow: Follow,
  context: EndContext | null,
  input: RunInput,
  notes: Notes,
): FitOutcome[] {
  return run.fits
    .filter((wish) => isOf(run, follow, wish))
    .map((wish) => {
      const empty = emptyFit(wish, follow, input.place);
      const species = firstOrderIn(wish);
      if (species === null) return without({ ...empty, verdict: "This law is kept; not computed yet." });
      if (context === null) return without({ ...empty, verdict: "No rate constant: there is no signal to fit." });
      return fitOf(wish, species, context, empty, input, notes);
    });
}

function without(finding: FitFinding): FitOutcome {
  return { finding, change: null };
}

function fitOf(
  wish: FitWish,
  species: Species,
  context: EndContext,
  empty: FitFinding,
  input: RunInput,
  notes: Notes,
): FitOutcome {
  const { run, signal, stoichiometry } = context;
  if (run.reaction?.reversible === true) return refuse(run, wish, empty, goesBack, notes);
  const result = fitFirstOrder(context, wish, species.key, input.stopped);
  const started = { ...empty, ...usedFinding(context, result.used) };
  if ("problem" in result) {
    note(notes, wish.id, result.problem);
    return without({ ...started, verdict: "No rate constant: an end of the signal is not known." });
  }
  if ("refused" in result) return refuse(run, wish, started, result.refused, notes);
  const units = resultUnits(run, signal.timeUnit, signal.unit);
  const judged = judgeFit(context, wish, species, result, started, units, notes, input.stopped);
  if ("reason" in judged) return refuse(run, wish, started, judged, notes);
  const { limiting } = stoichiometry;
  if (limiting !== null && limiting !== species.key) {
    note(notes, wish.id, problem("fit-order-not-limiting", { species: species.key, limiting }, lineIn(run, wish)));
  }
  const { estimates, finding } = judged;
  const change = estimates.infinity.value - estimates.start.value;
  if (!input.curves) return { finding, change };
  const curve = curveOf(context, result, estimates);
  return { finding: { ...finding, curve, residuals: residualCurve(context, result) }, change };
}

/** A reaction that goes back relaxes with the sum of both rate constants, which is neither. */
const goesBack: Refusal = {
  stop: "refused",
  reason: "the reaction goes back, so the readings give the sum of both rate constants, which is not split yet",
  remedy: "Write -> in the reaction where the way back does not count.",
};

function usedFinding(
  { signal }: EndContext,
  { time, weights }: UsedReadings,
): Pick<FitFinding, "points" | "weights" | "uKind" | "window"> {
  const first = time[0];
  const last = time[time.length - 1];
  return {
    points: time.length,
    weights: weights === null ? "constant" : "stated",
    uKind: weights === null ? "scaled" : "absolute",
    window:
      first === undefined || last === undefined
        ? null
        : [shown(first, null, signal.timeUnit), shown(last, null, signal.timeUnit)],
  };
}

/** A fit that gives no rate constant says why and what to do, and shows no number. */
function refuse(
  run: Run,
  wish: FitWish,
  started: FitFinding,
  { stop, reason, remedy }: Refusal,
  notes: Notes,
): FitOutcome {
  const fit = `Fit ${wish.id.slice(wish.id.lastIndexOf(" ") + 1)} of ${run.id}`;
  note(notes, wish.id, problem("fit-refused", { fit, reason, remedy }, lineIn(run, wish)));
  return without({ ...started, stop, verdict: `No rate constant: ${reason}. ${remedy}` });
}
