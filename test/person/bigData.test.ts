import assert from "node:assert/strict";
import { mkdirSync, writeFileSync } from "node:fs";
import { join } from "node:path";
import { temporaryFolder } from "../editor/temporaryFolder.js";
import { decayCsv, decayRun } from "../server/decay.js";
import { hoverAt } from "./hover.js";
import { openFile } from "./openFile.js";
import { takePicture } from "./picture.js";
import { withSession } from "./withSession.js";

describe("a data file of more than 300 kB", () => {
  const folder = temporaryFolder("big-data");
  before(() => {
    mkdirSync(join(folder.path, "data"));
    writeFileSync(join(folder.path, "data", "a.csv"), decayCsv(24_000, 0.05));
    writeFileSync(join(folder.path, "a.raterun"), decayRun.replace("H2O2(aq) -> H2O(l)", "2 H2O2(aq) -> 2 H2O(l)"));
  });
  after(() => folder.remove());

  for (const host of ["node", "web"] as const) {
    it(`has its k and picture from the worker, the extension running in ${host === "node" ? "Node" : "the page"}`, async () => {
      await withSession(`big-data.${host}`, { host, samples: folder.path }, async (session) => {
        await openFile(session, "a.raterun");
        const { page } = session;
        await page.locator(".statusbar-item", { hasText: "Ratewright: up to date" }).waitFor();
        const shown = await hoverAt(session, '"c / mol', 1);
        assert.match(shown.text, /k = \d/);
        assert.equal(shown.pictures.length, 1);
        await takePicture(session, `big-data.${host}`);
        // The server of the tests lacks the native program that writes the logs of extensions running in Node.
        if (host === "node") return;
        await page.keyboard.press("Escape");
        await page.keyboard.press("F1");
        await page.locator(".quick-input-widget .quick-input-box input").fill(">Ratewright: Show Log");
        await page.locator(".quick-input-list .monaco-list-row").first().waitFor();
        await page.keyboard.press("Enter");
        const log = page.locator(".panel .view-lines");
        await log.getByText("runs.").first().waitFor();
        // A worker that could not be started, or broke, would have been said here.
        assert.doesNotMatch((await log.allInnerTexts()).join("\n"), /ended/);
        await takePicture(session, "log.web");
      });
    });
  }
});
