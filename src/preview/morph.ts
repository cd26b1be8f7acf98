/** Attributes by which a part of the page is known again when what stands around it changed. */
const keys = ["id", "data-part", "data-figure", "data-plot", "data-window", "data-reading"];

/**
 * Makes the children of `old` like those of `wanted`, touching only what differs, so that focus, selection, scrolling and
 * drawn plots stay. What a person opened or typed is theirs: the state of a folded part and of a field is left alone, and
 * so is what a script drew in a `data-plot` or said in a `data-reading`.
 */
export function morph(old: Element, wanted: Element): void {
  let at: ChildNode | null = old.firstChild;
  for (const next of [...wanted.childNodes]) {
    const match = matching(at, next);
    if (match === null) {
      old.insertBefore(next.cloneNode(true), at);
      continue;
    }
    while (at !== null && at !== match) {
      const gone: ChildNode = at;
      at = at.nextSibling;
      gone.remove();
    }
    at = match.nextSibling;
    if (match instanceof Element && next instanceof Element) morphElement(match, next);
    else if (match.nodeValue !== next.nodeValue) match.nodeValue = next.nodeValue;
  }
  while (at !== null) {
    const gone: ChildNode = at;
    at = at.nextSibling;
    gone.remove();
  }
}

/** The node from `at` on that is the same part: with a key wherever it stands, without one only in this place. */
function matching(at: ChildNode | null, next: ChildNode): ChildNode | null {
  const key = keyOf(next);
  if (key === null) return at !== null && at.nodeName === next.nodeName && keyOf(at) === null ? at : null;
  for (let node = at; node !== null; node = node.nextSibling) if (keyOf(node) === key) return node;
  return null;
}

function keyOf(node: Node): string | null {
  if (!(node instanceof Element)) return null;
  const name = keys.find((one) => node.hasAttribute(one));
  return name === undefined ? null : `${node.nodeName} ${name} ${node.getAttribute(name)}`;
}

function morphElement(old: Element, next: Element): void {
  for (const { name } of [...old.attributes]) {
    if (!next.hasAttribute(name) && name !== "open") old.removeAttribute(name);
  }
  for (const { name, value } of [...next.attributes]) {
    if (name !== "open" && old.getAttribute(name) !== value) old.setAttribute(name, value);
  }
  if (!old.hasAttribute("data-plot") && !old.hasAttribute("data-reading")) morph(old, next);
}
