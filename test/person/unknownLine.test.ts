import assert from "node:assert/strict";
import { readdirSync, readFileSync } from "node:fs";
import { join } from "node:path";
import { until } from "../editor/until.js";
import { openFile } from "./openFile.js";
import { takePicture } from "./picture.js";
import { shownProblems, squiggles } from "./problems.js";
import { type } from "./typing.js";
import { withSession } from "./withSession.js";

describe("a line nobody knows, typed at the end of a sample", () => {
  for (const host of ["node", "web"] as const) {
    it(`becomes an error on that line (extension host: ${host})`, async () => {
      await withSession(`unknown-line-${host}`, { host }, async (session) => {
        const sample = readdirSync(session.workspace)
          .sort()
          .find((name) => name.endsWith(".raterun"));
        assert.ok(sample, "there is no sample");
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
        assert.ok((await squiggles(session)).error >= 1);
        await takePicture(session, `unknown-line.${host}`);
        assert.equal(readFileSync(join(session.workspace, sample), "utf8"), before, "typing alone writes nothing");
      });
    });
  }
});
