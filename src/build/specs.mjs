// The preview's plots, compiled from Vega-Lite when the page's script is built.
import { build } from "esbuild";
import { root } from "./install.mjs";

/** The compiled plots as JSON text. */
export async function plotSpecsJson() {
  const { outputFiles } = await build({
    absWorkingDir: root,
    entryPoints: ["src/build/specs/plotSpecs.ts"],
    bundle: true,
    format: "esm",
    platform: "node",
    write: false,
  });
  const source = Buffer.from(outputFiles[0].contents).toString("base64");
  const { plotSpecs } = await import(`data:text/javascript;base64,${source}`);
  return JSON.stringify(plotSpecs());
}
