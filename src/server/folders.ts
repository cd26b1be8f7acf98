import { URI, Utils } from "vscode-uri";
import { isInside } from "../data/resolve.js";

/** The opened folder that holds a description, the innermost where several do; null where none does. */
export function folderOf(uri: string, folders: readonly string[]): string | null {
  const holding = folders.filter((folder) => isInside(folder, uri));
  return holding.sort((a, b) => URI.parse(b).path.length - URI.parse(a).path.length)[0] ?? null;
}

/** The folder in which data files of a description must stay: the opened one, else the one it lies in itself. */
export function fenceOf(uri: string, folders: readonly string[]): string {
  return folderOf(uri, folders) ?? Utils.dirname(URI.parse(uri)).toString();
}

/** How findings call a description: its path below the opened folder, else its name. */
export function shownPath(uri: string, folders: readonly string[]): string {
  const { path } = URI.parse(uri);
  const folder = folderOf(uri, folders);
  if (folder === null) return path.slice(path.lastIndexOf("/") + 1);
  const base = URI.parse(folder).path.replace(/\/+$/, "");
  return path.slice(base.length + 1);
}
