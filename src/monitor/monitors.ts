import { concentration } from "./concentration.js";
import { gasVolume } from "./gasVolume.js";
import type { Monitor } from "./monitor.js";

/** Every monitor by its name in the language. */
export const monitors: ReadonlyMap<string, Monitor> = new Map(
  [concentration, gasVolume].map((monitor) => [monitor.name, monitor]),
);
