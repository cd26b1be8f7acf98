import assert from "node:assert/strict";
import { readdirSync, readFileSync } from "node:fs";
import { join } from "node:path";
import { projectFolder } from "../editor/projectFolder.js";
import { takePictures } from "./picture.js";
import type { Session } from "./session.js";
import { changeTheme } from "./theme.js";
import { withSession } from "./withSession.js";

interface Step {
  title: string;
  description: string;
}

/** The steps of the page, as the extension declares them. */
function steps(): Step[] {
  const { contributes } = JSON.parse(readFileSync(join(projectFolder(), "package.json"), "utf8"));
  return contributes.walkthroughs[0].steps;
}

/** Chooses a line of the list that a command opens. */
async function choose({ page }: Session, words: string): Promise<void> {
  const box = page.locator(".quick-input-widget .quick-input-box input");
  await box.fill(words);
  await page.locator(".quick-input-list .monaco-list-row.focused", { hasText: words.replace(/^>/, "") }).waitFor();
  await page.keyboard.press("Enter");
}

async function openWalkthrough(session: Session): Promise<void> {
  await session.page.keyboard.press("F1");
  await choose(session, ">Welcome: Open Walkthrough");
  await choose(session, "A rate from a data file");
  await session.page.locator(".getting-started-step.expanded").waitFor();
}

describe("a person on the first page of the extension", () => {
  it("opens every sample from it, each with the rates worked out", async () => {
    await withSession("walkthrough", { size: { width: 1720, height: 1000 } }, async (session) => {
      const { page } = session;
      await openWalkthrough(session);
      await takePictures(session, "walkthrough");
      await changeTheme(session, "light");
      const opened: string[] = [];
      for (const { title, description } of steps()) {
        for (const [, words, name] of description.matchAll(
          /\[([^\]]+)\]\(command:ratewright\.openSample\?%22(.+?)%22\)/g,
        )) {
          assert.ok(words && name);
          const step = page.locator(".getting-started-step", { hasText: title });
          if ((await step.getAttribute("class"))?.includes("expanded") !== true) await step.click();
          await step.getByText(words, { exact: true }).click();
          await page.locator(".tabs-container .tab.active", { hasText: name }).waitFor();
          await page.locator(".statusbar-item", { hasText: "Ratewright: up to date" }).waitFor();
          await page
            .locator(".editor-group-container.active .codelens-decoration a", { hasText: "record up to date" })
            .waitFor();
          opened.push(name);
          await page.locator(".tabs-container .tab", { hasText: "Walkthrough" }).click();
        }
      }
      const shipped = readdirSync(join(projectFolder(), "samples")).filter((name) => name.endsWith(".raterun"));
      assert.deepEqual(opened.sort(), shipped.sort());
    });
  });

  it("finds the samples by the command as well, each with what it is about", async () => {
    await withSession("samples", {}, async (session) => {
      const { page } = session;
      await page.keyboard.press("F1");
      await choose(session, ">Ratewright: Open Sample");
      await page.locator(".quick-input-list .monaco-list-row", { hasText: "A dye that fades" }).waitFor();
      await takePictures(session, "walkthrough.samples");
      await choose(session, "dye.raterun");
      await page.locator(".tabs-container .tab.active", { hasText: "dye.raterun" }).waitFor();
    });
  });
});
