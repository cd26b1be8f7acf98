import assert from "node:assert/strict";

/** HTML elements that have no end. */
const single = new Set(["meta", "!doctype"]);

/**
 * The names of all elements of a page or picture in order, after a check that each tag ends where it should, holds only
 * attributes in double quotes, and that no bare `<` or `>` stands in the text.
 */
export function elementsOf(markup: string): string[] {
  const open: string[] = [];
  const names: string[] = [];
  const tag = /<(\/?)([A-Za-z!][A-Za-z0-9]*)((?:\s+[A-Za-z:-]+(?:="[^"<>]*")?)*)\s*(\/?)>/g;
  let end = 0;
  for (const found of markup.matchAll(tag)) {
    const text = markup.slice(end, found.index);
    if (open.at(-1) !== "style") assert.doesNotMatch(text, /[<>]/, `bare bracket in: ${text.slice(0, 200)}`);
    end = found.index + found[0].length;
    const name = (found[2] ?? "").toLowerCase();
    if (found[1] === "/") assert.equal(open.pop(), name, `wrong end tag near ${markup.slice(end - 80, end)}`);
    else {
      names.push(name);
      if (found[4] !== "/" && !single.has(name)) open.push(name);
    }
  }
  assert.doesNotMatch(markup.slice(end), /[<>]/);
  assert.deepEqual(open, []);
  return names;
}

/** Names of all attributes of a page or picture. */
export function attributesOf(markup: string): Set<string> {
  const found = new Set<string>();
  for (const [tag] of markup.matchAll(/<[A-Za-z][^>]*>/g)) {
    for (const [, name = ""] of tag.matchAll(/\s([A-Za-z:-]+)=/g)) found.add(name.toLowerCase());
  }
  return found;
}
