import type { Origin } from "../../contract/problem.js";
import type { Bound } from "../../language/bind/bind.js";
import type { ServerContext } from "../context.js";
import { allDescriptions } from "./descriptions.js";
import type { FoundHome } from "./foundAt.js";
import { runsElsewhere } from "./runsElsewhere.js";

/** A place of a name in some description. */
export interface PlaceElsewhere {
  readonly bound: Bound;
  readonly origin: Origin;
}

/** Where other descriptions name a run of this one; nothing for other kinds, which belong to their description. */
export async function placesElsewhere(
  context: ServerContext,
  { home, found }: FoundHome,
  signal: AbortSignal,
): Promise<PlaceElsewhere[]> {
  if (found.kind !== "run") return [];
  const { uri } = home.parsed;
  const all = await allDescriptions(context, signal);
  return all.flatMap((bound) =>
    runsElsewhere(bound)
      .filter((run) => run.uri === uri && run.name === found.name)
      .map(({ nameOrigin }) => ({ bound, origin: nameOrigin })),
  );
}
