import { spawnSync } from "node:child_process";
import { join } from "node:path";
import type { Description, Findings } from "../../src/contract/findings.js";
import { projectFolder } from "../editor/projectFolder.js";

/** What the built command line reports of a description. */
export function reportOf(path: string): Description {
  const command = join(projectFolder(), "dist", "ratewright.cjs");
  const { stdout, stderr } = spawnSync(process.execPath, [command, "report", "--json", path], { encoding: "utf8" });
  const findings: Findings = JSON.parse(stdout);
  const [description] = findings.descriptions;
  if (description === undefined) throw new Error(`the report says nothing of ${path}: ${stderr}`);
  return description;
}
