import type { Origin } from "../../contract/problem.js";
import type { Bound } from "../../language/bind/bind.js";
import { type FoundName, nameAt } from "../../language/navigate/names.js";
import type { ServerContext } from "../context.js";
import { descriptionAt } from "./descriptions.js";
import { runsElsewhere } from "./runsElsewhere.js";

/** A name at a place, and the description that declares it: another one where the place reads `path:NAME`. */
export interface FoundHome {
  readonly home: Bound;
  readonly found: FoundName;
  /** the word at the place */
  readonly origin: Origin;
}

/** What is named at an offset of a description; null where nothing is. */
export async function foundAt(context: ServerContext, bound: Bound, offset: number): Promise<FoundHome | null> {
  const elsewhere = runsElsewhere(bound).find(({ origin }) => origin.start <= offset && offset <= origin.end);
  if (elsewhere === undefined) {
    const found = nameAt(bound, offset);
    return found === null ? null : { home: bound, found, origin: found.origin };
  }
  const home = await descriptionAt(context, elsewhere.uri);
  const declared = home?.uses.find(({ kind, name, declares }) => kind === "run" && declares && name === elsewhere.name);
  const found = home === null || declared === undefined ? null : nameAt(home, declared.origin.start);
  return home === null || found === null ? null : { home, found, origin: elsewhere.nameOrigin };
}
