import { method } from "../analysis/analyse.js";
import type { Description, Findings } from "../contract/findings.js";
import { version } from "../contract/version.js";

/** The one JSON document of `--json`: the findings contract. */
export function findingsJson(descriptions: readonly Description[]): string {
  const findings: Findings = { ratewright: version, language: 1, method, descriptions: [...descriptions] };
  return `${JSON.stringify(findings, null, 2)}\n`;
}
