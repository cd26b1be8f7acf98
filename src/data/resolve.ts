import { URI } from "vscode-uri";

/** Where a path of a description leads, or why it leads nowhere. */
export type Resolution =
  | { readonly kind: "uri"; readonly uri: string }
  | { readonly kind: "empty" }
  /** begins with `/`, a drive letter or a scheme: a path of one machine */
  | { readonly kind: "absolute" }
  /** `mended` is the path with `/` in place of each backslash */
  | { readonly kind: "backslash"; readonly mended: string }
  /** climbs above the root of its file system */
  | { readonly kind: "leaves" }
  /** the description was never saved and has no folder */
  | { readonly kind: "unsaved" };

/**
 * The URI of `path` as written in the description `base` (a URI): relative to the folder of the description, with `/`
 * between the names. Blanks, `#`, `%`, `?` and letters of any script are taken as they stand in the path; nothing in it
 * is an escape. Pure: whether the file exists, and whether it may be read, is for others (see `isInside`).
 */
export function resolveUri(base: string, path: string): Resolution {
  if (path.trim() === "") return { kind: "empty" };
  if (isAbsolute(path)) return { kind: "absolute" };
  if (path.includes("\\")) return { kind: "backslash", mended: path.replaceAll("\\", "/") };
  const description = URI.parse(base);
  if (description.scheme === "untitled") return { kind: "unsaved" };
  const folder = description.path.split("/").slice(0, -1);
  const names = normalised([...folder, ...path.split("/")]);
  if (names === null) return { kind: "leaves" };
  const uri = description.with({ path: `/${names.join("/")}`, query: "", fragment: "" });
  return { kind: "uri", uri: uri.toString() };
}

/** True when `uri` is the folder `folderUri` itself or lies in it, `..` worked out; other schemes and hosts are outside. */
export function isInside(folderUri: string, uri: string): boolean {
  const folder = URI.parse(folderUri);
  const file = URI.parse(uri);
  if (folder.scheme !== file.scheme || folder.authority.toLowerCase() !== file.authority.toLowerCase()) return false;
  const outer = normalised(folder.path.split("/"));
  const inner = normalised(file.path.split("/"));
  if (outer === null || inner === null || inner.length < outer.length) return false;
  return outer.every((name, index) => sameName(name, inner[index] ?? ""));
}

/** A drive letter is the same in either case; every other name is compared as written. */
function sameName(a: string, b: string): boolean {
  return a === b || (/^[a-z]:$/i.test(a) && a.toLowerCase() === b.toLowerCase());
}

function isAbsolute(path: string): boolean {
  return /^([/\\]|[a-z]:|[a-z][a-z0-9+.-]+:\/\/|file:)/i.test(path.trimStart());
}

/** Names without `.`, `..` and empty ones; null where `..` climbs above the first. */
function normalised(names: readonly string[]): string[] | null {
  const kept: string[] = [];
  for (const name of names) {
    if (name === "" || name === ".") continue;
    if (name !== "..") kept.push(name);
    else if (kept.pop() === undefined) return null;
  }
  return kept;
}
