import { createServer } from "node:http";
import type { AddressInfo } from "node:net";
import { createCleanup } from "./cleanup.js";
import { editorAddress } from "./editorAddress.js";
import { startEditorServer } from "./editorServer.js";
import { stageExtension } from "./stageExtension.js";

/** Serves the editor with the project's extension on a folder, prints its address, and goes on until Ctrl-C. */
export async function serveEditor(workspace: string): Promise<void> {
  const say = (line: string) => console.log(line);
  const cleanup = createCleanup();
  const asked = new Promise<void>((done) => {
    for (const signal of ["SIGINT", "SIGTERM"] as const) process.on(signal, () => done());
  });
  try {
    const settings = { "workbench.startupEditor": "none", "chat.commandCenter.enabled": false };
    const editor = await startEditorServer({ settings, say });
    cleanup.add("end of the editor's server", editor.stop);
    const extension = stageExtension();
    cleanup.add("removal of the copied extension", extension.remove);
    const page = editorAddress(editor.port, { workspace, extensionDevelopmentPath: extension.path });
    // The editor's own address carries folder and extension and is too long for a terminal: a short one leads to it.
    const door = createServer((_, answer) => answer.writeHead(302, { location: page }).end());
    await new Promise<void>((done) => door.listen(0, "127.0.0.1", done));
    cleanup.add("end of the short address", () => {
      door.closeAllConnections();
      door.close();
    });
    const { port } = door.address() as AddressInfo;
    say(`\nThe editor on the samples: http://127.0.0.1:${port}/   (Ctrl-C ends it)`);
    await asked;
  } finally {
    await cleanup.run();
  }
}
