import assert from "node:assert/strict";
import { readdirSync, readFileSync } from "node:fs";
import { join, posix, sep } from "node:path";
import { docsPages } from "../../src/build/docs/pages.js";
import { anchor } from "../../src/build/docs/prose.js";
import { catalogue } from "../../src/contract/catalogue.js";
import { projectFolder } from "../editor/projectFolder.js";

const folder = join(projectFolder(), "media", "docs");
const remedy = "run node src/build/docs.mjs";

describe("the generated pages", () => {
  let pages: ReadonlyMap<string, string>;
  before(async () => {
    const made = await docsPages();
    assert.deepEqual(made.faults, []);
    pages = made.pages;
  });

  it(`are current (else ${remedy})`, () => {
    const there = readdirSync(folder, { recursive: true, encoding: "utf8" })
      .filter((name) => name.endsWith(".md"))
      .map((name) => name.split(sep).join("/"));
    assert.deepEqual(there.sort(), [...pages.keys()].sort(), remedy);
    for (const [path, text] of pages) {
      assert.ok(readFileSync(join(folder, path), "utf8") === text, `media/docs/${path} is not current: ${remedy}`);
    }
  });

  it("there is one for every code, and the list leads to it", () => {
    for (const code of Object.keys(catalogue)) {
      assert.match(pages.get(`codes/${code}.md`) ?? "", new RegExp(`^# .{10,}\\n[\\s\\S]*\`${code}\``), code);
      assert.ok(pages.get("codes/README.md")?.includes(`[${code}](${code}.md)`), code);
    }
  });

  it("every link between them leads to a page and to a heading of it", () => {
    for (const [path, text] of pages) {
      const prose = text.replace(/^```[\s\S]*?^```$/gm, "");
      for (const [, target = ""] of prose.matchAll(/\]\(([^)\s]+)\)/g)) {
        const [file = "", heading] = target.split("#");
        const page = pages.get(file === "" ? path : posix.join(posix.dirname(path), file));
        assert.ok(page !== undefined, `${path}: ${target}`);
        if (heading === undefined) continue;
        const anchors = [...page.matchAll(/^#+ (.*)$/gm)].map(([, words]) => anchor(words ?? ""));
        assert.equal(anchors.filter((one) => one === heading).length, 1, `${path}: ${target}`);
      }
    }
  });

  it("no page holds markup that a text brought in by accident", () => {
    for (const [path, text] of pages) {
      const prose = text
        .replace(/^```[\s\S]*?^```$/gm, "")
        .replace(/`[^`\n]*`/g, "")
        .replace(/<!--.*?-->/g, "");
      assert.doesNotMatch(prose, /<[a-z/]/i, path);
      assert.equal((text.match(/^```/gm) ?? []).length % 2, 0, path);
    }
  });
});
