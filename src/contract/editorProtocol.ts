import type { FolderEntry } from "./folderReader.js";
import type { ReadOutcome } from "./reader.js";

/** What client and server say to each other beyond the language server protocol. */

/** Kinds of colour themes, as the editor has them. */
export type ThemeKind = "light" | "dark" | "highContrast" | "highContrastLight";

/** What the client tells on `initialize`. */
export interface InitializationOptions {
  readonly theme: ThemeKind;
  /** whether the workspace is trusted; in one that is not, data files must stay in the opened folder */
  readonly trusted: boolean;
  /** URI of the folder with the pages of codes and of the language, without a slash at its end */
  readonly docs: string;
}

/** Notification from the client: the theme changed. */
export const themeChanged = "ratewright/themeChanged";
export interface ThemeChanged {
  readonly theme: ThemeKind;
}

/** Notification from the client: the person trusts the workspace now. */
export const trustGranted = "ratewright/trustGranted";

/** Request of a server without files of its own: the client reads one by the editor's file system. */
export const readFile = "ratewright/readFile";
export interface ReadFile {
  readonly uri: string;
  /** greatest size that is read, bytes */
  readonly limit: number;
}
export type ReadFileAnswer = ReadOutcome;

/** Request of a server without files of its own: the client lists a folder by the editor's file system. */
export const listFolder = "ratewright/listFolder";
export interface ListFolder {
  readonly uri: string;
}
export type ListFolderAnswer = readonly FolderEntry[];

/** Notification from the server: where it stands with a description. */
export const statusChanged = "ratewright/statusChanged";
export interface StatusChanged {
  readonly uri: string;
  readonly state: "working" | "up to date" | "failed";
  /** time the last findings took, ms, whole; null while it works */
  readonly milliseconds: number | null;
}

/** Settings the server asks for, section `ratewright`. */
export interface EditorSettings {
  readonly preview: {
    /** time after the last keystroke until findings are worked out, ms */
    readonly updateDelay: number;
  };
  readonly data: {
    /** greatest size of a data file, MB */
    readonly maximumSize: number;
  };
  readonly codeLens: {
    /** whether lines about the record stand above the text */
    readonly enabled: boolean;
  };
}

/** What holds until the client tells otherwise; the same as the command line's. */
export const defaultSettings: EditorSettings = {
  preview: { updateDelay: 250 },
  data: { maximumSize: 512 },
  codeLens: { enabled: true },
};
