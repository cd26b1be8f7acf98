import type { Run as RunFinding } from "../contract/findings.js";
import type { Run } from "../study/run.js";
import type { Stoichiometry } from "./stoichiometry.js";

/** What to watch when this run is done: gas given off, what was taken. Defers to local rules and licensed practice. */
export function cautionsOf(_run: Run, _amounts: Stoichiometry): RunFinding["cautions"] {
  return [];
}
