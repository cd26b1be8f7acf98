import { mkdtempSync, realpathSync, rmSync } from "node:fs";
import { tmpdir } from "node:os";
import { join } from "node:path";
import { atExit } from "./leftovers.js";

/** A folder of its own below the system's temporary folder, and the function that removes it with all it holds. */
export function temporaryFolder(purpose: string): { path: string; remove: () => void } {
  const path = mkdtempSync(join(realpathSync(tmpdir()), `ratewright-${purpose}-`));
  // A process that is just ending may still write: a few attempts with pauses (ms).
  const erase = () => rmSync(path, { recursive: true, force: true, maxRetries: 5, retryDelay: 200 });
  const forget = atExit(erase);
  return {
    path,
    remove() {
      erase();
      forget();
    },
  };
}
