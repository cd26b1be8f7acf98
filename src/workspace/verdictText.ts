import { messageOf } from "../contract/words.js";
import type { Verdict } from "./verify.js";

/**
 * A verdict in lines, each thing that moved on one of its own; none where nothing moved. `description` and `record` are
 * the names shown, `write` is how the record is written from here.
 */
export function verdictLines(verdict: Verdict, description: string, record: string, write: string): string[] {
  switch (verdict.kind) {
    case "none":
      return [`${description}: there is no record yet; ${write} writes it.`];
    case "unreadable":
      return [`${record}: ${messageOf(verdict.problem)}`];
    case "same":
      return [];
    case "moved":
      return [`${description}: not as recorded.`, ...verdict.moved.map(({ text }) => `  ${text}`)];
  }
}
