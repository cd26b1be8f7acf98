/** The reasons for leaving readings out, each once, in quotes: “bubble”, “lamp changed”. */
export function leftOutReasons(why: readonly string[]): string {
  return [...new Set(why)]
    .filter((reason) => reason !== "")
    .map((reason) => `“${reason}”`)
    .join(", ");
}
