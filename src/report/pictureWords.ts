import type { Run } from "../contract/findings.js";
import { formatQuantity } from "../quantity/formatNumber.js";
import { axisWords, signalName } from "./axisText.js";
import { leftOutReasons } from "./leftOutReasons.js";
import type { PictureContent } from "./pictureContent.js";
import { rateName } from "./rateName.js";

/** What a picture shows, in a few words. */
export function pictureTitle(run: Run, { follow, signalUnit, timeUnit }: PictureContent): string {
  const time = axisWords({ symbol: "t", of: "", unit: timeUnit, power: 0 });
  return `Run ${run.name}: ${axisWords(signalName(follow, signalUnit))} against ${time}`;
}

/** The picture in words, for those who do not see it. */
export function pictureWords({ follow, signalUnit, timeUnit, readings, thinned, fits, rates }: PictureContent): string {
  const first = readings[0];
  const last = readings[readings.length - 1];
  const sentences: string[] = [];
  if (first !== undefined && last !== undefined) {
    const course = last.signal > first.signal ? "rising" : last.signal < first.signal ? "falling" : "staying";
    const [from, to] = [first, last].map(({ time }) => formatQuantity(time, null, timeUnit));
    const [start, end] = [first, last].map(({ signal }) => formatQuantity(signal, null, signalUnit));
    const span = course === "staying" ? `at ${start} at both ends` : `${course} from ${start} to ${end}`;
    const count = follow.used === 1 ? "1 reading" : `${follow.used} readings`;
    sentences.push(`${count} of column ${follow.column}, ${span}, between ${from} and ${to}.`);
  }
  const outside = readings.filter(({ used }) => !used).length;
  if (outside > 0) sentences.push(`Readings outside the window of the fit are ${thinned ? "paler" : "hollow"}.`);
  const { leftOut } = follow;
  if (leftOut !== undefined) {
    const count = leftOut.lines.length === 1 ? "1 reading is" : `${leftOut.lines.length} readings are`;
    const why = leftOutReasons(leftOut.why);
    sentences.push(`${count} left out by the description${why === "" ? "" : `: ${why}`}.`);
  }
  for (const { fit, number } of fits) {
    const k = fit.parameters["k"];
    sentences.push(
      `Curve of fit ${number}, ${fit.law}${k === undefined ? "" : `: k = ${k.text}`}, with its 95 % band.`,
    );
  }
  for (const { rate, number } of rates) {
    const line = rate.kind === "average" ? "Chord" : "Tangent";
    sentences.push(`${line} ${number}, ${rateName(rate)}: ${rate.rate?.text ?? "no rate"}.`);
  }
  return sentences.join(" ");
}
