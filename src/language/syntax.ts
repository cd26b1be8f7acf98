import type { Fault, Span } from "../contract/problem.js";
import type { Quantity } from "../quantity/quantity.js";
import type { Unit } from "../quantity/unit.js";
import type { Part } from "./shape.js";
import type { Owner, StatementRow } from "./statements.js";

/** What a part of a line held; spans count from the start of the line. */
export type Field = { readonly text: string; readonly span: Span } & (
  | { readonly kind: "text" }
  | { readonly kind: "number"; readonly value: number }
  | { readonly kind: "unit"; readonly unit: Unit }
  | {
      readonly kind: "quantity";
      readonly quantity: Quantity;
      readonly unitSpan: Span | null;
      /** what a share is a share of: `30 % by mass` */
      readonly basis: "mass" | "amount" | "volume" | null;
    }
  /** `from "header"`: the value stands in a column of a table of runs */
  | { readonly kind: "header"; readonly header: string }
  | { readonly kind: "list"; readonly items: readonly Field[] }
  | { readonly kind: "orders"; readonly items: readonly OrderTerm[] }
);

/** One `order 1 in A` of a rate law, and how it is joined to the one before. */
export interface OrderTerm {
  readonly joined: "first" | "and" | "then" | "beside";
  readonly order: number | "free";
  readonly species: { readonly text: string; readonly span: Span };
}

/** One statement of a line. It does not know where its line stands, so the same line is read once however often. */
export interface LineStatement {
  /** null where the first word is not known */
  readonly row: StatementRow | null;
  readonly head: { readonly text: string } & Span;
  readonly fields: ReadonlyMap<string, Field>;
  readonly span: Span;
  /** the first syntax fault; where there is one the statement is kept but means nothing */
  readonly fault: Fault | null;
}

/** A line by itself: usually one statement, more where a line break is missing, none on an empty one. */
export interface ParsedLine {
  readonly statements: readonly LineStatement[];
  /** what is wrong with its syntax, once a line */
  readonly fault: Fault | null;
  /** what could have come next at the end of the line */
  readonly wanted: readonly Part[];
}

/** A statement in its file, with the lines that belong to it. */
export interface Statement {
  readonly line: LineStatement;
  /** offset of its line in the text */
  readonly offset: number;
  readonly owner: Owner;
  readonly children: Statement[];
}
