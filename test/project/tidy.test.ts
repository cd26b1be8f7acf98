import assert from "node:assert/strict";
import { execFileSync } from "node:child_process";
import { readFileSync } from "node:fs";
import { sampleData } from "../../src/build/sampleData.js";
import { version } from "../../src/contract/version.js";

const tracked = execFileSync("git", ["ls-files", "-z"], { encoding: "utf8" })
  .split("\0")
  .filter((name) => name !== "");

describe("what is kept in the project", () => {
  it("no file holds a path of one machine or the host of a package registry", () => {
    const homes = new RegExp(`(^|[^A-Za-z0-9._~-])/(${["home", "root", "Users", "work"].join("|")})/[a-z]`);
    const hosts = new RegExp(`${["registry", "npmjs"].join("\\.")}|${["registry", "yarnpkg"].join("\\.")}`);
    for (const name of tracked) {
      if (/\.(png|ico|vsix)$/.test(name)) continue;
      const text = readFileSync(name, "utf8");
      assert.ok(!hosts.test(text), `${name}: host of a registry`);
      if (!name.startsWith("test/")) assert.ok(!homes.test(text), `${name}: path of a machine`);
    }
  });

  it("the top level holds what the design names and what tools require there", () => {
    const top = new Set(tracked.map((name) => name.split("/")[0] ?? ""));
    const allowed = [
      "package.json",
      "tsconfig.json",
      "README.md",
      "DEVELOPERS.md",
      "src",
      "media",
      "syntaxes",
      "test",
      "samples",
      "package-lock.json",
      "biome.json",
      "LICENSE",
      "CHANGELOG.md",
      ".gitignore",
      ".npmrc",
      ".ci",
      ".vscodeignore",
      ".vscode",
    ];
    assert.deepEqual(
      [...top].filter((name) => !allowed.includes(name)),
      [],
    );
  });

  it("the version of the program is that of the package", () => {
    const packageFile = JSON.parse(readFileSync("package.json", "utf8")) as { version: string };
    assert.equal(version, packageFile.version);
  });

  it("the data files of the samples are what their script makes, and say that they are invented", () => {
    for (const [path, text] of sampleData()) {
      assert.equal(readFileSync(`samples/${path}`, "utf8"), text, path);
      assert.match(text, /invented figures, made by src\/build\/samples\.mjs/);
    }
    for (const name of tracked.filter((file) => /^samples\/[^/]*\.raterun$/.test(file))) {
      assert.match(readFileSync(name, "utf8"), /The figures are invented, made by src\/build\/samples\.mjs/, name);
    }
  });
});
