import { method } from "../analysis/analyse.js";
import type { Description, Findings } from "../contract/findings.js";
import { version } from "../contract/version.js";

/** The findings of some descriptions, with the versions that made them. */
export function findingsOf(descriptions: readonly Description[]): Findings {
  return { ratewright: version, language: 1, method, descriptions: [...descriptions] };
}

/** The one JSON document of `--json`: the findings contract. */
export function findingsJson(descriptions: readonly Description[]): string {
  return `${JSON.stringify(findingsOf(descriptions), null, 2)}\n`;
}
