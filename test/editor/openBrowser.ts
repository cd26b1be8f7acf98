import type { Browser } from "playwright-core";
import { chromium } from "playwright-core";
import { browserExecutable } from "./browserExecutable.js";

/** Time a browser may take to start, ms. */
const startLimit = 60_000;

/** Starts the browser without a window. It has no sandbox of its own: it may run as root and shows local pages only. */
export async function openBrowser(): Promise<Browser> {
  return chromium.launch({
    executablePath: await browserExecutable(),
    args: ["--no-sandbox", "--disable-gpu"],
    headless: true,
    // A signal ends this process, and its end the browser; the driver alone would end the browser and let tests go on.
    handleSIGINT: false,
    handleSIGTERM: false,
    handleSIGHUP: false,
    timeout: startLimit,
  });
}
