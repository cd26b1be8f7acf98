/**
 * A name that every file system takes, from a path or from the names of runs: the last part of the path without
 * `.raterun`, letters, digits, `.`, `_` and `-` kept, anything else a `-`.
 */
export function fileName(path: string): string {
  const last = path.slice(path.lastIndexOf("/") + 1).replace(/\.raterun$/, "");
  const plain = last.replace(/[^\p{L}\p{N}._-]+/gu, "-").replace(/^[-.]+/, "");
  return plain === "" ? "run" : plain;
}
