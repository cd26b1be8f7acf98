import { ErrorCodes, ResponseError, type TextEdit, type WorkspaceEdit } from "vscode-languageserver";
import { problem } from "../../contract/problem.js";
import { messageOf } from "../../contract/words.js";
import { rename } from "../../language/navigate/rename.js";
import { abortSignalOf } from "../abortSignal.js";
import type { Feature, ServerContext } from "../context.js";
import { placesElsewhere } from "../navigate/everywhere.js";
import { foundAt } from "../navigate/foundAt.js";
import { openBoundAt, rangeIn } from "../openBound.js";

/** Another name for a column, run, species, calibration, series, mechanism or step, everywhere at once, or the reason why not. */
export const renaming: Feature = {
  capabilities: { renameProvider: { prepareProvider: true } },
  start(context) {
    const { connection } = context;
    connection.onPrepareRename(async (params) => {
      const here = openBoundAt(context, params);
      const home = here === null ? null : await foundAt(context, here.bound, here.offset);
      if (here === null || home === null) return null;
      const { found, origin } = home;
      if (found.formula) return refusal(messageOf(problem("rename-formula", { formula: found.name }, origin)));
      return { range: rangeIn(here.bound, origin), placeholder: found.name };
    });
    connection.onRenameRequest(async (params, token) => {
      const here = openBoundAt(context, params);
      const home = here === null ? null : await foundAt(context, here.bound, here.offset);
      if (home === null) return null;
      const edits = rename(home.home, home.found, params.newName);
      if (!edits.ok) return refusal(messageOf(edits.problem));
      if (edits.value.length === 0) return null;
      const texts = new Map<string, TextEdit[]>();
      const add = (uri: string, edit: TextEdit): void => void texts.set(uri, [...(texts.get(uri) ?? []), edit]);
      for (const { text: newText, ...span } of edits.value) {
        add(home.home.parsed.uri, { range: rangeIn(home.home, span), newText });
      }
      for (const { bound, origin } of await placesElsewhere(context, home, abortSignalOf(token))) {
        add(bound.parsed.uri, { range: rangeIn(bound, origin), newText: params.newName });
      }
      return workspaceEdit(context, texts);
    });
  },
};

function refusal(words: string): ResponseError<void> {
  return new ResponseError(ErrorCodes.InvalidRequest, words);
}

/** Where the client can check it, edits of an open text are for its present version only. */
function workspaceEdit(context: ServerContext, texts: ReadonlyMap<string, TextEdit[]>): WorkspaceEdit {
  if (!context.client.abilities.versionedEdits) return { changes: Object.fromEntries(texts) };
  const documentChanges = [...texts].map(([uri, edits]) => {
    return { textDocument: { uri, version: context.documents.get(uri)?.version ?? null }, edits };
  });
  return { documentChanges };
}
