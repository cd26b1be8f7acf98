import { createReadStream, existsSync } from "node:fs";
import { createServer } from "node:http";
import type { AddressInfo } from "node:net";
import { basename } from "node:path";

/** An empty page at `/` and some files beside it by their names, served to a browser on this machine. */
export interface FileServer {
  address: string;
  close(): Promise<void>;
}

/** Serves the scripts (paths on disk) on a free port of 127.0.0.1. Refuses where one is not there. */
export async function serveScripts(paths: readonly string[]): Promise<FileServer> {
  const missing = paths.find((path) => !existsSync(path));
  if (missing !== undefined) throw new Error(`${basename(missing)} is not there: has the project been built?`);
  const byName = new Map(paths.map((path) => [`/${basename(path)}`, path]));
  const server = createServer((request, answer) => {
    const path = byName.get(request.url ?? "");
    if (path !== undefined) {
      answer.writeHead(200, { "content-type": "text/javascript; charset=utf-8" });
      createReadStream(path).pipe(answer);
    } else if (request.url === "/") {
      answer.writeHead(200, { "content-type": "text/html; charset=utf-8" });
      answer.end("<!doctype html><title>Worker</title>");
    } else answer.writeHead(404).end();
  });
  await new Promise<void>((done) => server.listen(0, "127.0.0.1", done));
  const { port } = server.address() as AddressInfo;
  return {
    address: `http://127.0.0.1:${port}`,
    async close() {
      server.closeAllConnections();
      await new Promise<void>((done) => server.close(() => done()));
    },
  };
}
