import type { Session } from "./session.js";

/** Where a text stands on the screen, px from the window's upper left corner. */
export interface TextPlace {
  left: number;
  top: number;
  width: number;
  height: number;
}

/**
 * Finds the text in the visible lines of the active editor; it may be coloured in pieces but must lie within one line.
 * `occurrence` counts from 1. Refuses where it is not on screen.
 */
export async function textPlace({ page }: Session, text: string, occurrence = 1): Promise<TextPlace> {
  const lines = page.locator(".editor-group-container.active .monaco-editor .view-lines .view-line");
  await lines.first().waitFor();
  const place = await lines.evaluateAll(
    (elements, [wanted, nth]) => {
      // On screen the editor writes spaces as no-break spaces, and it keeps its lines in no order.
      const byHeight = [...elements].sort((a, b) => a.getBoundingClientRect().top - b.getBoundingClientRect().top);
      let seen = 0;
      for (const line of byHeight) {
        const walker = document.createTreeWalker(line, NodeFilter.SHOW_TEXT);
        const pieces: { node: Node; start: number }[] = [];
        let whole = "";
        for (let node = walker.nextNode(); node !== null; node = walker.nextNode()) {
          pieces.push({ node, start: whole.length });
          whole += (node.textContent ?? "").replaceAll("\u00a0", " ");
        }
        for (let at = whole.indexOf(wanted); at >= 0; at = whole.indexOf(wanted, at + 1)) {
          if (++seen < nth) continue;
          const pieceAt = (offset: number) => pieces.filter(({ start }) => start <= offset).at(-1);
          const first = pieceAt(at);
          const last = pieceAt(at + wanted.length - 1);
          if (first === undefined || last === undefined) continue;
          const range = document.createRange();
          range.setStart(first.node, at - first.start);
          range.setEnd(last.node, at + wanted.length - last.start);
          const { left, top, width, height } = range.getBoundingClientRect();
          return { left, top, width, height };
        }
      }
      return null;
    },
    [text, occurrence] as const,
  );
  if (place === null) throw new Error(`not on screen in the editor: ${text} (occurrence ${occurrence})`);
  return place;
}
