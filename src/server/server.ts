import { type Connection, type InitializeParams, TextDocumentSyncKind, TextDocuments } from "vscode-languageserver";
import { TextDocument } from "vscode-languageserver-textdocument";
import type { FolderReader } from "../contract/folderReader.js";
import type { Reader } from "../contract/reader.js";
import { version } from "../contract/version.js";
import type { Writer } from "../contract/writer.js";
import type { Curves } from "../workspace/computer.js";
import type { FileAccess } from "../workspace/loadFiles.js";
import { createWorkspace, type Document, type Workspace } from "../workspace/workspace.js";
import { type ClientState, createClientState, readInitializationOptions } from "./clientState.js";
import type { EndableComputer } from "./compute/workerComputer.js";
import type { Feature, ServerContext } from "./context.js";
import { features } from "./features/features.js";
import { createFindingsLoop } from "./findingsLoop.js";
import { fenceOf, shownPath } from "./folders.js";
import { createShownDiagnostics } from "./shownDiagnostics.js";

/** What differs between Node and a web worker. */
export interface ServerHost {
  /** `fence`: folders that files must lie in, links followed; null where any file may be read */
  reader(connection: Connection, fence: () => readonly string[] | null): Reader;
  /** lists folders; `fence` as of the reader */
  folders(connection: Connection, fence: () => readonly string[] | null): FolderReader;
  /** writes files inside the opened folders */
  writer(connection: Connection): Writer;
  /** where findings are worked out; asked for anew whenever what may be read has changed */
  computer(log: (line: string) => void): EndableComputer;
}

/** Serves a connection until it ends. */
export function startServer(connection: Connection, host: ServerHost): void {
  const documents = new TextDocuments(TextDocument);
  const client = createClientState();
  const log = (line: string): void => connection.console.info(line);
  const fence = (): readonly string[] | null => {
    return client.trusted ? null : documents.all().map(({ uri }) => fenceOf(uri, client.folders));
  };
  const open = (): Opened => {
    return openWorkspace(host.reader(connection, fence), host.computer(log), client);
  };
  let opened: Opened | null = null;
  const current = (): Opened => {
    opened ??= open();
    return opened;
  };
  const document = (text: TextDocument): Document => {
    return { uri: text.uri, text: text.getText(), path: shownPath(text.uri, client.folders) };
  };
  const workspace = (): Workspace => current().workspace;
  const delay = (): number => client.settings.preview.updateDelay;
  const previewed = new Set<string>();
  const curves = (uri: string): Curves => (previewed.has(uri) ? "thinned" : false);
  const loop = createFindingsLoop({ documents, workspace, document, delay, curves });
  const context: ServerContext = {
    connection,
    documents,
    client,
    workspace,
    access: () => current().access,
    folders: host.folders(connection, fence),
    writer: host.writer(connection),
    document,
    loop,
    shown: createShownDiagnostics(),
    previewed,
    log,
    renew() {
      opened?.computer.end();
      opened = null;
      for (const { uri } of documents.all()) loop.refresh(uri);
    },
  };

  connection.onInitialize((params) => {
    readClient(client, params);
    return {
      capabilities: capabilitiesOf(features),
      serverInfo: { name: "ratewright", version },
    };
  });
  documents.onDidClose(({ document: { uri } }) => workspace().close(uri));
  for (const feature of features) feature.start(context);
  connection.onShutdown(() => {
    loop.end();
    opened?.computer.end();
  });
  documents.listen(connection);
  connection.listen();
}

interface Opened {
  readonly access: FileAccess;
  readonly computer: EndableComputer;
  readonly workspace: Workspace;
}

function openWorkspace(reader: Reader, computer: EndableComputer, client: ClientState): Opened {
  const access: FileAccess = {
    reader,
    sizeLimit: client.settings.data.maximumSize * 1e6,
    within: (description) => (client.trusted ? null : fenceOf(description, client.folders)),
  };
  return { access, computer, workspace: createWorkspace(access, computer) };
}

function readClient(client: ClientState, params: InitializeParams): void {
  readInitializationOptions(client, params.initializationOptions);
  client.folders = (params.workspaceFolders ?? []).map(({ uri }) => uri);
  const { workspace, textDocument } = params.capabilities;
  const { abilities } = client;
  abilities.configuration = workspace?.configuration === true;
  abilities.configurationEvents = workspace?.didChangeConfiguration?.dynamicRegistration === true;
  abilities.folderEvents = workspace?.workspaceFolders === true;
  const watching = workspace?.didChangeWatchedFiles;
  abilities.watching = watching?.dynamicRegistration === true && watching.relativePatternSupport === true;
  abilities.hoverRegistration = textDocument?.hover?.dynamicRegistration === true;
  abilities.snippets = textDocument?.completion?.completionItem?.snippetSupport === true;
  abilities.hintRefresh = workspace?.inlayHint?.refreshSupport === true;
  abilities.codeLensRefresh = workspace?.codeLens?.refreshSupport === true;
  abilities.versionedEdits = workspace?.workspaceEdit?.documentChanges === true;
}

function capabilitiesOf(all: readonly Feature[]): Feature["capabilities"] {
  const common = { textDocumentSync: TextDocumentSyncKind.Incremental, positionEncoding: "utf-16" };
  return Object.assign(common, ...all.map(({ capabilities }) => capabilities));
}
