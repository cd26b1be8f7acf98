import { type Disposable, HoverRequest } from "vscode-languageserver";
import { URI } from "vscode-uri";
import { dataLocations } from "../../workspace/loadFiles.js";
import type { Feature, ServerContext } from "../context.js";

/**
 * Asks the editor for hovers in the data files of open descriptions too, whatever language they are in. Which columns
 * stand where is found out at each hover, so a pattern that lets too many files through does no harm.
 */
export const dataFileHover: Feature = {
  capabilities: {},
  start(context) {
    let registered = "";
    let before: Promise<Disposable> | null = null;
    const follow = (): void => {
      if (!context.client.abilities.hoverRegistration) return;
      const documentSelector = selectorOf(context);
      const key = JSON.stringify(documentSelector);
      if (key === registered) return;
      registered = key;
      void before?.then((done) => done.dispose());
      before = null;
      if (documentSelector.length === 0) return;
      before = context.connection.client.register(HoverRequest.type, { documentSelector });
      before.catch((error: unknown) => context.log(`Hovers in data files cannot be offered: ${String(error)}`));
    };
    context.loop.onFindings(follow);
    context.documents.onDidClose(follow);
  },
};

interface Filter {
  readonly scheme: string;
  readonly pattern: string;
}

/** One filter for each file name, in the order of the names. */
function selectorOf(context: ServerContext): Filter[] {
  const filters = new Map<string, Filter>();
  for (const open of context.documents.all()) {
    const { study } = context.workspace().bound(context.document(open));
    for (const place of dataLocations(study, context.access()).values()) {
      if (!("uri" in place)) continue;
      const { scheme, path } = URI.parse(place.uri);
      // Each sign that means something in a pattern stands for itself in brackets.
      const name = path.slice(path.lastIndexOf("/") + 1).replace(/[*?[\]{}]/g, "[$&]");
      filters.set(`${name} ${scheme}`, { scheme, pattern: `**/${name}` });
    }
  }
  return [...filters].sort(([a], [b]) => (a < b ? -1 : 1)).map(([, filter]) => filter);
}
