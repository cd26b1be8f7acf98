import { createCleanup } from "./cleanup.js";
import { editorAddress } from "./editorAddress.js";
import { startEditorServer } from "./editorServer.js";
import { isHarmless } from "./harmless.js";
import { openBrowser } from "./openBrowser.js";
import type { RunTestsOptions } from "./runTestsOptions.js";
import { withDeadline } from "./withDeadline.js";

/** Runs tests inside the extension host of the editor's server, its page open in a browser without a window. */
export async function runTestsInBrowser(options: RunTestsOptions, limit: number): Promise<number> {
  const say = options.say ?? ((line: string) => console.log(line));
  const cleanup = createCleanup();
  try {
    const server = await startEditorServer({ environment: options.extensionTestsEnv ?? {}, say });
    cleanup.add("end of the editor's server", server.stop);
    const browser = await openBrowser();
    cleanup.add("end of the browser", () => browser.close());
    const page = await browser.newPage();
    let exit: (code: number) => void = () => undefined;
    const exited = new Promise<number>((done, refuse) => {
      exit = done;
      page.once("crash", () => refuse(new Error("the editor's page crashed")));
      browser.once("disconnected", () => refuse(new Error("the browser ended before the tests did")));
    });
    // The two functions by which the editor tells whoever automates it what it logs and that the run has ended.
    await page.exposeFunction("codeAutomationLog", (type: string, args: unknown[]) => {
      const line = logLine(type, args);
      if (!isHarmless(line)) say(line);
    });
    await page.exposeFunction("codeAutomationExit", (code: number) => exit(code));
    // Opened or not: whether the run succeeds is told by `exited`, which may refuse before anybody waits for it.
    exited.catch(() => undefined);
    await page.goto(editorAddress(server.port, options), { timeout: limit });
    try {
      return await withDeadline("tests in the extension host", limit, exited);
    } catch (failure) {
      say(`what the editor's server wrote last:\n${server.output()}`);
      throw failure;
    }
  } finally {
    await cleanup.run();
  }
}

function logLine(type: string, args: unknown[]): string {
  const words = args.map((value) => (typeof value === "string" ? value : JSON.stringify(value))).join(" ");
  return type === "log" || type === "info" ? words : `${type}: ${words}`;
}
