import type { Run } from "../contract/findings.js";
import { paletteOf } from "./palette.js";
import { reportStyle, runPicture } from "./picture.js";

/** The picture of a follow line as an SVG file of its own, on a ground that is legible anywhere; null without readings. */
export function standalonePicture(run: Run, follow: Run["follow"][number]): string | null {
  const svg = runPicture(run, follow, reportStyle(paletteOf("neutral")));
  return svg === null ? null : `${svg}\n`;
}
