import type { Run } from "../contract/findings.js";
import { type Html, html, readyMarkup } from "./html.js";
import { pagePalette } from "./palette.js";
import { reportStyle, runPicture } from "./picture.js";
import { pictureContent } from "./pictureContent.js";
import { pictureKey } from "./pictureKey.js";

/** What was seen of one follow line, as a picture that needs no script, and the key to its signs. */
export function reportFigure(run: Run, follow: Run["follow"][number]): Html {
  const content = pictureContent(run, follow);
  const picture = runPicture(run, follow, reportStyle(pagePalette));
  if (content === null || picture === null) return html`<p>There are no readings to draw.</p>`;
  return html`<figure>${readyMarkup(picture)}<figcaption>${pictureKey(content)}</figcaption></figure>`;
}
