import type { Run } from "../contract/findings.js";
import { formatQuantity } from "../quantity/formatNumber.js";
import { causeName } from "./causeName.js";
import { type Html, html, nothing } from "./html.js";
import { type Cell, factTable } from "./htmlTable.js";
import { percentText } from "./percentText.js";
import { printedLaw } from "./printedSpecies.js";
import { printedQuantity } from "./printedText.js";

type Fit = Run["fits"][number];

/** How sure: for each fit the budget of k as one bar, what the residuals say, how far the reaction was followed. */
export function runSure(run: Run): { gist: string | Html; body: Html } {
  const sure = run.fits.filter(({ parameters }) => parameters["k"] !== undefined);
  if (sure.length === 0) {
    return { gist: "", body: html`<p>No fit gave a rate constant, so nothing is known of its uncertainty.</p>` };
  }
  const shares = sure.flatMap(({ parameters: { k } }) =>
    k === undefined || k.u === null ? [] : [percentText(k.u / Math.abs(k.value))],
  );
  const gist = html`${shares.map((share, i) => html`${i === 0 ? "" : "; "}<i>k</i> to ${share}`)}`;
  return { gist, body: html`${run.fits.map((fit, index) => fitSure(fit, index + 1, run.fits.length > 1))}` };
}

function fitSure(fit: Fit, number: number, several: boolean): Html {
  const { k } = fit.parameters;
  if (k === undefined) return nothing;
  const rows: Cell[][] = [];
  const own = (u: number | null): string =>
    u === null ? "" : printedQuantity({ text: formatQuantity(Number(u.toPrecision(2)), null, k.unit), unit: k.unit });
  const u = html`<i>u</i>(<i>k</i>)`;
  if (k.u !== null) rows.push([u, `${own(k.u)}, ${uncertaintyWords(fit)}`]);
  if (k.u !== null && k.uCommon !== null && k.uCommon > 0) {
    // What cancels leaves a remainder of rounding, which is no finding.
    const common = k.uCommon > 1e-3 * k.u ? `common ${own(k.uCommon)}` : "common: under a thousandth of it";
    rows.push([html`${u} by kind`, `random ${own(k.uRandom)}, ${common}`]);
  }
  if (k.uCorrelated !== null) rows.push([html`${u}, errors correlated`, own(k.uCorrelated)]);
  if (fit.conversion !== null) rows.push(["followed to a conversion of", percentText(fit.conversion)]);
  if (fit.residual !== null) rows.push(["residual standard deviation", printedQuantity(fit.residual)]);
  if (fit.reducedChiSquare !== null) rows.push(["reduced χ²", fit.reducedChiSquare.toPrecision(3)]);
  for (const { name, text } of fit.tests) rows.push([name, text]);
  if (fit.correlation !== null)
    rows.push(["correlation of neighbours", fit.correlation.toFixed(2).replace("-", "\u2212")]);
  const head = several ? html`<h5>Fit ${number}: ${printedLaw(fit)}</h5>` : nothing;
  return html`${head}${budget(fit)}${factTable(`How sure fit ${number} is`, rows)}`;
}

function uncertaintyWords({ uKind, degreesOfFreedom, points }: Fit): string {
  const from = uKind === "scaled" ? "from the scatter of the residuals" : "from the stated uncertainty";
  const freedom = degreesOfFreedom === 1 ? "1 degree of freedom" : `${degreesOfFreedom} degrees of freedom`;
  return `${from}; ${points} readings, ${freedom}`;
}

/** The variance of k as one bar split by cause, and the same in words; the causes stand widest first. */
function budget({ budget }: Fit): Html {
  if (budget.length === 0) return nothing;
  const causes = [...budget].sort((a, b) => b.share - a.share);
  let left = 0;
  const bars = causes.map(({ kind, share }, index) => {
    const width = Math.max(0, 100 * share - (index < causes.length - 1 ? 0.4 : 0));
    const bar = html`<rect x="${left.toFixed(2)}" width="${width.toFixed(2)}" height="6" class="${kind}"/>`;
    left += 100 * share;
    return bar;
  });
  const items = causes.map(
    ({ source, kind, share }) =>
      html`<li><span class="sign ${kind}"></span>${causeName(source, kind)}: ${percentText(share)}</li>`,
  );
  const [first] = causes;
  const most =
    first === undefined || causes.length < 2 ? nothing : html`<p>Less of this would help most: ${first.source}.</p>`;
  return html`<p>The variance of <i>k</i> by cause:</p><svg class="budget" viewBox="0 0 100 6" preserveAspectRatio="none" aria-hidden="true">${bars}</svg><ul class="causes">${items}</ul>${most}`;
}
