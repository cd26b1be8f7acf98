import type { Description, Run } from "../contract/findings.js";
import { type Html, html, nothing } from "./html.js";
import { lineCell } from "./htmlTable.js";
import { runDone } from "./runDone.js";
import { runFollows } from "./runFollows.js";
import { type Figure, runSeen } from "./runSeen.js";
import { runSure } from "./runSure.js";
import { belongsTo, runWatch } from "./runWatch.js";

/** One run as an argument that reads downwards; `figure` draws what was seen of a follow line. */
export function runPart(run: Run, { diagnostics }: Description, figure: Figure): Html {
  const title = run.title === null ? "" : `: ${run.title}`;
  const own = diagnostics.filter((diagnostic) => belongsTo(run, diagnostic));
  return html`<section><h3>Run ${run.name}${title} ${lineCell(run)}</h3>
${part("What was done", runDone(run))}
${part("What was seen", runSeen(run, figure))}
${part("What follows", runFollows(run))}
${part("How sure", runSure(run))}
${part("What to watch", runWatch(run, own))}
</section>`;
}

/** One step of the argument; folded, its gist is the one line left. */
function part(name: string, { gist, body }: { gist: string | Html; body: Html }): Html {
  const line =
    gist === "" || (typeof gist === "object" && gist.markup === "")
      ? nothing
      : html` <span class="gist">${gist}</span>`;
  return html`<details open data-part="${name}"><summary><h4>${name}</h4>${line}</summary>${body}</details>`;
}
