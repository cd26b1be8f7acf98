/** The arguments of `runTests` of `@vscode/test-electron`, and the folder to open by its own name. */
export interface RunTestsOptions {
  extensionDevelopmentPath: string;
  /** Module with `run(): Promise<void>`, CommonJS. */
  extensionTestsPath: string;
  /** Folder to open. */
  workspace: string;
  /** Further arguments; the desktop editor alone takes them. */
  launchArgs?: string[];
  /** Environment of the extension host. */
  extensionTestsEnv?: { [name: string]: string | undefined };
  /** Time the whole run may take, ms; 180,000 unless told. */
  limit?: number;
  /** Where the run's log lines go; the console unless told. */
  say?: (line: string) => void;
}
