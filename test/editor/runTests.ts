import { runTests as runTestsOnDesktop } from "@vscode/test-electron";
import { desktopEditor } from "./desktopEditor.js";
import { runTestsInBrowser } from "./runTestsInBrowser.js";
import type { RunTestsOptions } from "./runTestsOptions.js";
import { temporaryFolder } from "./temporaryFolder.js";
import { withDeadline } from "./withDeadline.js";

/**
 * Runs tests inside the extension host of a real editor: the desktop one where it is there, else the same editor as a
 * server with a browser without a window. Answers with the exit code of the run, 0 where all tests passed.
 */
export async function runTests(options: RunTestsOptions): Promise<number> {
  const limit = options.limit ?? 180_000;
  const executable = desktopEditor();
  if (executable === undefined) return runTestsInBrowser(options, limit);
  const profile = temporaryFolder("profile");
  try {
    const run = runTestsOnDesktop({
      vscodeExecutablePath: executable,
      extensionDevelopmentPath: options.extensionDevelopmentPath,
      extensionTestsPath: options.extensionTestsPath,
      launchArgs: [
        options.workspace,
        `--user-data-dir=${profile.path}/data`,
        `--extensions-dir=${profile.path}/extensions`,
        ...(options.launchArgs ?? []),
      ],
      ...(options.extensionTestsEnv === undefined ? {} : { extensionTestsEnv: options.extensionTestsEnv }),
    });
    return await withDeadline("tests in the desktop editor", limit, run);
  } finally {
    profile.remove();
  }
}
