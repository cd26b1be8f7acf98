import type { Run as RunFinding } from "../contract/findings.js";
import type { Quantity } from "../quantity/quantity.js";
import type { Follow, Run } from "../study/run.js";
import { shownQuantity } from "./shown.js";

type Details = RunFinding["follow"][number]["details"];

/** What a reader needs to repeat the numbers: how the signal was read, what was taken off it and what was left out. */
export function followDetails(run: Run, follow: Follow): Details {
  const details: Details = [];
  const put = (name: string, fact: { readonly value: Quantity } | null): void => {
    if (fact !== null) details.push({ name, text: shownQuantity(fact.value).text });
  };
  if (follow.collected !== null) {
    const { wet, temperature } = follow.collected.value;
    details.push({ name: "collected", text: `${wet ? "wet" : "dried"} at ${shownQuantity(temperature).text}` });
  }
  put("barometer", follow.barometer);
  put("level difference", follow.levelDifference);
  put("blank", follow.blank);
  put("reading at start", follow.readingAtStart);
  put("reading at infinity", follow.readingAtInfinity);
  const zero = run.data?.timeZero ?? null;
  if (zero !== null) details.push({ name: "time zero", text: timeText(zero.value, zero.clock) });
  for (const { value } of run.data?.exclusions ?? []) {
    const where =
      "line" in value
        ? `line ${value.line}`
        : `${timeText(value.from, value.clock)} to ${timeText(value.to, value.clock)} of the file`;
    details.push({ name: "left out", text: `${where}: ${value.reason}` });
  }
  return details;
}

/** A time as the description writes it: as a clock shows it, or with its unit. */
function timeText(time: Quantity, clock: boolean): string {
  if (!clock) return shownQuantity(time).text;
  const two = (n: number): string => String(Math.floor(n)).padStart(2, "0");
  const { value } = time;
  return `${two(value / 3600)}:${two((value / 60) % 60)}:${two(value % 60)}`;
}
