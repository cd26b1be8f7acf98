/**
 * The one place that makes text from descriptions and data files safe to stand in HTML, SVG and Markdown. Everything
 * the report room prints goes through it.
 */

/** What no text may carry into a page: control signs, halves of a pair, signs that turn the direction of reading. */
const unfit = /[^\P{Cc}\t\n\r]|\p{Cs}|[\u200e\u200f\u202a-\u202e\u2066-\u2069\ufffe\uffff]/gu;

/** The text with every sign that is unfit for a page shown as the replacement sign U+FFFD; not escaped. */
function fitText(text: string): string {
  return text.replace(unfit, "\ufffd");
}

const entities: Readonly<Record<string, string>> = {
  "&": "&amp;",
  "<": "&lt;",
  ">": "&gt;",
  '"': "&quot;",
  "'": "&#39;",
  "`": "&#96;",
};

/** Text for the content of an HTML or SVG element and for an attribute value in quotes of either kind. */
export function escapeHtml(text: string): string {
  return fitText(text).replace(/[&<>"'`]/g, (sign) => entities[sign] ?? sign);
}

/**
 * Text within a line of Markdown: nothing in it is markup, a link, an image, a table bar, an HTML tag or an icon, and
 * line breaks are spaces. A line does not begin with it, since at the start of a line digits and dashes make lists. Round
 * brackets stay as they are, so that `5.502(73)e-4 min^-1` reads the same in the source; without square brackets they
 * make no link.
 */
export function escapeMarkdown(text: string): string {
  return fitText(text)
    .replace(/\s+/g, " ")
    .trim()
    .replace(/[\\`*_{}[\]|~!]/g, (sign) => `\\${sign}`)
    .replace(/[&<>$@#]/g, (sign) => `&#${sign.charCodeAt(0)};`)
    .replace(/:(?=\/\/)/g, "&#58;")
    .replace(/\b(www)\./gi, "$1&#46;");
}

/**
 * An SVG picture as a Markdown image. The picture travels in base64, whose signs mean nothing in Markdown.
 * `width` in pixels is the hint that the editor's hover reads.
 */
export function markdownPicture(alternative: string, svg: string, width: number): string {
  return `![${escapeMarkdown(alternative)}](data:image/svg+xml;base64,${base64(svg)}|width=${Math.round(width)})`;
}

/** UTF-8 bytes of a text in base64 (RFC 4648, section 4). */
function base64(text: string): string {
  let bytes = "";
  for (const byte of new TextEncoder().encode(text)) bytes += String.fromCharCode(byte);
  return btoa(bytes);
}
