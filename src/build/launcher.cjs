#!/usr/bin/env node
// Starts the bundled command. Most of the time of a short run goes into reading half a megabyte of code: where the code
// that V8 made of it when it was built still fits this Node, that is taken instead; everywhere else it is read as it is.
const { readFileSync, readdirSync, writeFileSync } = require("node:fs");
const { join } = require("node:path");
const { Script } = require("node:vm");

const name = readdirSync(__dirname).find((file) => /^command-[0-9a-f]{16}\.cjs$/.test(file));
if (name === undefined) throw new Error("The command is not built. Run: npm run build");
const file = join(__dirname, name);
const kept = file.replace(/\.cjs$/, ".v8");
const source = `(function (exports, require, module, __filename, __dirname) {${readFileSync(file, "utf8")}\n})`;
let cachedData;
try {
  cachedData = readFileSync(kept);
} catch {
  cachedData = undefined;
}
const script = new Script(source, { filename: file, cachedData });
if (process.env.RATEWRIGHT_KEEP_CODE === "yes") {
  process.on("exit", () => writeFileSync(kept, script.createCachedData()));
}
const own = { exports: {} };
script.runInThisContext()(own.exports, require, own, file, __dirname);
