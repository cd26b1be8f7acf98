import type { Frame } from "playwright-core";
import { until } from "../editor/until.js";
import type { Session } from "./session.js";

/** Runs a command by its name in the list of commands. */
export async function runCommand({ page }: Session, name: string): Promise<void> {
  await page.keyboard.press("F1");
  await page.locator(".quick-input-widget .quick-input-box input").fill(`>${name}`);
  await page.locator(".quick-input-list .monaco-list-row").first().waitFor();
  await page.keyboard.press("Enter");
}

/** Opens the preview by its command and answers with its page: the innermost frame of the panel. */
export async function openPreview(session: Session): Promise<Frame> {
  await runCommand(session, "Ratewright: Open Preview");
  return previewFrame(session);
}

/** The page of the preview that is open, once it shows a run or says that there is none. */
export async function previewFrame({ page }: Session): Promise<Frame> {
  const frame = await until(
    "the page of the preview",
    async () => {
      for (const one of page.frames()) {
        if (one.isDetached() || !one.url().includes("fake.html")) continue;
        const filled = await one
          .locator("body.filled #page h3")
          .count()
          .catch(() => 0);
        if (filled > 0) return one;
      }
      return null;
    },
    30_000,
  );
  return frame;
}

/** Waits until every plot of the page is drawn. */
export async function untilDrawn(frame: Frame): Promise<void> {
  await until("a drawn plot", () =>
    frame.locator(".plot canvas").evaluateAll(
      (all) =>
        all.length > 0 &&
        all.every((one) => {
          const canvas = one as HTMLCanvasElement;
          const dots = canvas.getContext("2d")?.getImageData(0, 0, canvas.width, canvas.height).data;
          return dots?.some((value) => value > 0) ?? false;
        }),
    ),
  );
}

/** Waits until the quiet sign above the page reads like this. */
export async function untilSign(frame: Frame, words: RegExp): Promise<void> {
  await until(`the sign ${words}`, async () => words.test((await frame.locator("#sign").textContent()) ?? ""));
}
