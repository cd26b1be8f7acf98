import assert from "node:assert/strict";
import { readFileSync } from "node:fs";
import { join } from "node:path";
import { until } from "../editor/until.js";
import { openFile } from "./openFile.js";
import { takePicture } from "./picture.js";
import { shownProblems, squiggles } from "./problems.js";
import { type } from "./typing.js";
import { withSession } from "./withSession.js";

/** High enough for the whole sample above the panel of problems, px. */
const size = { width: 1280, height: 1000 };

describe("a line nobody knows, typed at the end of a sample", () => {
  const cases = [
    { where: "in Node", name: "node", options: {} },
    { where: "in the page's worker", name: "web", options: { host: "web" } },
    { where: "in Restricted Mode", name: "restricted", options: { trust: false } },
  ] as const;
  for (const { where, name, options } of cases) {
    it(`becomes an error on that line, the extension running ${where}`, async () => {
      await withSession(`unknown-line.${name}`, { ...options, size }, async (session) => {
        const sample = "ester.raterun";
        const before = readFileSync(join(session.workspace, sample), "utf8");
        await openFile(session, sample);
        await session.page.keyboard.press("Control+End");
        await type(session, "\nnosuchword 1");
        // Whatever the editor offers to complete, the line stays as typed.
        await session.page.keyboard.press("Escape");
        const line = (before.match(/\n/g)?.length ?? 0) + 2;
        await until(`an error on line ${line}`, async () => {
          const problems = await shownProblems(session);
          return problems.some(({ severity, text }) => severity === "error" && text.includes(`[Ln ${line},`));
        });
        // The panel and the text are drawn apart, in no fixed order.
        await until("a squiggle in the text", async () => (await squiggles(session)).error >= 1);
        await takePicture(session, `unknown-line.${name}`);
        assert.equal(readFileSync(join(session.workspace, sample), "utf8"), before, "typing alone writes nothing");
      });
    });
  }
});
