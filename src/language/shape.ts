import type { QuantityKind } from "./quantityKinds.js";

/** Kinds of names a line declares or refers to. */
export type NameKind = "run" | "column" | "species" | "reaction";

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
  | { readonly part: "equation"; readonly label: string }
  | { readonly part: "string"; readonly label: string; readonly what: string }
  | { readonly part: "date"; readonly label: string }
  | { readonly part: "integer"; readonly label: string; readonly what: string }
  | { readonly part: "number"; readonly label: string; readonly what: string }
  | { readonly part: "unit"; readonly label: string }
  | { readonly part: "quantity"; readonly label: string; readonly kind: QuantityKind }
  | { readonly part: "optional"; readonly parts: readonly Part[] }
  | { readonly part: "either"; readonly options: readonly (readonly Part[])[] };

export const keyword = (word: string): Part => ({ part: "keyword", word });
export const words = (label: string, phrase: string): Part => ({ part: "words", label, phrase });
export const declared = (of: NameKind, label: string = of): Part => ({ part: "name", label, of, declares: true });
export const reference = (of: NameKind, label: string = of): Part => ({ part: "name", label, of, declares: false });
export const species = (label = "species"): Part => ({ part: "species", label });
export const formula = (label = "formula"): Part => ({ part: "formula", label });
export const equation = (label = "equation"): Part => ({ part: "equation", label });
export const string = (label: string, what: string): Part => ({ part: "string", label, what });
export const date = (label = "date"): Part => ({ part: "date", label });
export const integer = (label: string, what: string): Part => ({ part: "integer", label, what });
export const number = (label: string, what: string): Part => ({ part: "number", label, what });
export const unit = (label = "unit"): Part => ({ part: "unit", label });
export const quantity = (kind: QuantityKind, label: string = kind): Part => ({ part: "quantity", label, kind });
export const optional = (...parts: Part[]): Part => ({ part: "optional", parts });
export const either = (...options: Part[][]): Part => ({ part: "either", options });
