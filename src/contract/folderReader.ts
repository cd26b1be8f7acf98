/** The only way to see what lies in a folder: by URI, injected by the host as the reader of files is. */
export interface FolderReader {
  /** What lies directly in the folder, in no order; nothing where it cannot be seen. Never rejects. */
  list(uri: string): Promise<readonly FolderEntry[]>;
}

export interface FolderEntry {
  readonly name: string;
  readonly kind: "file" | "folder";
}
