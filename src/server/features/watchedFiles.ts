import { DidChangeWatchedFilesNotification, type Disposable } from "vscode-languageserver";
import { URI, Utils } from "vscode-uri";
import { dataLocations } from "../../workspace/loadFiles.js";
import { recordBeside } from "../../workspace/verify.js";
import type { Feature, ServerContext } from "../context.js";

/**
 * Watches the data files and records of open descriptions, by the folders they lie in: any name and any ending may be
 * a data file.
 * One that changed, came or went is read again, and what follows from it is worked out anew.
 */
export const watchedFiles: Feature = {
  capabilities: {},
  start(context) {
    const watched = new Map<string, Promise<Disposable>>();
    context.connection.onDidChangeWatchedFiles(({ changes }) => {
      const uris = new Set(changes.map(({ uri }) => URI.parse(uri).toString()));
      const descriptions = new Set([...uris].flatMap((uri) => context.workspace().changed(uri)));
      // What is said of a description's record is said anew with its findings.
      for (const { uri } of context.documents.all()) if (uris.has(recordBeside(uri))) descriptions.add(uri);
      for (const description of descriptions) context.loop.refresh(description);
    });
    const follow = (): void => {
      if (!context.client.abilities.watching) return;
      const wanted = dataFolders(context);
      for (const [folder, watching] of watched) {
        if (wanted.has(folder)) continue;
        watched.delete(folder);
        void watching.then((done) => done.dispose());
      }
      for (const folder of wanted) {
        if (watched.has(folder)) continue;
        const watcher = { globPattern: { baseUri: folder, pattern: "*" } };
        const watching = context.connection.client.register(DidChangeWatchedFilesNotification.type, {
          watchers: [watcher],
        });
        watching.catch((error: unknown) => context.log(`${folder} cannot be watched: ${String(error)}`));
        watched.set(folder, watching);
      }
    };
    context.loop.onFindings(follow);
    context.documents.onDidClose(follow);
  },
};

/** Folders of all open descriptions, where their records stand, and of their data files. */
function dataFolders(context: ServerContext): Set<string> {
  const folders = new Set<string>();
  for (const open of context.documents.all()) {
    if (!open.uri.startsWith("untitled:")) folders.add(Utils.dirname(URI.parse(open.uri)).toString());
    const { study } = context.workspace().bound(context.document(open));
    for (const place of dataLocations(study, context.access()).values()) {
      if ("uri" in place) folders.add(Utils.dirname(URI.parse(place.uri)).toString());
    }
  }
  return folders;
}
