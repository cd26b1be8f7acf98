// Which test file belongs to which layer.
import { readdirSync } from "node:fs";
import { join, sep } from "node:path";
import { root } from "./install.mjs";

/** Folders of `test/` whose tests need more than Node; all other test files are the unit layer's. */
const ownLayer = ["web", "extension", "person"];

/**
 * The test files of a layer, as absolute paths in a fixed order.
 * @param {string} layer
 */
export function testFiles(layer) {
  const top = join(root, "test");
  return readdirSync(top, { recursive: true, encoding: "utf8" })
    .filter((path) => path.endsWith(".test.ts") && !path.includes(`node_modules${sep}`))
    .filter((path) => {
      const [folder] = path.split(sep);
      return ownLayer.includes(layer) ? folder === layer : !ownLayer.includes(folder);
    })
    .sort()
    .map((path) => join(top, path));
}
