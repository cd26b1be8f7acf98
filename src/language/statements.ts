import { type Fault, fault, type Span } from "../contract/problem.js";
import {
  date,
  declared,
  either,
  equation,
  formula,
  integer,
  keyword,
  number,
  optional,
  type Part,
  quantity,
  reference,
  species,
  string,
  unit,
  words,
} from "./shape.js";

/** Where a line may stand: directly in the file, or below a header. */
export type Owner = "file" | "run" | "data" | "column" | "follow" | "fit";

/**
 * How lines of one kind live together below one header: `once`; `many` (each counts for itself); keyed by a field,
 * so that a later run that starts like this one replaces it by that key; or as a `set` that is replaced as a whole.
 */
export type Repeat = { readonly repeat: "once" | "many" | "set" } | { readonly repeat: "key"; readonly field: string };

/** A usual way to get a line wrong: what stands behind the first word, and what to say of it. */
export interface Slip {
  readonly pattern: RegExp;
  readonly say: (rest: Span) => Fault;
}

/** One kind of line. This table is the language: parsing, ownership, `like`, suggestions and pages read it. */
export interface StatementRow {
  readonly head: string;
  readonly owners: readonly Owner[];
  /** the header this line opens, if it is one */
  readonly opens?: Owner;
  readonly repeats: Repeat;
  readonly parts: readonly Part[];
  /** slips so common that they have words of their own, tried when the line is broken */
  readonly slips?: readonly Slip[];
  readonly help: string;
  readonly example: string;
}

const once: Repeat = { repeat: "once" };
const many: Repeat = { repeat: "many" };
const set: Repeat = { repeat: "set" };
const key = (field: string): Repeat => ({ repeat: "key", field });

/** `first order`, `2nd-order`: the order as speech has it. */
export const orderInWords = /^(zero|zeroth|half|first|second|third|0th|1st|2nd|3rd)[- ]?order\b/i;

export const statements: readonly StatementRow[] = [
  {
    head: "ratewright",
    owners: ["file"],
    repeats: once,
    parts: [integer("version", "the version of the language, 1")],
    help: "The version of the language this description is written in. Optional; the first line.",
    example: "ratewright 1",
  },
  {
    head: "reaction",
    owners: ["file"],
    repeats: many,
    parts: [equation()],
    help: "The reaction. Rates and rate constants belong to this way of writing it. -> goes one way, <=> goes back too.",
    example: "reaction 2 H2O2(aq) -> 2 H2O(l) + O2(g)",
  },
  {
    head: "species",
    owners: ["file"],
    repeats: key("species"),
    parts: [declared("species"), optional(keyword("is"), formula())],
    help: "A substance that goes by a name. Without a formula the balance of its reactions is not checked.",
    example: "species EtOAc is C4H8O2",
  },
  {
    head: "run",
    owners: ["file"],
    opens: "run",
    repeats: key("run"),
    parts: [declared("run"), optional(keyword("like"), reference("run", "like")), optional(string("title", "a title"))],
    help: "One run: all lines below it, down to the next header. “like” starts from the lines of a run above.",
    example: 'run A "0.050 M iodide, 25 °C"',
  },
  {
    head: "date",
    owners: ["file", "run"],
    repeats: once,
    parts: [date()],
    help: "The day of the run, year first.",
    example: "date 2026-11-03",
  },
  {
    head: "note",
    owners: ["file", "run"],
    repeats: many,
    parts: [string("text", "the note")],
    help: "What somebody should know who reads this later.",
    example: 'note "stirred at 300 per minute"',
  },
  {
    head: "volume",
    owners: ["file", "run"],
    repeats: once,
    parts: [quantity("volume")],
    help: "The volume of the reacting mixture.",
    example: "volume 50.00 mL within 0.05 mL",
  },
  {
    head: "temperature",
    owners: ["file", "run"],
    repeats: once,
    parts: [quantity("temperature")],
    help: "The temperature of the reacting mixture.",
    example: "temperature 25.0(1) °C",
  },
  {
    head: "taken",
    owners: ["file", "run"],
    repeats: key("species"),
    parts: [
      species(),
      quantity("taken", "given"),
      optional(keyword("as"), either([words("role", "catalyst")], [words("role", "inert")], [words("role", "buffer")])),
    ],
    help: "What was put in: its concentration in the mixture, its amount or its mass.",
    example: "taken H2O2 0.100(2) mol/L",
  },
  {
    head: "data",
    owners: ["file", "run"],
    opens: "data",
    repeats: once,
    parts: [string("path", "the path of the data file")],
    help: "The data file of the run, relative to this description.",
    example: 'data "data/a.csv"',
  },
  {
    head: "delimiter",
    owners: ["data"],
    repeats: once,
    parts: [string("delimiter", "the separator of the cells")],
    help: "What stands between the cells of the data file, where detection is not enough.",
    example: 'delimiter ";"',
  },
  {
    head: "decimal",
    owners: ["data"],
    repeats: once,
    parts: [either([words("mark", "comma")], [words("mark", "point")])],
    help: "The decimal mark of the data file, where detection is not enough.",
    example: "decimal comma",
  },
  {
    head: "skip",
    owners: ["data"],
    repeats: once,
    parts: [integer("lines", "a number of lines"), keyword("lines")],
    help: "Lines that stand before the header row of the data file, where detection is not enough.",
    example: "skip 4 lines",
  },
  {
    head: "encoding",
    owners: ["data"],
    repeats: once,
    parts: [string("encoding", "the name of an encoding")],
    help: "The encoding of the data file, where detection is not enough.",
    example: 'encoding "windows-1252"',
  },
  {
    head: "column",
    owners: ["data"],
    opens: "column",
    repeats: key("column"),
    parts: [
      declared("column"),
      either([string("header", "the header cell of the column")], [integer("number", "the number of the column")]),
      optional(unit()),
    ],
    help: "A column of the data file, by its header cell or its number, with its unit where the header states none.",
    example: 'column gas "V / mL" mL',
  },
  {
    head: "random",
    owners: ["column"],
    repeats: once,
    parts: [quantity("uncertainty")],
    help: "The standard uncertainty of each reading of the column, independent from reading to reading.",
    example: "random 0.002 mol/L",
  },
  {
    head: "common",
    owners: ["column"],
    repeats: once,
    parts: [quantity("uncertainty")],
    help: "The standard uncertainty all readings of the column share: an offset, or with % a scale.",
    example: "common 1 %",
  },
  {
    head: "follow",
    owners: ["file", "run"],
    opens: "follow",
    repeats: key("column"),
    parts: [
      species(),
      keyword("as"),
      either([words("monitor", "concentration")]),
      keyword("from"),
      reference("column"),
    ],
    help: "Which species was followed, as which signal, from which column.",
    example: "follow H2O2 as concentration from c",
  },
  {
    head: "rate",
    owners: ["file", "run"],
    repeats: set,
    parts: [
      either(
        [words("kind", "initial")],
        [words("kind", "at"), quantity("time", "at")],
        [words("kind", "from"), quantity("time", "from"), keyword("to"), quantity("time", "to")],
      ),
    ],
    help: "A rate that is wanted: average between two times, at a time, or initial.",
    example: "rate from 0 s to 60 s",
  },
  {
    head: "fit",
    owners: ["file", "run"],
    opens: "fit",
    repeats: set,
    slips: [{ pattern: orderInWords, say: (rest) => fault("order-in-words", { example: "order 1 in A" }, rest) }],
    parts: [keyword("order"), number("order", "the order, a number"), keyword("in"), species()],
    help: "A rate law that is fitted to the signal.",
    example: "fit order 1 in H2O2",
  },
  {
    head: "window",
    owners: ["fit"],
    repeats: once,
    parts: [quantity("time", "from"), keyword("to"), quantity("time", "to")],
    help: "The time span whose readings the fit uses.",
    example: "window 5 s to 600 s",
  },
  {
    head: "start",
    owners: ["fit"],
    repeats: once,
    parts: [either([words("kind", "free")], [words("kind", "fixed"), optional(quantity("reading", "value"))])],
    help: "The signal at time zero: fitted, or fixed at a value or at what was taken.",
    example: "start fixed 0.100 mol/L",
  },
  {
    head: "infinity",
    owners: ["fit"],
    repeats: once,
    parts: [either([words("kind", "free")], [words("kind", "fixed"), optional(quantity("reading", "value"))])],
    help: "The signal when the reaction has come to its end: fitted, or fixed at a value or by stoichiometry.",
    example: "infinity free",
  },
];

export const statementByHead: ReadonlyMap<string, StatementRow> = new Map(statements.map((row) => [row.head, row]));

/** First words of the lines that may stand below a header, in the order of the table. */
export function headsBelow(owner: Owner): string[] {
  return statements.filter((row) => row.owners.includes(owner)).map((row) => row.head);
}
