import { stat } from "node:fs/promises";
import { relative, resolve, sep } from "node:path";
import { glob, isDynamicPattern } from "tinyglobby";
import { fileUri } from "./fileUri.js";

/** A description found for an argument of the command line. */
export interface FoundDescription {
  /** absolute path */
  readonly path: string;
  readonly uri: string;
  /** as it is shown: relative to the working directory, `/` between the names */
  readonly shown: string;
}

/** An argument that leads to no description, and why. */
export interface UnusedPath {
  readonly argument: string;
  readonly reason: "missing" | "not a description" | "no descriptions in it" | "unreadable";
}

export interface ExpandedPaths {
  readonly found: readonly FoundDescription[];
  readonly unused: readonly UnusedPath[];
}

/**
 * The descriptions that the arguments of a command mean: a `.raterun` file, a folder (searched through all its folders,
 * except `node_modules` and `.git`), or a glob, each seen from `cwd`. What a search meets as a
 * symbolic link is passed over; one that is named is followed. A path that exists as it stands is
 * never taken for a glob. In the order of the arguments, within one by code unit of the path, each file once.
 */
export async function expandPaths(paths: readonly string[], cwd: string): Promise<ExpandedPaths> {
  const found = new Map<string, FoundDescription>();
  const unused: UnusedPath[] = [];
  for (const argument of paths) {
    const matches = await matchesOf(argument, cwd);
    if (typeof matches === "string") unused.push({ argument, reason: matches });
    else for (const path of matches) if (!found.has(path)) found.set(path, description(path, cwd));
  }
  return { found: [...found.values()], unused };
}

async function matchesOf(argument: string, cwd: string): Promise<string[] | UnusedPath["reason"]> {
  const path = resolve(cwd, argument);
  const kind = await kindOf(path);
  if (kind === "file") return path.endsWith(".raterun") ? [path] : "not a description";
  if (kind === "unreadable") return kind;
  if (kind === "folder") return nonEmpty(await search("**/*.raterun", path), "no descriptions in it");
  const pattern = sep === "\\" ? argument.replaceAll("\\", "/") : argument;
  return isDynamicPattern(pattern) ? nonEmpty(await search(pattern, cwd), "missing") : "missing";
}

function nonEmpty(matches: string[], otherwise: UnusedPath["reason"]): string[] | UnusedPath["reason"] {
  return matches.length > 0 ? matches : otherwise;
}

async function kindOf(path: string): Promise<"file" | "folder" | "missing" | "unreadable"> {
  try {
    return (await stat(path)).isDirectory() ? "folder" : "file";
  } catch (error) {
    const code = error instanceof Error && "code" in error ? error.code : "";
    return code === "EACCES" || code === "EPERM" || code === "ELOOP" ? "unreadable" : "missing";
  }
}

/** Links are passed over, so that a link to a folder above cannot make the search endless, nor one file count twice. */
async function search(pattern: string, cwd: string): Promise<string[]> {
  const matches = await glob(pattern, {
    cwd,
    absolute: true,
    dot: true,
    expandDirectories: false,
    followSymbolicLinks: false,
    ignore: ["**/node_modules/**", "**/.git/**"],
  });
  const native = matches.filter((match) => match.endsWith(".raterun")).map((match) => resolve(match));
  return native.sort((a, b) => (a < b ? -1 : a > b ? 1 : 0));
}

function description(path: string, cwd: string): FoundDescription {
  const shown = relative(cwd, path).split(sep).join("/");
  return { path, uri: fileUri(path), shown };
}
