import { existsSync, readFileSync } from "node:fs";
import { dirname, join } from "node:path";
import { fileURLToPath } from "node:url";

/** The project's top folder: the nearest one above this module, bundled or not, whose package file bears its name. */
export function projectFolder(): string {
  for (let folder = dirname(fileURLToPath(import.meta.url)); ; folder = dirname(folder)) {
    const file = join(folder, "package.json");
    if (existsSync(file)) {
      const manifest: { name?: string } = JSON.parse(readFileSync(file, "utf8"));
      if (manifest.name === "ratewright") return folder;
    }
    if (dirname(folder) === folder) throw new Error("no folder above this module holds the project's package.json");
  }
}
