import { PassThrough } from "node:stream";
import {
  type CodeAction,
  createConnection,
  createProtocolConnection,
  type Diagnostic,
  type Hover,
  type MarkupContent,
  type ProtocolConnection,
  type PublishDiagnosticsParams,
  type Range,
  type Registration,
  StreamMessageReader,
  StreamMessageWriter,
  type TextEdit,
} from "vscode-languageserver/node";
import { type StatusChanged, statusChanged, type ThemeKind } from "../../src/contract/editorProtocol.js";
import type { FolderEntry, FolderReader } from "../../src/contract/folderReader.js";
import type { Reader, ReadOutcome } from "../../src/contract/reader.js";
import type { EndableComputer } from "../../src/server/compute/workerComputer.js";
import { startServer } from "../../src/server/server.js";
import { inlineComputer } from "../../src/workspace/computer.js";
import { until } from "../editor/until.js";

export const folder = "file:///lab";

export interface ClientOptions {
  /** texts of data files by their path below the folder */
  readonly files?: { [path: string]: string };
  readonly reader?: Reader;
  readonly folders?: FolderReader;
  readonly computer?: EndableComputer;
  readonly trusted?: boolean;
  readonly theme?: ThemeKind;
  /** URI of the folder of documentation pages */
  readonly docs?: string;
  /** pause after a keystroke, ms */
  readonly delay?: number;
  readonly maximumSize?: number;
  readonly versionedEdits?: boolean;
  readonly snippets?: boolean;
  /** whether hints behind the lines are wanted */
  readonly hints?: boolean;
}

/** An editor without a window, on an end of a wire that has our server at the other. */
export interface EditorClient {
  readonly connection: ProtocolConnection;
  readonly files: Map<string, string>;
  /** every set of diagnostics that was sent, in order */
  readonly sent: PublishDiagnosticsParams[];
  readonly statuses: StatusChanged[];
  readonly registered: Registration[];
  readonly log: string[];
  /** how often the editor was told to ask anew */
  readonly refreshes: { hints: number };
  open(path: string, text: string): Promise<void>;
  /** replaces the first occurrence of a stretch of text, as typing does */
  edit(path: string, words: string, by: string): Promise<void>;
  close(path: string): Promise<void>;
  text(path: string): string;
  /** diagnostics as they stand now, `CODE line`, lines from 1 */
  codes(path: string): string[];
  shown(path: string): Diagnostic[];
  /** waits until findings of the text as it stands are there */
  settled(path: string): Promise<void>;
  /** quick fixes at a stretch of text */
  fixes(path: string, words: string): Promise<CodeAction[]>;
  /** carries out a fix */
  apply(path: string, action: CodeAction): Promise<void>;
  /** the hover at the first letter of the `nth` occurrence, as Markdown */
  hover(path: string, words: string, nth?: number): Promise<{ text: string; range: Range | undefined } | null>;
  /** where a stretch of text stands, its `nth` occurrence */
  place(path: string, words: string, nth?: number): Range;
  /** asks about a document, at the first letter of a stretch of text where one is given */
  ask<T>(method: string, path: string, words?: string, more?: AskMore): Promise<T>;
  fileChanged(path: string): Promise<void>;
  end(): Promise<void>;
}

/** What a question says beside the document; `behind`: at the end of the stretch of text. */
export interface AskMore {
  readonly nth?: number;
  readonly behind?: true;
  readonly [name: string]: unknown;
}

const uriOf = (path: string): string => `${folder}/${path}`;

export async function startEditorClient(options: ClientOptions = {}): Promise<EditorClient> {
  const files = new Map(Object.entries(options.files ?? {}).map(([path, text]) => [uriOf(path), text]));
  const reader: Reader = options.reader ?? { read: async (uri) => outcomeOf(files.get(uri)) };
  const computer = options.computer ?? { ...inlineComputer(async () => {}), end: () => undefined };
  const [up, down] = [new PassThrough(), new PassThrough()];
  startServer(createConnection(new StreamMessageReader(up), new StreamMessageWriter(down)), {
    reader: () => reader,
    folders: () => options.folders ?? foldersOf(files),
    writer: () => ({
      async write(uri, text) {
        files.set(uri, text);
        return null;
      },
    }),
    computer: () => computer,
  });
  const connection = createProtocolConnection(new StreamMessageReader(down), new StreamMessageWriter(up));
  const texts = new Map<string, { text: string; version: number }>();
  const sent: PublishDiagnosticsParams[] = [];
  const statuses: StatusChanged[] = [];
  const registered: Registration[] = [];
  const log: string[] = [];
  const refreshes = { hints: 0 };
  connection.onNotification("textDocument/publishDiagnostics", (message: PublishDiagnosticsParams) => {
    sent.push(message);
  });
  connection.onNotification(statusChanged, (message: StatusChanged) => void statuses.push(message));
  connection.onNotification("window/logMessage", ({ message }: { message: string }) => void log.push(message));
  connection.onRequest("client/registerCapability", ({ registrations }: { registrations: Registration[] }) => {
    registered.push(...registrations);
  });
  connection.onRequest("client/unregisterCapability", () => undefined);
  connection.onRequest("workspace/inlayHint/refresh", () => {
    refreshes.hints++;
    return null;
  });
  connection.onRequest("workspace/configuration", ({ items }: { items: { section?: string }[] }) => [
    items[0]?.section === "ratewright.inlayHints"
      ? { enabled: options.hints ?? true }
      : { preview: { updateDelay: options.delay ?? 0 }, data: { maximumSize: options.maximumSize ?? 512 } },
  ]);
  connection.listen();
  await connection.sendRequest("initialize", {
    processId: null,
    rootUri: null,
    workspaceFolders: [{ uri: folder, name: "lab" }],
    capabilities: {
      textDocument: {
        hover: { dynamicRegistration: true },
        completion: { completionItem: { snippetSupport: options.snippets ?? true } },
      },
      workspace: {
        configuration: true,
        didChangeConfiguration: { dynamicRegistration: true },
        workspaceFolders: true,
        inlayHint: { refreshSupport: true },
        didChangeWatchedFiles: { dynamicRegistration: true, relativePatternSupport: true },
        codeLens: { refreshSupport: true },
        workspaceEdit: { documentChanges: options.versionedEdits ?? true },
      },
    },
    initializationOptions: { theme: options.theme ?? "light", trusted: options.trusted ?? true, docs: options.docs },
  });
  await connection.sendNotification("initialized", {});
  await until("the settings are asked for", () => registered.length > 0);

  const known = (path: string): { text: string; version: number } => {
    const found = texts.get(path);
    if (found === undefined) throw new Error(`${path} is not open`);
    return found;
  };
  const positionOf = (path: string, offset: number): { line: number; character: number } => {
    const lines = known(path).text.slice(0, offset).split("\n");
    return { line: lines.length - 1, character: lines.at(-1)?.length ?? 0 };
  };
  const rangeOf = (path: string, words: string, nth = 1): Range => {
    let at = -1;
    for (let seen = 0; seen < nth; seen++) at = known(path).text.indexOf(words, at + 1);
    if (at < 0) throw new Error(`not in the text: ${words}`);
    return { start: positionOf(path, at), end: positionOf(path, at + words.length) };
  };
  const change = async (path: string, edits: readonly TextEdit[]): Promise<void> => {
    const now = known(path);
    // Edits of one set all speak of the text before: the last one first keeps them so.
    for (const { range, newText } of edits.toReversed()) {
      const [start, end] = [range.start, range.end].map((position) => offsetOf(now.text, position));
      now.text = now.text.slice(0, start) + newText + now.text.slice(end);
    }
    now.version++;
    const contentChanges = edits.toReversed().map(({ range, newText }) => ({ range, text: newText }));
    const textDocument = { uri: uriOf(path), version: now.version };
    await connection.sendNotification("textDocument/didChange", { textDocument, contentChanges });
  };
  const shown = (path: string): Diagnostic[] => sent.findLast(({ uri }) => uri === uriOf(path))?.diagnostics ?? [];

  return {
    connection,
    files,
    sent,
    statuses,
    registered,
    log,
    refreshes,
    async open(path, text) {
      texts.set(path, { text, version: 1 });
      const textDocument = { uri: uriOf(path), languageId: "raterun", version: 1, text };
      await connection.sendNotification("textDocument/didOpen", { textDocument });
    },
    edit: (path, words, by) => change(path, [{ range: rangeOf(path, words), newText: by }]),
    close: (path) => connection.sendNotification("textDocument/didClose", { textDocument: { uri: uriOf(path) } }),
    text: (path) => known(path).text,
    shown,
    codes: (path) => shown(path).map(({ code, range }) => `${code} ${range.start.line + 1}`),
    async settled(path) {
      // An answer to a request shows that the server has taken in every change before it.
      await connection.sendRequest("textDocument/codeAction", {
        textDocument: { uri: uriOf(path) },
        range: { start: { line: 0, character: 0 }, end: { line: 0, character: 0 } },
        context: { diagnostics: [] },
      });
      const from = statuses.length;
      const before = statuses.findLast(({ uri }) => uri === uriOf(path));
      await until(`findings of ${path}`, () => {
        const now = statuses.findLast(({ uri }) => uri === uriOf(path));
        return now?.state === "up to date" && (statuses.length > from || before === now);
      });
    },
    async fixes(path, words) {
      const range = rangeOf(path, words);
      const context = { diagnostics: shown(path) };
      const textDocument = { uri: uriOf(path) };
      return (await connection.sendRequest("textDocument/codeAction", {
        textDocument,
        range,
        context,
      })) as CodeAction[];
    },
    async apply(path, { edit }) {
      const uri = uriOf(path);
      const listed = edit?.documentChanges?.flatMap((part) => ("edits" in part ? part.edits : [])) as TextEdit[];
      await change(path, listed ?? edit?.changes?.[uri] ?? []);
    },
    async hover(path, words, nth) {
      const { start } = rangeOf(path, words, nth);
      const textDocument = { uri: uriOf(path) };
      const hover: Hover | null = await connection.sendRequest("textDocument/hover", { textDocument, position: start });
      return hover === null ? null : { text: (hover.contents as MarkupContent).value, range: hover.range };
    },
    place: rangeOf,
    async ask(method, path, words, { nth, behind, ...more } = {}) {
      const textDocument = { uri: uriOf(path) };
      const range = words === undefined ? null : rangeOf(path, words, nth);
      const position = range === null ? {} : { position: behind === true ? range.end : range.start };
      return connection.sendRequest(method, { textDocument, ...position, ...more });
    },
    fileChanged: (path) => {
      return connection.sendNotification("workspace/didChangeWatchedFiles", {
        changes: [{ uri: uriOf(path), type: 2 }],
      });
    },
    async end() {
      await connection.sendRequest("shutdown");
      connection.dispose();
    },
  };
}

/** What lies in a folder, by the files there are below it. */
function foldersOf(files: ReadonlyMap<string, string>): FolderReader {
  return {
    async list(uri) {
      const below = [...files.keys()]
        .filter((file) => file.startsWith(`${uri}/`))
        .map((file) => file.slice(uri.length + 1));
      const entries = new Map<string, FolderEntry>();
      for (const path of below) {
        const [name = "", ...rest] = decodeURIComponent(path).split("/");
        entries.set(name, { name, kind: rest.length > 0 ? "folder" : "file" });
      }
      return [...entries.values()];
    },
  };
}

function outcomeOf(text: string | undefined): ReadOutcome {
  return text === undefined ? { kind: "missing" } : { kind: "bytes", bytes: new TextEncoder().encode(text) };
}

function offsetOf(text: string, { line, character }: { line: number; character: number }): number {
  const before = text.split("\n").slice(0, line);
  return before.reduce((sum, one) => sum + one.length + 1, 0) + character;
}
