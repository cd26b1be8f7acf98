import assert from "node:assert/strict";
import { spawn } from "node:child_process";
import { once } from "node:events";
import { existsSync, readdirSync, readFileSync, rmSync, writeFileSync } from "node:fs";
import { join } from "node:path";
import { setTimeout as pause } from "node:timers/promises";
import { build } from "esbuild";
import { seededRandom } from "../../src/numerics/random.js";
import { temporaryFolder } from "../editor/temporaryFolder.js";
import { sampleRecord } from "../record/sampleRecord.js";

const kills = 50;

describe("a record whose writing is killed", () => {
  it("is whole, old or new, 50 times at random moments", async function () {
    this.timeout(60_000);
    const folder = temporaryFolder("killed");
    try {
      const script = join(folder.path, "writeForever.cjs");
      await build({
        entryPoints: ["test/cli/writeForever.ts"],
        outfile: script,
        bundle: true,
        platform: "node",
        format: "cjs",
        target: "node20",
        logLevel: "error",
      });
      // The record of a sample 200 times in one file takes long enough to write for a kill to hit it.
      const texts = await Promise.all(["gas", "peroxide"].map(async (name) => (await sampleRecord(name)).repeat(200)));
      const sources = texts.map((text, index) => {
        const source = join(folder.path, `source-${index}`);
        writeFileSync(source, text);
        return source;
      });
      const target = join(folder.path, "a.raterecord");
      const random = seededRandom(4);
      let hit = 0;
      for (let kill = 0; kill < kills; kill++) {
        const child = spawn(process.execPath, [script, target, ...sources], { stdio: ["ignore", "pipe", "inherit"] });
        const ended = once(child, "exit");
        await once(child.stdout, "data");
        await pause(1 + 30 * random.uniform());
        child.kill("SIGKILL");
        const [, signal] = await ended;
        assert.equal(signal, "SIGKILL");
        if (existsSync(target)) assert.ok(texts.includes(readFileSync(target, "utf8")), `after kill ${kill + 1}`);
        // What is left beside it shows that a writing was hit.
        const left = readdirSync(folder.path).filter((name) => name.startsWith("a.raterecord."));
        if (left.length > 0) hit++;
        for (const name of left) rmSync(join(folder.path, name));
      }
      assert.ok(existsSync(target));
      assert.ok(hit >= kills / 5, `only ${hit} of ${kills} kills hit a writing`);
    } finally {
      folder.remove();
    }
  });
});
