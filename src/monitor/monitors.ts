import { concentration } from "./concentration.js";
import type { Monitor } from "./monitor.js";

/** Every monitor by its name in the language. */
export const monitors: ReadonlyMap<string, Monitor> = new Map(
  [concentration].map((monitor) => [monitor.name, monitor]),
);
