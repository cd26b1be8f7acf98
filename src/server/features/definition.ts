import type { Location } from "vscode-languageserver";
import type { Bound } from "../../language/bind/bind.js";
import { definitionsOf } from "../../language/navigate/names.js";
import type { Feature, ServerContext } from "../context.js";
import { columnCells, locationOf } from "../navigate/columnCells.js";
import { foundAt } from "../navigate/foundAt.js";
import { openBoundAt, rangeIn } from "../openBound.js";

/** From a name to the line that declares it, in this description or another; from a column line into the data file. */
export const definition: Feature = {
  capabilities: { definitionProvider: true },
  start(context) {
    context.connection.onDefinition(async (params): Promise<Location[]> => {
      const here = openBoundAt(context, params);
      const cells = here === null ? [] : await cellsAt(context, here.bound, here.offset);
      if (cells.length > 0) return cells;
      const home = here === null ? null : await foundAt(context, here.bound, here.offset);
      if (home === null) return [];
      const { home: bound, found } = home;
      return definitionsOf(bound, found).map((origin) => ({ uri: bound.parsed.uri, range: rangeIn(bound, origin) }));
    });
  },
};

/** Header cells that a column line leads to, by the name it declares, its header or its number; each place once. */
async function cellsAt(context: ServerContext, bound: Bound, offset: number): Promise<Location[]> {
  const cells = await columnCells(context, bound, (_run, { by, origin }) => {
    return origin.start <= offset && offset <= Math.max(by.origin.end, origin.start);
  });
  const places = new Map(cells.map((cell) => [JSON.stringify(locationOf(cell)), locationOf(cell)]));
  return [...places.values()];
}
