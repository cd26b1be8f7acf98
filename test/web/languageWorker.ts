import { basename, join } from "node:path";
import { createCleanup } from "../editor/cleanup.js";
import { openBrowser } from "../editor/openBrowser.js";
import { projectFolder } from "../editor/projectFolder.js";
import { withDeadline } from "../editor/withDeadline.js";
import { serveScripts } from "./fileServer.js";

/** Time an answer may take, ms. */
const answerLimit = 20_000;

/** A message of the language server protocol (JSON-RPC 2.0), as it crosses to the worker and back. */
export interface Message {
  jsonrpc: "2.0";
  id?: number | string;
  method?: string;
  params?: unknown;
  result?: unknown;
  error?: { code: number; message: string };
}

/** The language server of the web build, alive in a worker of a browser's page. */
export interface LanguageWorker {
  /** Asks and waits for the answer; refuses with the server's own words where it answers with an error. */
  request(method: string, params: unknown): Promise<unknown>;
  notify(method: string, params: unknown): Promise<void>;
  /** What it said unasked so far: notifications and its own requests. */
  said: Message[];
  /** Answers one of the server's own requests; those without an answer here get "method not found". */
  answer(method: string, give: (params: unknown) => unknown): void;
  close(): Promise<void>;
}

/** Starts `dist/server.web.js` (or another bundle) as a worker in a browser without a window. */
export async function startLanguageWorker(
  bundle = join(projectFolder(), "dist", "server.web.js"),
): Promise<LanguageWorker> {
  const cleanup = createCleanup();
  const said: Message[] = [];
  const answers = new Map<string, (params: unknown) => unknown>();
  const waiting = new Map<number | string, { done: (result: unknown) => void; refuse: (why: Error) => void }>();
  try {
    const files = await serveScripts([bundle]);
    cleanup.add("end of the file server", files.close);
    const browser = await openBrowser();
    cleanup.add("end of the browser", () => browser.close());
    const page = await browser.newPage();
    const post = (message: Message) => {
      return page.evaluate((posted) => {
        (globalThis as unknown as { worker: Worker }).worker.postMessage(posted);
      }, message);
    };
    const failAll = (why: string) => {
      for (const { refuse } of waiting.values()) refuse(new Error(why));
      waiting.clear();
    };
    await page.exposeFunction("fromWorker", async (message: Message) => {
      if (message.method === undefined) {
        const asked = message.id === undefined ? undefined : waiting.get(message.id);
        if (message.id !== undefined) waiting.delete(message.id);
        if (message.error !== undefined) asked?.refuse(new Error(message.error.message));
        else asked?.done(message.result);
        return;
      }
      said.push(message);
      if (message.id === undefined) return;
      const give = answers.get(message.method);
      const notFound = { code: -32601, message: `nobody answers ${message.method}` };
      await post({
        jsonrpc: "2.0",
        id: message.id,
        ...(give === undefined ? { error: notFound } : { result: (await give(message.params)) ?? null }),
      });
    });
    await page.exposeFunction("workerFailed", (words: string) => failAll(`the worker failed: ${words}`));
    await page.goto(`${files.address}/`);
    await page.evaluate((name) => {
      const scope = globalThis as unknown as {
        worker: Worker;
        fromWorker(message: unknown): Promise<void>;
        workerFailed(words: string): Promise<void>;
      };
      scope.worker = new Worker(name);
      scope.worker.addEventListener("message", ({ data }) => void scope.fromWorker(data));
      scope.worker.addEventListener(
        "error",
        ({ message }) => void scope.workerFailed(message || "could not be loaded"),
      );
    }, basename(bundle));
    let last = 0;
    return {
      said,
      async request(method, params) {
        const id = ++last;
        const answered = new Promise<unknown>((done, refuse) => waiting.set(id, { done, refuse }));
        answered.catch(() => undefined);
        await post({ jsonrpc: "2.0", id, method, params });
        return withDeadline(`answer to ${method}`, answerLimit, answered);
      },
      notify: (method, params) => post({ jsonrpc: "2.0", method, params }),
      answer: (method, give) => void answers.set(method, give),
      close: cleanup.run,
    };
  } catch (failure) {
    await cleanup.run();
    throw failure;
  }
}
