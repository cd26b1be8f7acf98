import type { QuantityKind } from "./quantityKinds.js";

/** Kinds of names a line declares or refers to. */
export type NameKind = "run" | "column" | "species" | "reaction" | "calibration" | "series" | "mechanism" | "step";

/**
 * What stands on a line behind its first word. One interpreter reads a line by its shape; completion, hover, the
 * highlighting grammar and the reference page read the same data.
 */
export type Part =
  | { readonly part: "keyword"; readonly word: string }
  | { readonly part: "words"; readonly label: string; readonly phrase: string }
  | { readonly part: "name"; readonly label: string; readonly of: NameKind; readonly declares: boolean }
  | { readonly part: "species"; readonly label: string }
  | { readonly part: "formula"; readonly label: string }
  | { readonly part: "charge"; readonly label: string }
  | { readonly part: "equation"; readonly label: string }
  | { readonly part: "string"; readonly label: string; readonly what: string }
  | { readonly part: "date"; readonly label: string }
  | { readonly part: "integer"; readonly label: string; readonly what: string }
  | { readonly part: "number"; readonly label: string; readonly what: string }
  | { readonly part: "unit"; readonly label: string }
  /** a quantity, or in a table of runs `from "header"` */
  | { readonly part: "quantity"; readonly label: string; readonly kind: QuantityKind }
  /** a run by its name, of this file or as `path:NAME`, or files by a pattern in quotes */
  | { readonly part: "run reference"; readonly label: string }
  /** `order 1 in A`, more of them joined by a comma, `, then` or `beside` */
  | { readonly part: "orders"; readonly label: string }
  /** parts of one kind with commas between */
  | { readonly part: "list"; readonly label: string; readonly of: Part }
  | { readonly part: "optional"; readonly parts: readonly Part[] }
  | { readonly part: "either"; readonly options: readonly (readonly Part[])[] }
  /** any of the options, in any order, each at most once */
  | { readonly part: "any"; readonly options: readonly (readonly Part[])[] };

export const keyword = (word: string): Part => ({ part: "keyword", word });
export const words = (label: string, phrase: string): Part => ({ part: "words", label, phrase });
export const declared = (of: NameKind, label: string = of): Part => ({ part: "name", label, of, declares: true });
export const reference = (of: NameKind, label: string = of): Part => ({ part: "name", label, of, declares: false });
export const species = (label = "species"): Part => ({ part: "species", label });
export const formula = (label = "formula"): Part => ({ part: "formula", label });
export const charge = (label = "charge"): Part => ({ part: "charge", label });
export const equation = (label = "equation"): Part => ({ part: "equation", label });
export const string = (label: string, what: string): Part => ({ part: "string", label, what });
export const date = (label = "date"): Part => ({ part: "date", label });
export const integer = (label: string, what: string): Part => ({ part: "integer", label, what });
export const number = (label: string, what: string): Part => ({ part: "number", label, what });
export const unit = (label = "unit"): Part => ({ part: "unit", label });
export const quantity = (kind: QuantityKind, label: string = kind): Part => ({ part: "quantity", label, kind });
export const runReference = (label = "run"): Part => ({ part: "run reference", label });
export const orders = (label = "orders"): Part => ({ part: "orders", label });
export const list = (label: string, of: Part): Part => ({ part: "list", label, of });
export const optional = (...parts: Part[]): Part => ({ part: "optional", parts });
export const either = (...options: Part[][]): Part => ({ part: "either", options });
export const inAnyOrder = (...options: Part[][]): Part => ({ part: "any", options });
/** One of several fixed phrases. */
export const oneOf = (label: string, ...phrases: string[]): Part =>
  either(...phrases.map((phrase) => [words(label, phrase)]));
