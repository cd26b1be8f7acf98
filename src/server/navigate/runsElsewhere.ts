import type { Origin } from "../../contract/problem.js";
import { resolveUri } from "../../data/resolve.js";
import type { Bound } from "../../language/bind/bind.js";
import { itemsOf } from "../../language/fields.js";
import { everyStatement } from "../../language/navigate/everyStatement.js";

/** A run of another description, as `path:NAME` names it. */
export interface RunElsewhere {
  /** the description it belongs to */
  readonly uri: string;
  readonly name: string;
  /** path and name, without quotes */
  readonly origin: Origin;
  /** the name alone */
  readonly nameOrigin: Origin;
}

/** Every run of another description that this one names. */
export function runsElsewhere({ parsed }: Bound): RunElsewhere[] {
  const { uri } = parsed;
  const found: RunElsewhere[] = [];
  for (const statement of everyStatement(parsed.statements)) {
    for (const { text, span } of itemsOf(statement, "runs")) {
      const [, path, name] = /^(.+\.raterun):([^:/\\]+)$/.exec(text) ?? [];
      const place = path === undefined ? null : resolveUri(uri, path);
      if (name === undefined || place?.kind !== "uri") continue;
      const start = statement.offset + span.start + (span.end - span.start > text.length ? 1 : 0);
      const end = start + text.length;
      const nameOrigin = { uri, start: end - name.length, end };
      found.push({ uri: place.uri, name, origin: { uri, start, end }, nameOrigin });
    }
  }
  return found;
}
