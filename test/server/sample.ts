import { readFileSync } from "node:fs";
import { join } from "node:path";
import { projectFolder } from "../editor/projectFolder.js";

/** A file of the samples, as text. */
export function sample(path: string): string {
  return readFileSync(join(projectFolder(), "samples", path), "utf8");
}
