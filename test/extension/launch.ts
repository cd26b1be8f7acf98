// Starts the editor on a copy of the samples and runs the bundled tests in its extension host.
// Arguments: the folder of the bundled tests, the file for the tally.
import { cpSync, existsSync } from "node:fs";
import { join } from "node:path";
import { projectFolder } from "../editor/projectFolder.js";
import { runTests } from "../editor/runTests.js";
import { stageExtension } from "../editor/stageExtension.js";
import { temporaryFolder } from "../editor/temporaryFolder.js";

const [bundles, tallyFile] = process.argv.slice(2);
if (bundles === undefined || tallyFile === undefined) throw new Error("wanted: folder of the bundles, tally file");

const extension = stageExtension();
const workspace = temporaryFolder("workspace");
try {
  cpSync(join(projectFolder(), "samples"), workspace.path, { recursive: true });
  process.exitCode = await runTests({
    extensionDevelopmentPath: extension.path,
    extensionTestsPath: join(bundles, "index.cjs"),
    workspace: workspace.path,
    extensionTestsEnv: { RATEWRIGHT_TALLY: tallyFile },
  });
  // An extension host that dies takes the exit code along: the editor may then say 0.
  if (!existsSync(tallyFile)) throw new Error("the extension host ended before its tests did");
} finally {
  workspace.remove();
  extension.remove();
}
