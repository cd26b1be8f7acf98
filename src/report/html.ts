import { escapeHtml } from "./escape.js";

/** Markup that is ready to stand in a page. Only `html` and `readyMarkup` make it, so that no text gets there unescaped. */
export interface Html {
  readonly markup: string;
}

/**
 * Markup with texts put in: strings and numbers are escaped, as element content or as an attribute value in quotes;
 * other markup stands as it is.
 */
export function html(
  parts: TemplateStringsArray,
  ...values: readonly (string | number | Html | readonly Html[])[]
): Html {
  const filled = parts.map((part, index) => part + (index < values.length ? markupOf(values[index] ?? "") : ""));
  return { markup: filled.join("") };
}

/** Markup that another part of this room has made and escaped itself, such as a picture. */
export function readyMarkup(markup: string): Html {
  return { markup };
}

/** Nothing at all. */
export const nothing: Html = { markup: "" };

function markupOf(value: string | number | Html | readonly Html[]): string {
  if (typeof value === "string") return escapeHtml(value);
  if (typeof value === "number") return escapeHtml(String(value));
  return "markup" in value ? value.markup : value.map(({ markup }) => markup).join("");
}
