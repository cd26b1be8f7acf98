import assert from "node:assert/strict";
import fc from "fast-check";
import { escapeHtml, escapeMarkdown, markdownPicture } from "../../src/report/escape.js";
import { html, readyMarkup } from "../../src/report/html.js";
import { hostileTexts } from "./invented.js";

/** What a page shows of escaped text: the entities read back. */
function shown(escaped: string): string {
  const signs: Record<string, string> = { amp: "&", lt: "<", gt: ">", quot: '"', "#39": "'", "#96": "`" };
  return escaped.replace(/&(amp|lt|gt|quot|#39|#96);/g, (_, name: string) => signs[name] ?? "");
}

describe("escaping", () => {
  it("leaves no sign with a meaning in HTML, in content or in quotes of either kind", () => {
    fc.assert(
      fc.property(fc.oneof(fc.constantFrom(...hostileTexts), fc.string({ unit: "binary" })), (text) => {
        const escaped = escapeHtml(text);
        assert.doesNotMatch(escaped, /[<>"'`]|&(?!(amp|lt|gt|quot|#39|#96);)/);
      }),
      { seed: 4, numRuns: 500 },
    );
  });

  it("shows the text as it was", () => {
    for (const text of ["a < b & c > d", `"it's"`, "`x`", "µ·₂ ⇌ 5 °C", "line\nbreak\ttab", "&lt;"]) {
      assert.equal(shown(escapeHtml(text)), text);
    }
  });

  it("shows control signs, turned reading and halves of a pair as the replacement sign", () => {
    assert.equal(escapeHtml("a\u0000b\u001bc\u202ed\ud800e\u0085"), "a\ufffdb\ufffdc\ufffdd\ufffde\ufffd");
    assert.equal(escapeHtml("\u{1f9ea}"), "\u{1f9ea}", "a whole pair stays");
  });

  it("leaves no markup in Markdown", () => {
    fc.assert(
      fc.property(fc.oneof(fc.constantFrom(...hostileTexts), fc.string({ unit: "binary" })), (text) => {
        const escaped = escapeMarkdown(text);
        assert.doesNotMatch(escaped, /[\n\r<>$@]/);
        assert.doesNotMatch(escaped, /:\/\/|\bwww\./i, "no link that Markdown finds by itself");
        assert.doesNotMatch(escaped.replace(/\\[\\`*_{}[\]|~!]/g, ""), /[\\`*_{}[\]|~!]/, "each is behind a backslash");
        assert.doesNotMatch(escaped, /&(?!#\d+;)/);
      }),
      { seed: 5, numRuns: 500 },
    );
  });

  it("keeps quantities readable in the source of Markdown", () => {
    for (const text of ["5.502(73)e-4 min^-1", "0.10508(17) mmol L^-1 min^-1", "-1.0(19) d^-1", "1 +/- 1.0e-30"]) {
      assert.equal(escapeMarkdown(text), text);
    }
  });

  it("puts a picture into Markdown as bytes that read back to it", () => {
    const svg = `<svg xmlns="http://www.w3.org/2000/svg"><title>c(µ) ](x) " \u{1f9ea}</title></svg>`;
    const markdown = markdownPicture("a ] b\n![", svg, 360.4);
    const found = /^!\[a \\\] b \\!\\\[\]\(data:image\/svg\+xml;base64,([A-Za-z0-9+/=]+)\|width=360\)$/.exec(markdown);
    assert.equal(Buffer.from(found?.[1] ?? "", "base64").toString("utf8"), svg);
  });
});

describe("html", () => {
  it("escapes what is put in, and only once", () => {
    const inner = html`<b>${"<i>"}</b>`;
    assert.equal(
      html`<p title="${'"'}">${inner}${[inner, html``]}${3}</p>`.markup,
      '<p title="&quot;"><b>&lt;i&gt;</b><b>&lt;i&gt;</b>3</p>',
    );
    assert.equal(html`${readyMarkup("<svg/>")}`.markup, "<svg/>");
  });
});
