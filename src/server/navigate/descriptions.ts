import { URI, Utils } from "vscode-uri";
import { type Bound, bind } from "../../language/bind/bind.js";
import { parse } from "../../language/parse.js";
import type { ServerContext } from "../context.js";

/** Descriptions looked through at most, and how deep below an opened folder. */
const mostDescriptions = 1000;
const deepest = 8;
/** Greatest size of a description that is not open, bytes. */
const sizeLimit = 2e6;

/** A description by its URI: as it stands in the editor, else as it is on disk; null where there is none. */
export async function descriptionAt(context: ServerContext, uri: string): Promise<Bound | null> {
  const open = context.documents.get(uri);
  if (open !== undefined) return context.workspace().bound(context.document(open));
  const outcome = await context.access().reader.read(uri, sizeLimit);
  if (outcome.kind !== "bytes") return null;
  return bind(parse(uri, new TextDecoder().decode(outcome.bytes)));
}

/** All descriptions that are open or lie below an opened folder, the open ones first. */
export async function allDescriptions(context: ServerContext, signal: AbortSignal): Promise<Bound[]> {
  const uris = new Set(context.documents.all().map(({ uri }) => uri));
  for (const folder of context.client.folders) await gather(context, folder, 0, uris, signal);
  const found: Bound[] = [];
  for (const uri of uris) {
    if (signal.aborted) break;
    const bound = await descriptionAt(context, uri);
    if (bound !== null) found.push(bound);
  }
  return found;
}

async function gather(
  context: ServerContext,
  folder: string,
  depth: number,
  uris: Set<string>,
  signal: AbortSignal,
): Promise<void> {
  if (depth > deepest || uris.size >= mostDescriptions || signal.aborted) return;
  const entries = await context.folders.list(folder);
  for (const { name, kind } of [...entries].sort((a, b) => (a.name < b.name ? -1 : 1))) {
    const uri = Utils.joinPath(URI.parse(folder), name).toString();
    if (kind === "file") {
      if (name.endsWith(".raterun") && uris.size < mostDescriptions) uris.add(uri);
    } else if (name !== "node_modules" && !name.startsWith(".")) {
      await gather(context, uri, depth + 1, uris, signal);
    }
  }
}
