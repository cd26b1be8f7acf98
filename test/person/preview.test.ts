import assert from "node:assert/strict";
import { mkdirSync, readFileSync, writeFileSync } from "node:fs";
import { createRequire } from "node:module";
import { join } from "node:path";
import type { Frame } from "playwright-core";
import { projectFolder } from "../editor/projectFolder.js";
import { temporaryFolder } from "../editor/temporaryFolder.js";
import { until } from "../editor/until.js";
import { decayCsv, decayRun } from "../server/decay.js";
import { reportOf } from "./commandLine.js";
import { openFile } from "./openFile.js";
import { takePicture } from "./picture.js";
import { openPreview, previewFrame, runCommand, untilDrawn, untilSign } from "./preview.js";
import type { Session } from "./session.js";
import { changeTheme } from "./theme.js";
import { type ThemeKind, themes } from "./themes.js";
import { goTo, type } from "./typing.js";
import { withSession } from "./withSession.js";

const size = { width: 1500, height: 1100 };

/** k with the digits of the command line's report, in signs of print. */
function printedK(session: Session, name: string, run: number): string {
  const k = reportOf(join(session.workspace, name)).runs[run]?.fits[0]?.parameters["k"];
  const digits = /^([\d.]+\(\d+\))e-(\d+) s\^-1$/.exec(k?.text ?? "");
  assert.ok(digits, `k of run ${run} is not printed as expected: ${k?.text}`);
  const raised = [...(digits[2] ?? "")].map((digit) => "⁰¹²³⁴⁵⁶⁷⁸⁹"[Number(digit)]).join("");
  return `${digits[1]} × 10⁻${raised} s⁻¹`;
}

const plain = (text: string): string => text.replaceAll("\u00a0", " ");

async function words(frame: Frame, selector: string): Promise<string> {
  return plain((await frame.locator(selector).allTextContents()).join("\n"));
}

/** Where a share of the plot's time axis stands in the window, px; the first and last reading stand near 0 and 1. */
async function plotBox(frame: Frame): Promise<{ x: number; y: number; width: number; height: number }> {
  const box = await frame.locator(".plot").first().boundingBox();
  assert.ok(box);
  return box;
}

async function violations(frame: Frame): Promise<string | null> {
  return frame.evaluate(() => document.body.dataset["violations"] ?? null);
}

const axeSource = readFileSync(
  createRequire(join(projectFolder(), "package.json")).resolve("axe-core/axe.min.js"),
  "utf8",
);

/** What axe finds in the page of the preview. */
async function axeFindings(frame: Frame): Promise<string[]> {
  await frame.evaluate(axeSource);
  return frame.evaluate(async () => {
    const { axe } = window as unknown as { axe: { run(): Promise<{ violations: AxeViolation[] }> } };
    const { violations: found } = await axe.run();
    return found.map(({ id, nodes }) => `${id}: ${nodes.map(({ html }) => html).join(" | ")}`);
  });
}

describe("a person with the preview", () => {
  it("sees k with the digits of the report, follows the cursor to the other run, and the tables follow an edit", async () => {
    await withSession("preview", { size }, async (session) => {
      await openFile(session, "peroxide.raterun");
      const frame = await openPreview(session);
      await untilDrawn(frame);
      assert.ok((await words(frame, "#page")).includes(printedK(session, "peroxide.raterun", 0)));
      assert.match(await words(frame, "#page h3"), /^Run A/);
      await takePicture(session, "preview.run-a");
      await goTo(session, 25, 3);
      await until("run B", async () => /^Run B/.test(await words(frame, "#page h3")));
      await until("k of run B", async () =>
        (await words(frame, "#page")).includes(printedK(session, "peroxide.raterun", 1)),
      );
      // The temperature stands in run A and holds for run B as well: 25.0 becomes 35.0.
      await goTo(session, 10, 16);
      await until("run A again", async () => /^Run A/.test(await words(frame, "#page h3")));
      await untilDrawn(frame);
      await frame.locator(".plot canvas").evaluateAll((all) => {
        for (const canvas of all) canvas.setAttribute("data-marked", "yes");
      });
      await session.page.keyboard.press("Delete");
      await type(session, "3");
      await until("35.00(10) °C", async () => (await words(frame, "#page")).includes("35.00(10) °C"));
      // Patched, not made anew: what was drawn in is the same.
      assert.equal(await frame.locator(".plot canvas[data-marked]").count(), 1);
      assert.equal(await violations(frame), null);
    });
  });

  it("keeps the last good picture with its sign while a line is broken, and goes on when it is mended", async () => {
    await withSession("preview.broken", { size, theme: "dark" }, async (session) => {
      await openFile(session, "peroxide.raterun");
      const frame = await openPreview(session);
      await untilDrawn(frame);
      const before = await words(frame, "#page");
      await goTo(session, 15, 5);
      await type(session, "x");
      await untilSign(frame, /^The last good picture; the text has errors\. Line 15: /);
      assert.equal(await words(frame, "#page"), before);
      await takePicture(session, "preview.broken.dark");
      assert.deepEqual(await axeFindings(frame), []);
      await session.page.keyboard.press("Backspace");
      await untilSign(frame, /^$/);
      assert.equal(await words(frame, "#page"), before);
    });
  });

  it("drags over a time span, writes the window line by one edit, and undoes it", async () => {
    await withSession("preview.window", { size }, async (session) => {
      await openFile(session, "peroxide.raterun");
      const { page } = session;
      const frame = await openPreview(session);
      await untilDrawn(frame);
      const { x, y, width, height } = await plotBox(frame);
      await page.mouse.move(x + 0.3 * width, y + 0.3 * height);
      await page.mouse.down();
      await page.mouse.move(x + 0.5 * width, y + 0.3 * height, { steps: 4 });
      await page.mouse.move(x + 0.8 * width, y + 0.3 * height, { steps: 4 });
      await page.mouse.up();
      const [from, to] = await frame.locator("form.window input").evaluateAll((all) => {
        return all.map((one) => Number((one as HTMLInputElement).value));
      });
      assert.ok(from !== undefined && to !== undefined && from > 0 && from < to, `${from} to ${to}`);
      await takePicture(session, "preview.window");
      await frame.getByRole("button", { name: "Write the window line" }).first().click();
      const written = new RegExp(`^    window     ${from} s to ${to} s$`, "m");
      await until("the window line", async () => written.test(await editorText(session)));
      await until("fewer readings", async () => /Readings outside the window/.test(await words(frame, "#page")));
      await untilDrawn(frame);
      await takePicture(session, "preview.windowed");
      assert.deepEqual(await axeFindings(frame), []);
      await page.locator(".editor-group-container .monaco-editor .view-lines").first().click();
      await page.keyboard.press("Control+z");
      await until("no window line", async () => !/window/.test(await editorText(session)));
      // One step back, and the text is the one on disk again.
      await page
        .locator(".editor-group-container.active .tab.active:not(.dirty)", { hasText: "peroxide.raterun" })
        .waitFor();
    });
  });

  it("draws the residuals when a fit comes, and takes a window by keys alone", async () => {
    await withSession("preview.keys", { size, theme: "high-contrast" }, async (session) => {
      await openFile(session, "peroxide.raterun");
      const { page } = session;
      await goTo(session, 22, 3);
      await page.keyboard.press("Control+Shift+k");
      const frame = await openPreview(session);
      await untilDrawn(frame);
      const height = async (): Promise<number> => (await frame.locator(".plot canvas").boundingBox())?.height ?? 0;
      const low = await height();
      assert.equal(await frame.locator("form.window").count(), 0);
      await goTo(session, 21, 1);
      await page.keyboard.press("Control+z");
      await until("the strip of residuals", async () => (await height()) > low + 50);
      await untilDrawn(frame);
      await frame.locator("form.window input").first().focus();
      await page.keyboard.type("900");
      await page.keyboard.press("Tab");
      await page.keyboard.type("100");
      await page.keyboard.press("Enter");
      await until("the refusal", async () =>
        /needs two times, the first before the last/.test(await words(frame, ".reading")),
      );
      await page.keyboard.press("End");
      await page.keyboard.type("0");
      await page.keyboard.press("Enter");
      await until("the window line", async () => /^ {4}window {5}900 s to 1000 s$/m.test(await editorText(session)));
      await takePicture(session, "preview.keys");
      assert.equal(await violations(frame), null);
    });
  });

  it("opens the data file at the row of a point, by the mouse and by keys, and the description at a line", async () => {
    await withSession("preview.ways", { size }, async (session) => {
      await openFile(session, "peroxide.raterun");
      const { page } = session;
      const frame = await openPreview(session);
      await untilDrawn(frame);
      const plot = frame.locator(".plot").first();
      await plot.focus();
      for (const key of ["Home", "ArrowRight", "ArrowRight"]) await page.keyboard.press(key);
      const said = await words(frame, ".reading");
      const row = /line (\d+) of the file/.exec(said)?.[1];
      assert.ok(row, said);
      await page.keyboard.press("Enter");
      await untilActive(session, "peroxide-a.csv", Number(row));
      await takePicture(session, "preview.row");
      // The last reading, by the mouse: found where the plot says it is.
      const again = await previewFrame(session);
      const { x, y, width, height } = await plotBox(again);
      let clicked = "";
      for (let right = 4; right < 60 && clicked === ""; right += 3) {
        for (let up = 0; up < height && clicked === ""; up += 9) {
          await page.mouse.move(x + width - right, y + up);
          clicked = await words(again, ".reading");
        }
      }
      const last = /line (\d+) of the file/.exec(clicked)?.[1];
      assert.ok(last, "no reading was found by the mouse");
      await page.mouse.down();
      await page.mouse.up();
      await untilActive(session, "peroxide-a.csv", Number(last));
      await again.locator("button.line", { hasText: "line 22" }).first().click();
      await untilActive(session, "peroxide.raterun", 22);
    });
  });

  it("exports the curves and the picture to where it is told", async () => {
    await withSession("preview.export", { size }, async (session) => {
      await openFile(session, "peroxide.raterun");
      const { page } = session;
      const frame = await openPreview(session);
      await untilDrawn(frame);
      for (const [button, file, begins] of [
        ["CSV of curves", "peroxide-A.curves.csv", "what,t / s,c / mol L^-1"],
        ["PNG", "peroxide-A.png", "\u0089PNG"],
        ["Markdown", "peroxide.md", "# Rates of reaction"],
      ] as const) {
        await frame.getByRole("button", { name: button, exact: true }).click();
        const box = page.locator(".quick-input-widget .quick-input-box input");
        await box.waitFor();
        await until(`the name ${file}`, async () => (await box.inputValue()).endsWith(file));
        await page.keyboard.press("Enter");
        await until(`the words that ${file} is written`, async () =>
          ((await frame.locator("#said").textContent()) ?? "").includes(`${file} is written`),
        );
        const written = readFileSync(join(session.workspace, file));
        assert.equal(written.subarray(0, begins.length).toString("latin1"), begins);
      }
      await frame.locator("#exports").scrollIntoViewIfNeeded();
      await takePicture(session, "preview.exported");
      assert.equal(await violations(frame), null);
    });
  });

  it("comes back after a reload with its run, its folded part and its place", async () => {
    await withSession("preview.reload", { size: { width: 1500, height: 700 } }, async (session) => {
      await openFile(session, "peroxide.raterun");
      const { page } = session;
      const frame = await openPreview(session);
      await untilDrawn(frame);
      await goTo(session, 25, 3);
      await until("run B", async () => /^Run B/.test(await words(frame, "#page h3")));
      await frame.locator("details[data-part='What was done'] > summary").click();
      await frame.evaluate(() => window.scrollTo(0, 300));
      // The place is kept once the page has rested.
      await page.waitForTimeout(600);
      await runCommand(session, "Developer: Reload Window");
      await page.locator(".editor-group-container").first().waitFor({ state: "detached" });
      const back = await previewFrame(session);
      await untilDrawn(back);
      assert.match(await words(back, "#page h3"), /^Run B/);
      assert.equal(await back.locator("details[data-part='What was done']").getAttribute("open"), null);
      assert.equal(await back.evaluate(() => window.scrollY), 300);
    });
  });

  for (const host of ["node", "web"] as const) {
    it(`reads well in four themes, the extension running in ${host === "node" ? "Node" : "the page"}; axe finds nothing`, async () => {
      const tall = { width: 1400, height: 2600 };
      await withSession(`preview.axe.${host}`, { size: tall, host }, async (session) => {
        await openFile(session, host === "node" ? "peroxide.raterun" : "planted.raterun");
        const frame = await openPreview(session);
        await untilDrawn(frame);
        for (const kind of Object.keys(themes) as ThemeKind[]) {
          await changeTheme(session, kind);
          await until(`theme ${kind} in the page`, () => frame.locator(`body.${pageClass[kind]}`).count());
          const found = await axeFindings(frame);
          await takePicture(session, `preview.${host}.${kind}`);
          assert.deepEqual(found, [], kind);
        }
        assert.equal(await violations(frame), null);
        // That it would have been told: code made of text is refused, and the listener hears of it.
        await frame.evaluate(() => void setTimeout("document.body.dataset['made'] = 'yes'", 0));
        await until("the refusal is heard of", async () => /script-src/.test((await violations(frame)) ?? ""));
        assert.equal(await frame.evaluate(() => document.body.dataset["made"] ?? null), null);
      });
    });
  }

  it("goes on with the next server after a restart", async () => {
    await withSession("preview.restart", { size }, async (session) => {
      await openFile(session, "peroxide.raterun");
      const frame = await openPreview(session);
      await untilDrawn(frame);
      await runCommand(session, "Ratewright: Restart Language Server");
      await session.page.locator(".statusbar-item", { hasText: "Ratewright: up to date" }).waitFor();
      await goTo(session, 25, 3);
      await until("run B", async () => /^Run B/.test(await words(frame, "#page h3")));
      await untilSign(frame, /^$/);
    });
  });

  it("shows an outline of many readings, worked out beside the message loop", async () => {
    const folder = temporaryFolder("preview-big");
    try {
      mkdirSync(join(folder.path, "data"));
      writeFileSync(join(folder.path, "data", "a.csv"), decayCsv(200_000, 0.01));
      writeFileSync(join(folder.path, "a.raterun"), decayRun.replace("H2O2(aq) -> H2O(l)", "2 H2O2(aq) -> 2 H2O(l)"));
      await withSession("preview.big", { size, theme: "dark", samples: folder.path }, async (session) => {
        await openFile(session, "a.raterun");
        const frame = await openPreview(session);
        await untilDrawn(frame);
        assert.match(await words(frame, "#page"), /all 200000 used/);
        assert.match(await words(frame, "figcaption"), /^Ribbon/);
        await takePicture(session, "preview.big.dark");
      });
    } finally {
      folder.remove();
    }
  });
});

interface AxeViolation {
  id: string;
  nodes: { html: string }[];
}

const pageClass: Readonly<Record<ThemeKind, string>> = {
  light: "vscode-light",
  dark: "vscode-dark",
  "high-contrast": "vscode-high-contrast",
  "high-contrast-light": "vscode-high-contrast-light",
};

/** The visible lines of the description, in their order. */
async function editorText({ page }: Session): Promise<string> {
  const lines = page.locator(".editor-group-container .monaco-editor").first().locator(".view-lines .view-line");
  const all = await lines.evaluateAll((found) =>
    [...found]
      .sort((a, b) => a.getBoundingClientRect().top - b.getBoundingClientRect().top)
      .map((line) => line.textContent ?? ""),
  );
  return plain(all.join("\n"));
}

/** Waits until a file is the active one with the cursor on a line. */
async function untilActive({ page }: Session, name: string, line: number): Promise<void> {
  await page.locator(".editor-group-container.active .tabs-container .tab.active", { hasText: name }).waitFor();
  await page.locator(".statusbar-item", { hasText: new RegExp(`Ln ${line}, `) }).waitFor();
}
