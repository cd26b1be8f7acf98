import assert from "node:assert/strict";
import { until } from "../editor/until.js";
import { hoverAt } from "./hover.js";
import { openFile } from "./openFile.js";
import { takePicture } from "./picture.js";
import { squiggles } from "./problems.js";
import { goTo } from "./typing.js";
import { withSession } from "./withSession.js";

describe("the picture of the readme", () => {
  it("shows a mistake underlined and the hover of a column: artefacts/overview.png, kept as media/overview.png", async () => {
    const options = { size: { width: 1080, height: 700 }, settings: { "editor.hover.above": false } };
    await withSession("overview", options, async (session) => {
      await openFile(session, "peroxide.raterun");
      const { page } = session;
      await page.locator(".statusbar-item", { hasText: "Ratewright: up to date" }).waitFor();
      await page.keyboard.press("Control+b");
      await goTo(session, 9, 9);
      await page.keyboard.press("Backspace");
      await until("a squiggle", async () => (await squiggles(session)).error >= 1);
      await goTo(session, 5, 1);
      const shown = await hoverAt(session, "c(H2O2) / mol L^-1", 1);
      assert.match(shown.text, /k = \d/);
      await shown.element.getByText("k =").first().waitFor();
      await takePicture(session, "overview");
    });
  });
});
