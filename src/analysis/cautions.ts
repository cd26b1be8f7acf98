import type { Run as RunFinding } from "../contract/findings.js";
import type { Run } from "../study/run.js";
import { gasDangers, givenOff } from "./gasCautions.js";
import { pairDangers } from "./pairCautions.js";
import type { Stoichiometry } from "./stoichiometry.js";
import { substanceDangers } from "./substanceCautions.js";
import { substancesOf } from "./substancesOf.js";

/** What every list of cautions ends with. */
const closing = {
  code: "local-rules",
  text:
    "These cautions are general knowledge, not complete, and nothing listed never means safe. Local rules, the label " +
    "and safety data sheet of the substance in hand, and an assessment by a person licensed to make it go first.",
};

/**
 * What to watch when this run is done: gas given off and its dangers, dangerous substances, dangerous pairs, each in the
 * order of `substancesOf`. A list that is not empty ends with a caution of its own, `local-rules`, of no species. No caution
 * can be switched off. The tables are chemistry/handbook's, with their sources; what they lack is not warned of.
 */
export function cautionsOf(run: Run, amounts: Stoichiometry): RunFinding["cautions"] {
  const all = substancesOf(run);
  const found = [...givenOff(run, amounts, all), ...gasDangers(all), ...substanceDangers(all), ...pairDangers(all)];
  return found.length === 0 ? [] : [...found, { ...closing, species: [] }];
}
