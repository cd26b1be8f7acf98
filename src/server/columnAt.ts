import type { Span } from "../contract/problem.js";
import type { Bound } from "../language/bind/bind.js";
import { spanOf } from "../language/fields.js";
import type { Statement } from "../language/syntax.js";

/** A column that is meant at a place of the text: its name, the runs it belongs to, the words that mean it. */
export interface ColumnAt {
  readonly name: string;
  /** in the order of the text; more than one where runs share the line */
  readonly runs: readonly string[];
  readonly span: Span;
}

/** The column meant at an offset: by its name, wherever that stands, or anywhere on the line that declares it. */
export function columnAt(bound: Bound, offset: number): ColumnAt | null {
  const holds = ({ start, end }: Span): boolean => start <= offset && offset <= end;
  const named = bound.uses.filter(({ kind, origin }) => kind === "column" && holds(origin));
  const line = columnLineAt(bound.parsed.statements, holds);
  const lineSpan = line === null ? null : spanOf(line);
  const declared = bound.uses.filter(({ kind, declares, origin }) => {
    return (
      kind === "column" && declares && lineSpan !== null && origin.start >= lineSpan.start && origin.end <= lineSpan.end
    );
  });
  const uses = named.length > 0 ? named : declared;
  const first = uses[0];
  if (first === undefined) return null;
  const runs = [...new Set(uses.flatMap(({ run }) => run ?? []))];
  const span = named.length > 0 || lineSpan === null ? first.origin : lineSpan;
  return { name: first.name, runs, span: { start: span.start, end: span.end } };
}

function columnLineAt(statements: readonly Statement[], holds: (span: Span) => boolean): Statement | null {
  for (const statement of statements) {
    if (statement.line.row?.head === "column" && holds(spanOf(statement))) return statement;
    const inner = columnLineAt(statement.children, holds);
    if (inner !== null) return inner;
  }
  return null;
}
