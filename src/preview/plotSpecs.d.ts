import type { Spec } from "vega";

declare global {
  /** Compiled by the build, which puts it in the bundle as plain data. */
  const plotSpecs: { readonly withStrip: Spec; readonly withoutStrip: Spec };
}
