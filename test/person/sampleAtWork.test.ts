import assert from "node:assert/strict";
import { readFileSync } from "node:fs";
import { join } from "node:path";
import { until } from "../editor/until.js";
import { hoverAt, leaveHover } from "./hover.js";
import { openFile } from "./openFile.js";
import { takePicture } from "./picture.js";
import { shownProblems, squiggles } from "./problems.js";
import { applyQuickFix } from "./quickFix.js";
import type { Session } from "./session.js";
import { changeTheme } from "./theme.js";
import { type ThemeKind, themes } from "./themes.js";
import { goTo, save, type } from "./typing.js";
import { withSession } from "./withSession.js";

/** Waits until the panel of problems has a row with these words, or none. */
async function untilProblem(session: Session, words: string, there: boolean): Promise<void> {
  await until(`${there ? "a" : "no"} problem with “${words}”`, async () => {
    return (await shownProblems(session)).some(({ text }) => text.includes(words)) === there;
  });
}

/** Closes the panel of problems, so that the text has the window. */
async function closePanel({ page }: Session): Promise<void> {
  const panel = page.locator(".markers-panel");
  if (await panel.isVisible()) await page.keyboard.press("Control+j");
  await panel.waitFor({ state: "hidden" });
}

async function untilUpToDate({ page }: Session): Promise<void> {
  await page.locator(".statusbar-item", { hasText: "Ratewright: up to date" }).waitFor();
}

describe("a person with the samples", () => {
  it("sees the planted mistakes, balances the reaction, and the mistake is gone on disk too", async () => {
    await withSession("planted", {}, async (session) => {
      await openFile(session, "planted.raterun");
      await untilProblem(session, "Oxygen does not balance", true);
      await until("squiggles", async () => (await squiggles(session)).error >= 3);
      await untilUpToDate(session);
      for (const kind of Object.keys(themes) as ThemeKind[]) {
        await changeTheme(session, kind);
        await takePicture(session, `planted.${kind}`);
      }
      await changeTheme(session, "light");
      await applyQuickFix(session, 4, 13, "Write “2 H2O2(aq)");
      await untilProblem(session, "Oxygen does not balance", false);
      await untilProblem(session, "There is no reading at 5000 s", true);
      const saved = await save(session, "planted.raterun");
      assert.match(saved, /^reaction {2}2 H2O2\(aq\) -> 2 H2O\(l\) \+ O2\(g\)$/m);
      await takePicture(session, "planted.balanced");
    });
  });

  it("types a mistake into a good description, sees it, and takes it back", async () => {
    await withSession("mistake", { theme: "dark" }, async (session) => {
      await openFile(session, "peroxide.raterun");
      await untilUpToDate(session);
      assert.deepEqual(await shownProblems(session), []);
      const before = readFileSync(join(session.workspace, "peroxide.raterun"), "utf8");
      const line = before.split("\n").findIndex((text) => text.includes("volume")) + 1;
      await goTo(session, line, 3);
      await session.page.keyboard.press("Delete");
      await untilProblem(session, "“olume” begins no line here", true);
      await until("a squiggle", async () => (await squiggles(session)).error >= 1);
      await takePicture(session, "mistake.dark");
      await type(session, "v");
      await untilProblem(session, "begins no line here", false);
      assert.deepEqual(await shownProblems(session), []);
    });
  });

  for (const kind of Object.keys(themes) as ThemeKind[]) {
    it(`rests the mouse on the column and reads k beside its picture, theme ${kind}`, async () => {
      await withSession(`hover.${kind}`, { theme: kind, size: { width: 1280, height: 900 } }, async (session) => {
        await openFile(session, "peroxide.raterun");
        await untilUpToDate(session);
        await closePanel(session);
        const shown = await hoverAt(session, "c(H2O2) / mol L^-1", 1);
        // The line holds for run A and, by “like A”, for run B: each has its picture and its k.
        assert.equal(shown.text.match(/k = \d/g)?.length, 2, shown.text);
        assert.equal(shown.pictures.length, 2);
        assert.ok(shown.pictures.every((source) => source.startsWith("data:image/svg+xml")));
        const image = shown.element.locator("img").first();
        await until("the picture is drawn", () =>
          image.evaluate((one) => (one as HTMLImageElement).naturalWidth > 100),
        );
        await takePicture(session, `hover.${kind}`);
        await leaveHover(session);
      });
    });
  }

  it("reads the same in the page's worker, where the server has no files of its own", async () => {
    await withSession("hover.web", { host: "web" }, async (session) => {
      await openFile(session, "ester.raterun");
      await untilUpToDate(session);
      assert.deepEqual(await shownProblems(session), []);
      await closePanel(session);
      const shown = await hoverAt(session, "c(ester) / mmol/L", 1);
      assert.match(shown.text, /k = \d/);
      assert.equal(shown.pictures.length, 1);
      await takePicture(session, "hover.web");
    });
  });

  it("restarts the server from the list of commands", async () => {
    await withSession("restart", {}, async (session) => {
      await openFile(session, "planted.raterun");
      await untilProblem(session, "Oxygen does not balance", true);
      const { page } = session;
      await page.keyboard.press("F1");
      await page.locator(".quick-input-widget .quick-input-box input").fill(">Ratewright: Restart Language Server");
      await page.locator(".quick-input-list .monaco-list-row").first().waitFor();
      await page.keyboard.press("Enter");
      await untilUpToDate(session);
      await untilProblem(session, "Oxygen does not balance", true);
    });
  });
});
