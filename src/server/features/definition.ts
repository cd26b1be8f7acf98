import type { Location } from "vscode-languageserver";
import { definitionsOf } from "../../language/navigate/names.js";
import type { Feature } from "../context.js";
import { foundAt } from "../navigate/foundAt.js";
import { openBoundAt, rangeIn } from "../openBound.js";

/** From a name to the line that declares it, in this description or another. */
export const definition: Feature = {
  capabilities: { definitionProvider: true },
  start(context) {
    context.connection.onDefinition(async (params): Promise<Location[]> => {
      const here = openBoundAt(context, params);
      const home = here === null ? null : await foundAt(context, here.bound, here.offset);
      if (home === null) return [];
      const { home: bound, found } = home;
      return definitionsOf(bound, found).map((origin) => ({ uri: bound.parsed.uri, range: rangeIn(bound, origin) }));
    });
  },
};
