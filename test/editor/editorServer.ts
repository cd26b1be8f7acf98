import { mkdirSync, writeFileSync } from "node:fs";
import { join } from "node:path";
import { installEditor } from "./installEditor.js";
import { startProcess } from "./startProcess.js";
import { temporaryFolder } from "./temporaryFolder.js";
import { withDeadline } from "./withDeadline.js";

/** Time the editor's server may take to listen, ms. */
const startLimit = 60_000;

export interface EditorServer {
  /** The port on 127.0.0.1 it listens on. */
  port: number;
  /** What it wrote to its console lately. */
  output(): string;
  /** Replaces its settings file; open pages follow at once. */
  writeSettings(settings: { [name: string]: unknown }): void;
  /** Ends it and removes its folder. */
  stop(): Promise<void>;
}

/** Starts the editor's server on a free port with a fresh folder for its data, installing the editor first if needed. */
export async function startEditorServer(options: {
  settings?: { [name: string]: unknown };
  environment?: { [name: string]: string | undefined };
  say: (line: string) => void;
}): Promise<EditorServer> {
  const folder = await installEditor(options.say);
  const data = temporaryFolder("editor");
  const settingsFolder = join(data.path, "data", "Machine");
  mkdirSync(settingsFolder, { recursive: true });
  const writeSettings = (settings: { [name: string]: unknown }) => {
    writeFileSync(join(settingsFolder, "settings.json"), JSON.stringify(settings, null, 2));
  };
  writeSettings(options.settings ?? {});
  const args = ["out/server-main.js", "--host", "127.0.0.1", "--port", "0", "--without-connection-token"];
  args.push("--accept-server-license-terms", "--server-data-dir", data.path, "--telemetry-level", "off");
  // Its sockets go to its own folder and vanish with it; elsewhere than on Linux the path may grow too long for one.
  const sockets = process.platform === "linux" ? { TMPDIR: data.path, XDG_RUNTIME_DIR: data.path } : {};
  const environment = { ...sockets, ...options.environment };
  const server = startProcess(process.execPath, args, { folder, environment });
  const stop = async () => {
    await server.stop();
    data.remove();
  };
  const listening = new Promise<number>((done, refuse) => {
    server.onOutput(() => {
      const port = /Extension host agent listening on (\d+)/.exec(server.output())?.[1];
      if (port !== undefined) done(Number(port));
    });
    const gone = (why: string) => refuse(new Error(`The editor's server ended (${why}):\n${server.output()}`));
    server.ended.then(
      (status) => gone(`status ${status}`),
      (failure: Error) => gone(failure.message),
    );
  });
  try {
    const port = await withDeadline("start of the editor's server", startLimit, listening);
    return { port, output: server.output, writeSettings, stop };
  } catch (failure) {
    await stop();
    throw failure;
  }
}
