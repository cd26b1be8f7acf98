import { URI } from "vscode-uri";

const onWindows = process.platform === "win32";

/**
 * The `file:` URI of an absolute path, spelled as the editor spells it (`file:///c%3A/a%20b.csv`), so that the same
 * file has one URI wherever it comes from. On Windows either slash is read, and `\\host\share` becomes the URI's host.
 */
export function fileUri(path: string, windows: boolean = onWindows): string {
  return URI.file(windows ? path.replaceAll("\\", "/") : path).toString();
}

/** The path of a `file:` URI for this system; null for any other scheme, and for a URI that cannot be read. */
export function filePath(uri: string, windows: boolean = onWindows): string | null {
  const parsed = parsedUri(uri);
  if (parsed === null || parsed.scheme !== "file") return null;
  const { authority, path } = parsed;
  if (!windows) return authority === "" ? path : `//${authority}${path}`;
  const local = authority === "" ? path.replace(/^\/(?=[A-Za-z]:)/, "") : `//${authority}${path}`;
  return local.replaceAll("/", "\\");
}

function parsedUri(uri: string): URI | null {
  try {
    return URI.parse(uri, true);
  } catch {
    return null;
  }
}
