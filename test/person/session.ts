import { cpSync } from "node:fs";
import { join } from "node:path";
import type { Page } from "playwright-core";
import { createCleanup } from "../editor/cleanup.js";
import { editorAddress } from "../editor/editorAddress.js";
import { startEditorServer } from "../editor/editorServer.js";
import { isHarmless } from "../editor/harmless.js";
import { openBrowser } from "../editor/openBrowser.js";
import { projectFolder } from "../editor/projectFolder.js";
import { stageExtension } from "../editor/stageExtension.js";
import { temporaryFolder } from "../editor/temporaryFolder.js";
import { withDeadline } from "../editor/withDeadline.js";
import { type ThemeKind, themes } from "./themes.js";
import { answerTrust } from "./trust.js";

/** Time the editor may take until its files are listed, ms; installing it is part of it the first time. */
const openLimit = 480_000;
/** Time a single step of a person may wait for the editor, ms. */
const stepLimit = 20_000;

/** The editor as a person has it before them: a page with the extension running on a copy of the samples. */
export interface Session {
  page: Page;
  /** Folder opened, a copy: tests may write to it. */
  workspace: string;
  /** Replaces the settings added to those of every session; the page follows at once. */
  changeSettings(settings: { [name: string]: unknown }): void;
  /** What the page wrote to its console, oldest first, without the lines known to be harmless. */
  console: string[];
  /** Ends the editor and removes what it left. */
  close(): Promise<void>;
}

export interface SessionOptions {
  /** Folder whose copy is opened; the project's samples unless told. */
  samples?: string;
  /** Folder of the extension; a copy of the project's, as it is shipped, unless told. */
  extension?: string;
  /** Where the extension runs: in Node, or in the page's web worker. */
  host?: "node" | "web";
  /** Whether the person says yes to "Do you trust the authors"; no means Restricted Mode. Yes unless told. */
  trust?: boolean;
  /** Theme at the start; light unless told. */
  theme?: ThemeKind;
  settings?: { [name: string]: unknown };
  /** Size of the window, px; 1280 by 800 unless told. */
  size?: { width: number; height: number };
}

/** Settings of every session: nothing on screen but the editor, and nothing that moves by itself. */
const calm = {
  "workbench.startupEditor": "none",
  "workbench.tips.enabled": false,
  "window.commandCenter": false,
  "chat.commandCenter.enabled": false,
  "editor.cursorBlinking": "solid",
  "editor.minimap.enabled": false,
  "extensions.ignoreRecommendations": true,
  "git.enabled": false,
  "files.autoSave": "off",
};

/** Opens the editor in the browser and answers the question of trust. Call `close` whatever happens after. */
export async function openSession(options: SessionOptions = {}): Promise<Session> {
  const cleanup = createCleanup();
  const host = options.host ?? "node";
  const theme = themes[options.theme ?? "light"];
  const kind = host === "web" ? { "remote.extensionKind": { "ratewright.ratewright": ["web"] } } : {};
  const always = { ...calm, ...kind, "workbench.colorTheme": theme.name };
  try {
    const copies = temporaryFolder("person");
    cleanup.add("removal of the copied samples", copies.remove);
    const workspace = join(copies.path, "samples");
    const samples = options.samples ?? join(projectFolder(), "samples");
    cpSync(samples, workspace, { recursive: true });
    const extension = stageExtension();
    cleanup.add("removal of the copied extension", extension.remove);
    const say = (line: string) => console.log(line);
    const starting = startEditorServer({ settings: { ...always, ...options.settings }, say });
    const server = await withDeadline("start of the editor", openLimit, starting);
    cleanup.add("end of the editor's server", server.stop);
    const browser = await openBrowser();
    cleanup.add("end of the browser", () => browser.close());
    const page = await browser.newPage({ viewport: options.size ?? { width: 1280, height: 800 } });
    page.setDefaultTimeout(stepLimit);
    const lines: string[] = [];
    page.on("console", (message) => {
      const line = `${message.type()}: ${message.text()}`;
      if (!isHarmless(line)) lines.push(line);
    });
    await page.goto(
      editorAddress(server.port, { workspace, extensionDevelopmentPath: options.extension ?? extension.path }),
    );
    await answerTrust(page, options.trust ?? true);
    await page.locator(`.monaco-workbench.${theme.mark}`).waitFor({ state: "attached" });
    return {
      page,
      workspace,
      changeSettings: (settings) => server.writeSettings({ ...always, ...settings }),
      console: lines,
      close: cleanup.run,
    };
  } catch (failure) {
    await cleanup.run();
    throw failure;
  }
}
