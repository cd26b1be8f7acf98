import assert from "node:assert/strict";
import { readFileSync, statSync } from "node:fs";
import { join } from "node:path";
import { build } from "esbuild";
import type { Browser, Page } from "playwright-core";
import { openBrowser } from "../editor/openBrowser.js";
import { projectFolder } from "../editor/projectFolder.js";

/** Greatest size of the page's script, bytes. */
const greatest = 600_000;

interface Patching {
  morph(old: Element, wanted: Element): void;
}

describe("the script of the preview's page", () => {
  it("is no larger than 600 kB", () => {
    const { size } = statSync(join(projectFolder(), "dist", "preview.js"));
    assert.ok(size > 100_000 && size <= greatest, `${size} bytes`);
  });

  it("holds plots that were compiled before: no Vega-Lite in it", () => {
    const script = readFileSync(join(projectFolder(), "dist", "preview.js"), "utf8");
    assert.ok(script.includes("concat_0_group"), "the compiled plot is there");
    assert.ok(!script.includes("vega-lite"), "its compiler is not");
  });
});

describe("patching the page", () => {
  let browser: Browser;
  let page: Page;
  before(async () => {
    const { outputFiles } = await build({
      absWorkingDir: projectFolder(),
      entryPoints: ["src/preview/morph.ts"],
      bundle: true,
      format: "iife",
      globalName: "patching",
      write: false,
    });
    browser = await openBrowser();
    page = await browser.newPage();
    await page.addScriptTag({ content: `${outputFiles[0]?.text}; globalThis.patching = patching;` });
  });
  after(() => browser.close());

  /** Shows one page, marks its elements, patches it to another; the markup then, and the names of the marked ones that stayed. */
  async function patched(from: string, to: string): Promise<{ markup: string; stayed: string[]; fresh: number }> {
    return page.evaluate(
      ([before, wanted]) => {
        const { patching } = globalThis as unknown as { patching: Patching };
        const old = document.createElement("main");
        old.innerHTML = before;
        const marked = new Set(old.querySelectorAll("*"));
        const next = new DOMParser().parseFromString(wanted, "text/html").body;
        patching.morph(old, next);
        const all = [...old.querySelectorAll("*")];
        return {
          markup: old.innerHTML,
          stayed: all.filter((one) => marked.has(one)).map((one) => one.id || one.localName),
          fresh: all.filter((one) => !marked.has(one)).length,
        };
      },
      [from, to] as const,
    );
  }

  it("gives what was wanted, whatever stood there", async () => {
    const pages = [
      "",
      "<p>one</p>",
      "<p>one</p><p>two <b>bold</b></p>",
      "<h3>head</h3><p>two</p>text<ul><li>a</li><li>b</li></ul>",
      '<table><tbody><tr><th scope="row">a</th><td>1</td></tr></tbody></table>',
      '<p class="x" title="t">one</p><!-- a remark --><p>three</p>',
    ];
    for (const from of pages) for (const to of pages) assert.equal((await patched(from, to)).markup, to);
  });

  it("keeps every element where only a number changed", async () => {
    const row = (k: string) => `<table><tbody><tr><th scope="row">k</th><td>${k}</td></tr></tbody></table><p>so</p>`;
    const { stayed, fresh } = await patched(row("1.2"), row("1.3"));
    assert.deepEqual([stayed.length, fresh], [6, 0]);
  });

  it("knows a part by its name where others came before it, and leaves its fold and its drawing alone", async () => {
    const part = (name: string, open: string, inner: string) =>
      `<details id="${name}" data-part="${name}"${open}><summary>${name}</summary>${inner}</details>`;
    const plot = (inner: string) => `<div data-plot="c" aria-label="old">${inner}</div>`;
    const from = part("seen", "", plot("<canvas></canvas>"));
    const to = `${part("done", " open", "<p>new</p>")}${part("seen", " open", plot("").replace("old", "new"))}`;
    const { markup, stayed } = await patched(from, to);
    assert.ok(stayed.includes("seen") && stayed.includes("canvas"), stayed.join(" "));
    assert.match(markup, /<details id="done" data-part="done" open="">/);
    assert.match(markup, /<details id="seen" data-part="seen"><summary>/);
    assert.match(markup, /<div data-plot="c" aria-label="new"><canvas><\/canvas><\/div>/);
  });
});
