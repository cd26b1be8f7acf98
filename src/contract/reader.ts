/**
 * The only way to a file: by URI, injected by the host (Node, web worker, editor, test). A failure's problem has the
 * URI of the file as argument; whoever asked says on which line of the description it shows.
 */
export interface Reader {
  /** The whole file; refuses what is larger than `limit` bytes before reading it. */
  read(uri: string, limit: number): Promise<ReadOutcome>;
}

export type ReadOutcome =
  | { readonly kind: "bytes"; readonly bytes: Uint8Array }
  | { readonly kind: "missing" }
  | { readonly kind: "folder" }
  | { readonly kind: "too large"; readonly size: number }
  | { readonly kind: "unreadable"; readonly reason: string };
