import type { Place, Run } from "../contract/findings.js";
import type { Origin } from "../contract/problem.js";
import { combined } from "../quantity/quantity.js";
import type { EndContext } from "./endPoints.js";
import { shownDifference, shownQuantity } from "./shown.js";

type FollowSource = Run["follow"][number]["sources"][number];

/** What the uncertainty of a signal is made of, as the description states it. */
export function sourcesOf({ run, follow, signal }: EndContext, place: (origin: Origin) => Place): FollowSource[] {
  const fact = run.data?.columns.find(({ name }) => name === follow.column);
  const sources: FollowSource[] = [];
  if (fact?.random && signal.random !== null) {
    sources.push({
      name: `readings of ${follow.column}`,
      kind: "random",
      u: shownQuantity(fact.random.value),
      place: place(fact.random.origin),
    });
  }
  for (const { name } of signal.common) {
    if (name === "blank") continue;
    if (fact?.common)
      sources.push({ name, kind: "common", u: shownQuantity(fact.common.value), place: place(fact.common.origin) });
  }
  const blank = follow.blank?.value;
  const uBlank = blank === undefined ? null : combined(blank.sources);
  if (follow.blank !== null && blank !== undefined && uBlank !== null) {
    sources.push({
      name: "blank",
      kind: "common",
      u: shownDifference(uBlank, blank.unit),
      place: place(follow.blank.origin),
    });
  }
  return sources;
}
