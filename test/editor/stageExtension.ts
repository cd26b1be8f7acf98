import { cpSync, readdirSync } from "node:fs";
import { join } from "node:path";
import { projectFolder } from "./projectFolder.js";
import { temporaryFolder } from "./temporaryFolder.js";

/** Entries of the project's top folder that are no part of the extension as it is shipped. */
const notShipped = new Set(["node_modules", "src", "test", "artefacts"]);

/**
 * Copies the built extension, as it is shipped, to a folder of its own. The editor takes whatever lies below the folder
 * of an extension in development for a part of it; below the project's lies the editor for the tests itself, with all
 * its themes and languages. And what works from the copy needs nothing that is not shipped.
 */
export function stageExtension(): { path: string; remove: () => void } {
  const project = projectFolder();
  const stage = temporaryFolder("extension");
  for (const entry of readdirSync(project)) {
    if (notShipped.has(entry) || entry.startsWith(".") || entry.endsWith(".vsix")) continue;
    cpSync(join(project, entry), join(stage.path, entry), { recursive: true });
  }
  return stage;
}
