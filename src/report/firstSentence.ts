/** A message up to the end of its first sentence, which says what is wrong. */
export function firstSentence(message: string): string {
  return /^.*?[.?!](?=\s|$)/s.exec(message.trim())?.[0] ?? message.trim();
}
