/**
 * The only way to write a file: by URI, injected by the host. A text is written whole or not at all, and only inside
 * `folders` (URIs), links followed.
 */
export interface Writer {
  /** Null when it is written, else why not, in words. Never rejects. */
  write(uri: string, text: string, folders: readonly string[]): Promise<string | null>;
}
