import {
  defaultSettings,
  type EditorSettings,
  type InitializationOptions,
  type ThemeKind,
} from "../contract/editorProtocol.js";

/** What is known of the client and of the person's choices; changes while the server runs. */
export interface ClientState {
  /** null until the client tells */
  theme: ThemeKind | null;
  trusted: boolean;
  /** URI of the folder with the documentation pages; null for a client that brings none */
  docs: string | null;
  /** URIs of the opened folders */
  folders: string[];
  settings: EditorSettings;
  /** what the client is able to do */
  readonly abilities: ClientAbilities;
}

export interface ClientAbilities {
  configuration: boolean;
  configurationEvents: boolean;
  folderEvents: boolean;
  /** it watches files as told, by patterns below a folder */
  watching: boolean;
  /** it asks for hovers in documents that are told later */
  hoverRegistration: boolean;
  /** it takes completions with places to fill in */
  snippets: boolean;
  /** it takes up hints that are told to be stale */
  hintRefresh: boolean;
  /** it takes edits that name the version of the document they are for */
  versionedEdits: boolean;
  /** it asks for the lines above the text again when told to */
  codeLensRefresh: boolean;
}

/** The state before `initialize`; nothing is trusted until the client says so. */
export function createClientState(): ClientState {
  return {
    theme: null,
    trusted: false,
    docs: null,
    folders: [],
    settings: defaultSettings,
    abilities: {
      configuration: false,
      configurationEvents: false,
      folderEvents: false,
      watching: false,
      hoverRegistration: false,
      snippets: false,
      hintRefresh: false,
      versionedEdits: false,
      codeLensRefresh: false,
    },
  };
}

/** What the client said on `initialize`; a client that says nothing of trust is one that asks for none. */
export function readInitializationOptions(state: ClientState, options: unknown): void {
  const told = isRecord(options) ? (options as Partial<InitializationOptions>) : {};
  state.trusted = told.trusted ?? true;
  state.theme = told.theme ?? null;
  state.docs = typeof told.docs === "string" ? told.docs.replace(/\/+$/, "") : null;
}

/** Settings as the client answers, each replaced by its default where it is not a number that makes sense. */
export function readSettings(answer: unknown): EditorSettings {
  const delay = numberIn(answer, "preview", "updateDelay");
  const size = numberIn(answer, "data", "maximumSize");
  return {
    preview: { updateDelay: delay !== null && delay >= 0 ? delay : defaultSettings.preview.updateDelay },
    data: { maximumSize: size !== null && size > 0 ? size : defaultSettings.data.maximumSize },
    codeLens: { enabled: valueIn(answer, "codeLens", "enabled") !== false },
  };
}

function numberIn(answer: unknown, section: string, name: string): number | null {
  const value = valueIn(answer, section, name);
  return typeof value === "number" && Number.isFinite(value) ? value : null;
}

function valueIn(answer: unknown, section: string, name: string): unknown {
  const inner = isRecord(answer) ? answer[section] : undefined;
  return isRecord(inner) ? inner[name] : undefined;
}

function isRecord(value: unknown): value is Record<string, unknown> {
  return typeof value === "object" && value !== null;
}
