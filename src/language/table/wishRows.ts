import { fault } from "../../contract/problem.js";
import { either, keyword, number, oneOf, optional, orders, quantity, reference, species, words } from "../shape.js";
import { inRuns, type Owner, once, type StatementRow, set } from "./row.js";

/** `first order`, `2nd-order`: the order as speech has it. */
export const orderInWords = /^(zero|zeroth|half|first|second|third|0th|1st|2nd|3rd)[- ]?order\b/i;

const below: readonly Owner[] = ["fit"];

/** What is wanted of a run: rates and fits. */
export const wishRows: readonly StatementRow[] = [
  {
    head: "rate",
    owners: inRuns,
    repeats: set,
    parts: [
      either(
        [words("kind", "initial")],
        [words("kind", "at"), quantity("time", "at")],
        [words("kind", "from"), quantity("time", "from"), keyword("to"), quantity("time", "to")],
      ),
      optional(keyword("using"), reference("column", "using")),
    ],
    help: "A rate that is wanted: average between two times, at a time, or initial.",
    example: "rate from 0 s to 60 s",
  },
  {
    head: "fit",
    owners: inRuns,
    opens: "fit",
    repeats: set,
    slips: [{ pattern: orderInWords, say: (rest) => fault("order-in-words", { example: "order 1 in A" }, rest) }],
    parts: [
      either([orders()], [words("law", "saturation"), keyword("in"), species()]),
      optional(keyword("using"), reference("column", "using")),
    ],
    help: "A rate law that is fitted to the signal.",
    example: "fit order 1 in H2O2",
  },
  {
    head: "window",
    owners: below,
    repeats: once,
    parts: [quantity("time", "from"), keyword("to"), quantity("time", "to")],
    help: "The time span whose readings the fit uses.",
    example: "window 5 s to 600 s",
  },
  {
    head: "start",
    owners: below,
    repeats: once,
    parts: [either([words("kind", "free")], [words("kind", "fixed"), optional(quantity("reading", "value"))])],
    help: "The signal at time zero: fitted, or fixed at a value, at the stated reading or at what was taken.",
    example: "start fixed 0.100 mol/L",
  },
  {
    head: "infinity",
    owners: below,
    repeats: once,
    parts: [
      either(
        [words("kind", "free")],
        [words("kind", "measured")],
        [words("kind", "fixed"), optional(quantity("reading", "value"))],
      ),
    ],
    help: "The signal when the reaction has come to its end: fitted, fixed at a value or by stoichiometry, or a reading that counts with its uncertainty.",
    example: "infinity free",
  },
  {
    head: "excess",
    owners: below,
    repeats: once,
    parts: [species()],
    kept: true,
    help: "A species so much in excess that its concentration counts as constant.",
    example: "excess OH^-",
  },
  {
    head: "reversible",
    owners: below,
    repeats: once,
    parts: [either([words("kind", "free")], [words("kind", "K"), number("K", "a number, in powers of mol/L,")])],
    kept: true,
    help: "The reaction goes back: with a fitted position of equilibrium, or with its K in powers of mol/L.",
    example: "reversible K 4.2",
  },
  {
    head: "weights",
    owners: below,
    repeats: once,
    parts: [oneOf("kind", "constant", "stated", "replicates")],
    kept: true,
    help: "How readings are weighed.",
    example: "weights stated",
  },
  {
    head: "errors",
    owners: below,
    repeats: once,
    parts: [oneOf("kind", "independent", "correlated")],
    kept: true,
    help: "Whether the errors of neighbouring readings are independent.",
    example: "errors correlated",
  },
  {
    head: "robust",
    owners: below,
    repeats: once,
    parts: [],
    kept: true,
    help: "Readings far from the curve count less, and are named.",
    example: "robust",
  },
];
