import type { Statement } from "../syntax.js";

/** All statements in the order of the text, each before the lines that belong to it. */
export function* everyStatement(statements: readonly Statement[]): Generator<Statement> {
  for (const statement of statements) {
    yield statement;
    yield* everyStatement(statement.children);
  }
}
