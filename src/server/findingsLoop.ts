import type { TextDocuments } from "vscode-languageserver";
import type { TextDocument } from "vscode-languageserver-textdocument";
import type { Description } from "../contract/findings.js";
import type { Curves } from "../workspace/computer.js";
import type { Document, Workspace } from "../workspace/workspace.js";

/** Keeps the findings of open descriptions up to date: waits for a pause in the typing, then works. */
export interface FindingsLoop {
  /** Calls back with findings that belong to the text as it stands at that moment; older ones are dropped. */
  onFindings(listener: (open: TextDocument, description: Description) => void): void;
  onStatus(listener: (uri: string, status: LoopStatus) => void): void;
  /** Works out this description anew, after the usual pause: something it follows from changed. */
  refresh(uri: string): void;
  /** Stops everything. */
  end(): void;
}

/** Working: from the change on, the pause included. */
export type LoopStatus =
  | { readonly state: "working" }
  | { readonly state: "up to date"; readonly milliseconds: number }
  | { readonly state: "failed"; readonly why: string };

export interface LoopInput {
  readonly documents: TextDocuments<TextDocument>;
  readonly workspace: () => Workspace;
  readonly document: (open: TextDocument) => Document;
  /** with which curves a description is wanted: one that is previewed is worked out once for all views */
  readonly curves: (uri: string) => Curves;
  /** pause after the last change, ms */
  readonly delay: () => number;
}

interface Turn {
  readonly abort: AbortController;
  readonly timer: ReturnType<typeof setTimeout>;
}

export function createFindingsLoop(input: LoopInput): FindingsLoop {
  const { documents, workspace, document, delay } = input;
  const turns = new Map<string, Turn>();
  const findingsListeners: ((open: TextDocument, description: Description) => void)[] = [];
  const statusListeners: ((uri: string, status: LoopStatus) => void)[] = [];

  const tell = (uri: string, status: LoopStatus): void => {
    for (const listener of statusListeners) listener(uri, status);
  };
  const stop = (uri: string): void => {
    const turn = turns.get(uri);
    turns.delete(uri);
    clearTimeout(turn?.timer);
    turn?.abort.abort();
  };

  const work = async (uri: string, signal: AbortSignal): Promise<void> => {
    const open = documents.get(uri);
    if (open === undefined) return;
    const { version } = open;
    const begin = performance.now();
    try {
      const description = await workspace().describe(document(open), { curves: input.curves(uri), signal });
      if (description === null || signal.aborted || documents.get(uri)?.version !== version) return;
      for (const listener of findingsListeners) listener(open, description);
      tell(uri, { state: "up to date", milliseconds: Math.round(performance.now() - begin) });
    } catch (error) {
      if (signal.aborted) return;
      tell(uri, { state: "failed", why: error instanceof Error ? error.message : String(error) });
    }
  };

  const schedule = (uri: string, pause: number): void => {
    stop(uri);
    tell(uri, { state: "working" });
    const abort = new AbortController();
    turns.set(uri, { abort, timer: setTimeout(() => void work(uri, abort.signal), pause) });
  };

  const seen = new Set<string>();
  // The text a description opens with is announced as a change too: nobody is typing then.
  documents.onDidChangeContent(({ document: { uri } }) => {
    schedule(uri, seen.has(uri) ? delay() : 0);
    seen.add(uri);
  });
  documents.onDidClose(({ document: { uri } }) => {
    seen.delete(uri);
    stop(uri);
  });

  return {
    onFindings: (listener) => void findingsListeners.push(listener),
    onStatus: (listener) => void statusListeners.push(listener),
    refresh: (uri) => {
      if (documents.get(uri) !== undefined) schedule(uri, delay());
    },
    end() {
      for (const uri of [...turns.keys()]) stop(uri);
    },
  };
}
