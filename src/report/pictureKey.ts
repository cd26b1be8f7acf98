import { leftOutReasons } from "./leftOutReasons.js";
import { type PictureContent, residualsOf } from "./pictureContent.js";
import { printedLaw } from "./printedSpecies.js";

const dashWords = ["unbroken", "broken", "dotted", "dash-dotted"];

/** What the signs of the picture stand for, told by their shape. */
export function pictureKey(content: PictureContent): string {
  const { readings, thinned, fits, rates, follow } = content;
  const words = [thinned ? "Ribbon: the readings, from lowest to highest at each time." : "Dots: readings."];
  if (readings.some(({ used }) => !used)) {
    words.push(`${thinned ? "Paler" : "Hollow"}: outside the window, used by no fit.`);
  }
  const { leftOut } = follow;
  if (leftOut !== undefined) {
    const why = leftOutReasons(leftOut.why);
    words.push(`Crossed: left out by the description${why === "" ? "" : `, because of ${why}`}.`);
  }
  for (const [order, { number, fit }] of fits.entries()) {
    const dash = dashWords[order % dashWords.length] ?? "";
    words.push(`${dash[0]?.toUpperCase()}${dash.slice(1)} curve: fit ${number}, ${printedLaw(fit)}.`);
  }
  if (fits.length > 0) words.push(`Shaded: ${fits.length === 1 ? "its 95 % band" : "their 95 % bands"}.`);
  const numbers = (average: boolean) =>
    rates.filter(({ rate }) => (rate.kind === "average") === average).map(({ number }) => number);
  const [chords, tangents] = [numbers(true), numbers(false)];
  if (chords.length > 0) words.push(`Dashed between bars: ${ofRates("chord", chords)}.`);
  if (tangents.length > 0) words.push(`Through a diamond: ${ofRates("tangent", tangents)}.`);
  if (fits.some(({ fit }) => residualsOf(follow, fit).length > 0)) words.push("Below: reading minus curve.");
  return words.join(" ");
}

/** "the tangent of rate 2", "the tangents of rates 2, 3". */
function ofRates(line: string, numbers: readonly number[]): string {
  const s = numbers.length > 1 ? "s" : "";
  return `the ${line}${s} of rate${s} ${numbers.join(", ")}`;
}
