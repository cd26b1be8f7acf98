import type { Diagnostic, Run } from "../contract/findings.js";
import { formatQuantity } from "../quantity/formatNumber.js";
import { escapeMarkdown, markdownPicture } from "./escape.js";
import { firstSentence } from "./firstSentence.js";
import { paletteOf, type Theme } from "./palette.js";
import { hoverStyle, runPicture } from "./picture.js";
import { pictureContent } from "./pictureContent.js";
import { pictureWords } from "./pictureWords.js";
import { rateName } from "./rateName.js";
import { readingsUsed } from "./readingsUsed.js";

type Follow = Run["follow"][number];

/**
 * What resting on a column shows, as Markdown in six lines: what is followed, every fit with k and its half-life in
 * the order of the text, its picture, the rates, the readings used, what to watch. `column` is the name of a column of
 * the run, or the id of one of its follow lines; for a column that nothing follows, such as that of the times, the span
 * of the readings. The findings must hold curves for the picture. `k` stands as `parameters.k.text` has it.
 */
export function columnHover(
  run: Run,
  column: string,
  theme: Theme,
  /** of the description; those of this run are shown, in their first words */
  diagnostics: readonly Diagnostic[] = [],
): string {
  const followed = run.follow.filter((follow) => follow.column === column || follow.id === column);
  const lines =
    followed.length === 0 ? [besideText(run, column)] : followed.flatMap((follow) => followLines(run, follow, theme));
  return [...lines, ...watchLines(run, diagnostics)].join("\n\n");
}

function followLines(run: Run, follow: Follow, theme: Theme): string[] {
  const { species, monitor, column } = follow;
  const head = `**${escapeMarkdown(column)}** · ${escapeMarkdown(`${species} followed as ${monitor}, run ${run.name}`)}`;
  const style = hoverStyle(paletteOf(theme));
  const picture = runPicture(run, follow, style);
  const alternative = pictureContent(run, follow);
  const fits = run.fits.filter((fit) => fit.follow === follow.id).map((fit) => fitLine(fit));
  // Rates are those of the first signal of a run.
  const rates = run.follow[0] === follow ? run.rates.map((rate, index) => rateWords(rate, index + 1)) : [];
  return [
    head,
    // The editor cuts a hover off below: k stands above the picture.
    ...fits,
    ...(picture === null || alternative === null
      ? []
      : [markdownPicture(pictureWords(alternative), picture, style.width)]),
    ...(rates.length === 0 ? [] : [`Rate of reaction: ${rates.join("; ")}`]),
    `Readings: ${escapeMarkdown(readingsUsed(follow))}`,
  ];
}

function fitLine(fit: Run["fits"][number]): string {
  const law = `**${escapeMarkdown(fit.law)}**: `;
  const k = fit.parameters["k"];
  if (k === undefined) return `${law}${escapeMarkdown(fit.verdict === "" ? "no rate constant" : fit.verdict)}`;
  const { halfLife } = fit;
  const half = halfLife === null ? "" : `, half-life of ${halfLife.species} ${halfLife.text}`;
  return `${law}*k* = ${escapeMarkdown(`${k.text}${half}`)}`;
}

function rateWords(rate: Run["rates"][number], number: number): string {
  return escapeMarkdown(`(${number}) ${rateName(rate)} ${rate.rate?.text ?? "no rate"}`);
}

/** A column that is not followed itself: what stands beside it, and over which span of time. */
function besideText(run: Run, column: string): string {
  const isTime = run.follow.some(({ timeColumn }) => timeColumn === column);
  const what = isTime ? "time" : "not followed itself";
  const head = `**${escapeMarkdown(column)}** · ${escapeMarkdown(`${what}, run ${run.name}`)}`;
  const beside = run.follow.map((follow) => {
    const times = (follow.time?.values ?? []).filter((time) => time !== null);
    const [first, last] = [times[0], times[times.length - 1]];
    const span =
      first === undefined || last === undefined
        ? ""
        : `, time from ${[first, last].map((time) => formatQuantity(time, null, follow.time?.unit ?? "")).join(" to ")}`;
    return `Readings of ${escapeMarkdown(`${follow.column}: ${readingsUsed(follow)}${span}`)}`;
  });
  return [head, ...beside].join("\n\n");
}

/** What is wrong or doubtful in the run, each in its first sentence. */
function watchLines(run: Run, diagnostics: readonly Diagnostic[]): string[] {
  const found = diagnostics.filter(
    ({ item, severity }) =>
      severity !== "information" && item !== null && (item === run.id || item.startsWith(`${run.id}/`)),
  );
  const sentences = [...new Set(found.map(({ message }) => escapeMarkdown(firstSentence(message))))];
  return sentences.length === 0 ? [] : [`What to watch: ${sentences.join(" · ")}`];
}
