import type { Run } from "../contract/findings.js";
import { axisHtml, signalName } from "./axisText.js";
import { type Html, html, nothing } from "./html.js";
import { pictureContent } from "./pictureContent.js";
import { pictureKey } from "./pictureKey.js";
import { pictureTitle, pictureWords } from "./pictureWords.js";
import { plotPowers } from "./plotData.js";

/**
 * What was seen of one follow line, as a frame that a script draws in: the names of its axes, the key to its signs, the
 * picture in words, and what can be done with it. The data are those of `plotData`, by the same id.
 */
export function plotFigure(run: Run, follow: Run["follow"][number]): Html {
  const content = pictureContent(run, follow);
  if (content === null) return html`<p>There are no readings to draw.</p>`;
  const powers = plotPowers(run, follow);
  const signal = axisHtml({ ...signalName(follow, content.signalUnit), power: powers.signal });
  const time = axisHtml({ symbol: "t", of: "", unit: content.timeUnit, power: powers.time });
  const words = pictureWords(content);
  const window = run.fits.some((fit) => fit.follow === follow.id);
  return html`<figure data-figure="${follow.id}"><p class="axis signal" aria-hidden="true">${signal}</p><div class="plot" data-plot="${follow.id}" role="group" tabindex="0" aria-label="${pictureTitle(run, content)}. ${words} Arrow keys go from reading to reading; Enter opens the data file there."></div><p class="axis time" aria-hidden="true">${time}</p><p class="reading" data-reading="${follow.id}" aria-live="polite"></p>${window ? windowForm(follow.id, content.timeUnit) : nothing}<figcaption>${pictureKey(content)}</figcaption><details data-part="In words, ${follow.id}"><summary>The picture in words</summary><p>${words}</p></details></figure>`;
}

/** Two times and a button: what dragging over the picture fills in, and what the keyboard does without it. */
function windowForm(id: string, unit: string): Html {
  return html`<form class="window" data-window="${id}"><span>Fit from</span> <label><span class="unseen">first time, ${unit}</span><input name="from" inputmode="decimal" autocomplete="off" size="7"></label> <span>to</span> <label><span class="unseen">last time, ${unit}</span><input name="to" inputmode="decimal" autocomplete="off" size="7"></label> <span>${unit}</span> <button type="submit">Write the window line</button></form>`;
}
