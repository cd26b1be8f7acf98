import { DocumentHighlightKind } from "vscode-languageserver";
import { nameAt } from "../../language/navigate/names.js";
import { abortSignalOf } from "../abortSignal.js";
import type { Feature } from "../context.js";
import { placesElsewhere } from "../navigate/everywhere.js";
import { foundAt } from "../navigate/foundAt.js";
import { openBoundAt, rangeIn } from "../openBound.js";

/** All places of a name, of a run also in other descriptions; those in the text at hand are marked as one rests on it. */
export const references: Feature = {
  capabilities: { referencesProvider: true, documentHighlightProvider: true },
  start(context) {
    const { connection } = context;
    connection.onReferences(async (params, token) => {
      const here = openBoundAt(context, params);
      const home = here === null ? null : await foundAt(context, here.bound, here.offset);
      if (home === null) return [];
      const { uri } = home.home.parsed;
      const own = home.found.occurrences.filter(({ declares }) => params.context.includeDeclaration || !declares);
      const others = await placesElsewhere(context, home, abortSignalOf(token));
      return [
        ...own.map(({ origin }) => ({ uri, range: rangeIn(home.home, origin) })),
        ...others.map(({ bound, origin }) => ({ uri: bound.parsed.uri, range: rangeIn(bound, origin) })),
      ];
    });
    connection.onDocumentHighlight((params) => {
      const here = openBoundAt(context, params);
      const found = here === null ? null : nameAt(here.bound, here.offset);
      if (here === null || found === null) return [];
      return found.occurrences.map(({ origin, declares }) => ({
        range: rangeIn(here.bound, origin),
        kind: declares ? DocumentHighlightKind.Write : DocumentHighlightKind.Read,
      }));
    });
  },
};
