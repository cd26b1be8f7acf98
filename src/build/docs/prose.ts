/** Sentences of the catalogue and the tables as Markdown: only what would turn into markup is escaped. */
export function prose(text: string): string {
  return text.replace(/[\\`*_[\]|]|<(?=[a-z/!])/gi, (sign) => (sign === "<" ? "&lt;" : `\\${sign}`));
}

/** A text in a block of its own, as it stands. */
export function fenced(language: string, text: string): string {
  return `\`\`\`${language}\n${text.endsWith("\n") || text === "" ? text : `${text}\n`}\`\`\``;
}

/** Words as they stand in a text, in a line of prose. */
export function code(text: string): string {
  return text.includes("`") ? `\`\` ${text} \`\`` : `\`${text}\``;
}

/** The address of a heading, as Markdown viewers make it. */
export function anchor(heading: string): string {
  return heading
    .toLowerCase()
    .replace(/[^\p{L}\p{N}_ -]/gu, "")
    .replaceAll(" ", "-");
}

/** First word with a capital. */
export function capital(text: string): string {
  return text.slice(0, 1).toUpperCase() + text.slice(1);
}

/** Says in the page's source where it comes from; no reader of the page sees it. */
export const generated = "<!-- Written by node src/build/docs.mjs; changes belong into what it is made from. -->";

/** A page of blocks with a blank line between. */
export function page(...blocks: readonly (string | readonly string[])[]): string {
  return `${blocks
    .flat()
    .filter((block) => block !== "")
    .join("\n\n")}\n`;
}
