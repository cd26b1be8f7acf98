import assert from "node:assert/strict";
import { until } from "../editor/until.js";
import { hoverAt, leaveHover } from "./hover.js";
import { openFile } from "./openFile.js";
import { takePicture, takePictures } from "./picture.js";
import type { Session } from "./session.js";
import { changeTheme } from "./theme.js";
import { type ThemeKind, themes } from "./themes.js";
import { goTo, save, type } from "./typing.js";
import { withSession } from "./withSession.js";

const size = { width: 1280, height: 900 };

async function untilUpToDate({ page }: Session): Promise<void> {
  await page.locator(".statusbar-item", { hasText: "Ratewright: up to date" }).waitFor();
}

/** The words of the list of suggestions, from above, once one begins with `first`. */
async function suggestions({ page }: Session, first: string): Promise<string[]> {
  const rows = page.locator(".suggest-widget.visible .monaco-list-row .label-name");
  let found: string[] = [];
  await until(`suggestions that begin with ${first}`, async () => {
    found = await rows.allInnerTexts();
    return found.some((label) => label.startsWith(first));
  });
  return found;
}

/** The class that colours a word by itself in the active editor; null where it stands in no piece of its own. */
async function colourOf({ page }: Session, word: string): Promise<string | null> {
  const pieces = page.locator(".editor-group-container.active .view-line span span", { hasText: word });
  const classes = await pieces.evaluateAll(
    (elements, wanted) => elements.filter((one) => one.textContent?.trim() === wanted).map((one) => one.className),
    word,
  );
  return classes.at(-1) ?? null;
}

/** Line of the active sample that holds these words, from 1. */
function lineOf(text: string, words: string): number {
  return text.split("\n").findIndex((line) => line.includes(words)) + 1;
}

describe("a person finding their way", () => {
  it("writes a run by completion: lines, paths, headers, columns, units", async () => {
    await withSession("completion", { size }, async (session) => {
      const { page } = session;
      await openFile(session, "peroxide.raterun");
      await untilUpToDate(session);
      const text = await save(session, "peroxide.raterun");
      await goTo(session, text.split("\n").length, 1);
      await type(session, "run C");
      await page.keyboard.press("Escape");
      await type(session, "\nda");
      assert.ok((await suggestions(session, "data")).includes("date"));
      await takePictures(session, "completion.lines");
      await page.keyboard.press("Escape");
      await type(session, 'ta "');
      assert.deepEqual(await suggestions(session, "data"), ["data", "pictures"]);
      await page.keyboard.press("Enter");
      await type(session, "/");
      assert.ok((await suggestions(session, "ester.csv")).includes("peroxide-a.csv"));
      await takePicture(session, "completion.paths");
      await type(session, "peroxide-a");
      await page.keyboard.press("Enter");
      await page.keyboard.press("End");
      await type(session, '\ncolumn x "');
      await suggestions(session, "time / s");
      await takePicture(session, "completion.headers");
      await type(session, "c(H");
      await page.keyboard.press("Enter");
      await page.keyboard.press("End");
      await type(session, "\nvolume 50.00 ");
      const units = await suggestions(session, "mL");
      assert.deepEqual(units.slice(0, 3), ["mL", "L", "µL"]);
      await takePicture(session, "completion.units");
      await type(session, "mL\n");
      await type(session, "follow H2O2 as concentration from ");
      assert.deepEqual(await suggestions(session, "x"), ["x"]);
      await takePicture(session, "completion.columns");
      await page.keyboard.press("Enter");
      const saved = await save(session, "peroxide.raterun");
      const written = saved
        .slice(saved.indexOf("run C"))
        .split("\n")
        .map((line) => line.trim());
      assert.deepEqual(written.slice(0, 5), [
        "run C",
        'data "data/peroxide-a.csv"',
        'column x "c(H2O2) / mol L^-1"',
        "volume 50.00 mL",
        "follow H2O2 as concentration from x",
      ]);
    });
  });

  it("renames a column by keyboard, is told why a name cannot be, and undoes it", async () => {
    await withSession("rename", { size }, async (session) => {
      const { page } = session;
      await openFile(session, "peroxide.raterun");
      await untilUpToDate(session);
      const before = await save(session, "peroxide.raterun");
      const line = lineOf(before, "follow ");
      const column = (before.split("\n")[line - 1] ?? "").indexOf("from c") + 6;
      const rename = async (name: string): Promise<void> => {
        await goTo(session, line, column);
        await page.keyboard.press("F2");
        const box = page.locator(".rename-box input");
        await box.waitFor();
        assert.equal(await box.inputValue(), "c");
        await box.fill(name);
      };
      await rename("t");
      await page.keyboard.press("Enter");
      const refusal = page.locator(".monaco-editor-overlaymessage, .notification-toast", {
        hasText: "already a column t",
      });
      await refusal.first().waitFor();
      await takePicture(session, "rename.refused");
      await rename("left");
      await takePicture(session, "rename.box");
      await page.keyboard.press("Enter");
      await until("the new name", async () => (await save(session, "peroxide.raterun")).includes("from left"));
      const after = await save(session, "peroxide.raterun");
      assert.match(after, /column +left +"c\(H2O2\)/);
      await takePicture(session, "rename.done");
      await goTo(session, line, column);
      await page.keyboard.press("Control+z");
      await until("the old name", async () => (await save(session, "peroxide.raterun")) === before);
    });
  });

  it("reads what follows behind the lines and rests on words and on a header of a data file", async () => {
    await withSession("words", { size }, async (session) => {
      const { page } = session;
      await openFile(session, "ester.raterun");
      await untilUpToDate(session);
      await page
        .locator(".view-line", { hasText: /k\s=\s\d/ })
        .first()
        .waitFor();
      for (const kind of Object.keys(themes) as ThemeKind[]) {
        await changeTheme(session, kind);
        await until(`species in a colour of their own, theme ${kind}`, async () => {
          const [species, reading] = [await colourOf(session, "NaOH"), await colourOf(session, "left")];
          return species !== null && species !== reading;
        });
        await takePicture(session, `hints.${kind}`);
      }
      for (const [words, expected] of [
        ["NaOH", /molar mass/],
        ["25.0(2)", /298\.15/],
        ["rate ", /A rate that is wanted/],
      ] as const) {
        const shown = await hoverAt(session, words);
        assert.match(shown.text, expected);
        await takePicture(session, `words.${words.replace(/\W/g, "")}`);
        await leaveHover(session);
      }
      await openFile(session, "data/ester.csv");
      const header = await hoverAt(session, "c(ester)");
      assert.match(header.text, /k = \d/);
      assert.equal(header.pictures.length, 1);
      await takePicture(session, "words.header");
    });
  });
});
