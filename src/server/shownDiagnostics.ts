import type { TextDocument } from "vscode-languageserver-textdocument";
import type { Description, Diagnostic } from "../contract/findings.js";
import type { Bound } from "../language/bind/bind.js";
import { diagnosticsOf } from "../workspace/diagnostics.js";
import { movedNotes } from "./movedNotes.js";

/** What is shown to be wrong with each open description at this moment. */
export interface ShownDiagnostics {
  /** A text as it stands now: its own problems at once, and of what data and fits showed before all that still applies. */
  text(open: TextDocument, bound: Bound): readonly Diagnostic[];
  /** Findings of that same text. */
  findings(open: TextDocument, bound: Bound, description: Description): readonly Diagnostic[];
  /** What was shown last; it belongs to the text as it stands. */
  current(uri: string): readonly Diagnostic[];
  close(uri: string): void;
}

interface Shown {
  readonly all: readonly Diagnostic[];
  /** what only data and fits tell, placed in `text` */
  readonly notes: readonly Diagnostic[];
  readonly text: string;
}

export function createShownDiagnostics(): ShownDiagnostics {
  const shown = new Map<string, Shown>();
  return {
    text(open, bound) {
      const before = shown.get(open.uri);
      const now = open.getText();
      // Step by step, so that a change here and one there each move what lies behind them.
      const notes = before === undefined ? [] : movedNotes(before.notes, before.text, now);
      const all = [...diagnosticsOf(bound, []), ...notes].sort(byPlace);
      shown.set(open.uri, { all, notes, text: now });
      return all;
    },
    findings(open, bound, { diagnostics }) {
      const ofText = new Set(diagnosticsOf(bound, []).map(key));
      const notes = diagnostics.filter((diagnostic) => !ofText.has(key(diagnostic)));
      shown.set(open.uri, { all: diagnostics, notes, text: open.getText() });
      return diagnostics;
    },
    current: (uri) => shown.get(uri)?.all ?? [],
    close: (uri) => void shown.delete(uri),
  };
}

function key({ code, line, column, endLine, endColumn, message, item }: Diagnostic): string {
  return JSON.stringify([code, line, column, endLine, endColumn, message, item]);
}

function byPlace(a: Diagnostic, b: Diagnostic): number {
  return a.line - b.line || a.column - b.column;
}
