import assert from "node:assert/strict";
import { readdirSync, readFileSync } from "node:fs";
import { join } from "node:path";
import { temporaryFolder } from "../editor/temporaryFolder.js";
import { commandLineIn } from "./commandLineIn.js";

describe("the pictures of the samples", () => {
  it("are drawn as they stand in samples/pictures (node src/build/gallery.mjs draws them anew)", async () => {
    const drawn = temporaryFolder("gallery");
    try {
      const { status } = await commandLineIn(".", ["report", "--svg", drawn.path, "samples"]);
      assert.equal(status, 1, "one of the samples has planted mistakes");
      const kept = join("samples", "pictures");
      assert.deepEqual(readdirSync(drawn.path).sort(), readdirSync(kept).sort());
      for (const name of readdirSync(kept)) {
        assert.equal(readFileSync(join(drawn.path, name), "utf8"), readFileSync(join(kept, name), "utf8"), name);
      }
    } finally {
      drawn.remove();
    }
  });
});
