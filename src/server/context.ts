import type { Connection, ServerCapabilities, TextDocuments } from "vscode-languageserver";
import type { TextDocument } from "vscode-languageserver-textdocument";
import type { FolderReader } from "../contract/folderReader.js";
import type { Writer } from "../contract/writer.js";
import type { FileAccess } from "../workspace/loadFiles.js";
import type { Document, Workspace } from "../workspace/workspace.js";
import type { ClientState } from "./clientState.js";
import type { FindingsLoop } from "./findingsLoop.js";
import type { ShownDiagnostics } from "./shownDiagnostics.js";

/** What every feature works with. */
export interface ServerContext {
  readonly connection: Connection;
  /** descriptions open in the editor, as they stand there */
  readonly documents: TextDocuments<TextDocument>;
  readonly client: ClientState;
  /** the ones in use now: others after `renew` */
  readonly workspace: () => Workspace;
  readonly access: () => FileAccess;
  /** what lies in folders */
  readonly folders: FolderReader;
  /** writes files inside the opened folders */
  readonly writer: Writer;
  readonly document: (open: TextDocument) => Document;
  readonly loop: FindingsLoop;
  readonly shown: ShownDiagnostics;
  /** URIs of the descriptions that a preview shows */
  readonly previewed: Set<string>;
  readonly log: (line: string) => void;
  /** Forgets what was read and works everything out anew: what may be read has changed. */
  readonly renew: () => void;
}

/** One thing the editor offers: what the server says of it on `initialize`, and how it begins. */
export interface Feature {
  readonly capabilities: ServerCapabilities;
  readonly start: (context: ServerContext) => void;
}
