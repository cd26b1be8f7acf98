// The highlighting grammar's file, made from the statement table.
import { writeFileSync } from "node:fs";
import { join } from "node:path";
import { build } from "esbuild";
import { root } from "./install.mjs";

/** The committed file. */
export const grammarPath = join(root, "syntaxes", "raterun.tmLanguage.json");

/** Writes it anew from the table as it is now. */
export async function writeGrammar() {
  const { outputFiles } = await build({
    absWorkingDir: root,
    entryPoints: ["src/build/grammar.ts"],
    bundle: true,
    format: "esm",
    platform: "node",
    write: false,
  });
  const source = Buffer.from(outputFiles[0].contents).toString("base64");
  const { grammarText } = await import(`data:text/javascript;base64,${source}`);
  writeFileSync(grammarPath, grammarText());
}
