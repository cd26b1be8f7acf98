import type { Block, Description, Run } from "../contract/findings.js";
import { decimate } from "./decimate.js";
import { residualTimes } from "./pictureContent.js";

type Follow = Run["follow"][number];
type Fit = Run["fits"][number];

/** Greatest number of readings that are kept for each outline; a view draws at most so many. */
const most = 600;

/**
 * Findings with no more readings than the eye can tell apart: those that make the outline of the signal and of each
 * fit's residuals. All numbers that were worked out are left as they are. For views: a record or a table wants all.
 */
export function thinCurves(description: Description): Description {
  return { ...description, runs: description.runs.map(thinRun) };
}

function thinRun(run: Run): Run {
  const fits = new Map(run.fits.map((fit) => [fit.id, fit]));
  const follow = run.follow.map((one) => {
    const own = run.fits.filter((fit) => fit.follow === one.id);
    const kept = keptIndices(one, own);
    if (kept === null) return one;
    for (const fit of own) fits.set(fit.id, thinResiduals(one, fit, kept));
    return thinFollow(one, kept);
  });
  return { ...run, follow, fits: run.fits.map((fit) => fits.get(fit.id) ?? fit) };
}

/** Indices of the readings that are kept, ascending; null where all are. */
function keptIndices(follow: Follow, fits: readonly Fit[]): number[] | null {
  const { time, signal } = follow;
  if (time === undefined || signal === undefined || time.values.length <= most) return null;
  const kept = new Set(decimate(time.values, signal.values, most));
  for (const fit of fits) {
    const indices = residualIndices(follow, fit);
    const times = indices.map((index) => time.values[index] ?? null);
    for (const at of decimate(times, fit.residuals?.values ?? [], most)) kept.add(indices[at] as number);
  }
  return [...kept].sort((a, b) => a - b);
}

/** Which reading each residual of a fit belongs to. */
function residualIndices({ time, signal, ...follow }: Follow, fit: Fit): number[] {
  const { window } = fit;
  if (time === undefined || signal === undefined || window === null) return [];
  if (residualTimes({ ...follow, time, signal }, fit).length === 0) return [];
  const [from, to] = window;
  return time.values.flatMap((t, index) =>
    t !== null && signal.values[index] !== null && t >= from.value && t <= to.value ? [index] : [],
  );
}

function thinResiduals(follow: Follow, fit: Fit, kept: readonly number[]): Fit {
  const indices = residualIndices(follow, fit);
  const { residuals } = fit;
  if (residuals === undefined || indices.length === 0) return fit;
  const wanted = new Set(kept);
  const values = residuals.values.filter((_, at) => wanted.has(indices[at] as number));
  return { ...fit, residuals: { ...residuals, values } };
}

function thinFollow(follow: Follow, kept: readonly number[]): Follow {
  const thin = (block: Block): Block => ({ ...block, values: kept.map((index) => block.values[index] ?? null) });
  const { time, signal, concentration, u, lines } = follow;
  return {
    ...follow,
    ...(time === undefined ? {} : { time: thin(time) }),
    ...(signal === undefined ? {} : { signal: thin(signal) }),
    ...(concentration === undefined ? {} : { concentration: thin(concentration) }),
    ...(u === undefined ? {} : { u: thin(u) }),
    ...(lines === undefined ? {} : { lines: kept.map((index) => lines[index] as number) }),
  };
}
