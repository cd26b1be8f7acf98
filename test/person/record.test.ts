import assert from "node:assert/strict";
import { existsSync, readFileSync, rmSync } from "node:fs";
import { join } from "node:path";
import { until } from "../editor/until.js";
import { openFile } from "./openFile.js";
import { takePictures } from "./picture.js";
import type { Session } from "./session.js";
import { changeTheme } from "./theme.js";
import { save, select, type } from "./typing.js";
import { withSession } from "./withSession.js";

/** The lines above the text, as they read now. */
function lens({ page }: Session, words: string) {
  return page.locator(".editor-group-container.active .codelens-decoration a", { hasText: words });
}

/** A window in which the record of the gas sample is not written yet. */
async function withoutRecord(session: Session): Promise<string> {
  const record = join(session.workspace, "gas.raterecord");
  const before = readFileSync(record, "utf8");
  rmSync(record);
  await openFile(session, "gas.raterun");
  await lens(session, "no record yet: write it").waitFor();
  return before;
}

describe("a person with a record", () => {
  it("writes it by the line above the text, changes an amount, reads what moved, writes it anew", async () => {
    await withSession("record", { size: { width: 1280, height: 860 } }, async (session) => {
      const { page, workspace } = session;
      const record = join(workspace, "gas.raterecord");
      const committed = await withoutRecord(session);
      await takePictures(session, "record.none");
      await changeTheme(session, "light");
      await lens(session, "no record yet: write it").click();
      await lens(session, "record up to date").waitFor();
      assert.equal(readFileSync(record, "utf8"), committed);
      await page.locator(".statusbar-item", { hasText: "gas.raterecord is written." }).waitFor();
      await takePictures(session, "record.written");
      await changeTheme(session, "light");

      const line = readFileSync(join(workspace, "gas.raterun"), "utf8").split("\n");
      const at = line.findIndex((text) => text.includes("10.0 mL"));
      await select(session, at + 1, (line[at] ?? "").indexOf("10.0") + 1, 4);
      await type(session, "10.1");
      await lens(session, "record stale: the description changed").waitFor();
      await takePictures(session, "record.stale");
      await changeTheme(session, "light");

      await lens(session, "record stale").click();
      await page.locator(".tabs-container .tab.active", { hasText: "gas.raterecord — what moved" }).waitFor();
      const shown = page.locator(".editor-group-container.active .view-lines");
      await until("the difference in words", async () => {
        return ((await shown.textContent()) ?? "").replaceAll("\u00a0", " ").includes("H2O2 taken moved from 10 mL");
      });
      await takePictures(session, "record.difference");
      await changeTheme(session, "light");

      await page.locator(".tabs-container .tab", { hasText: "gas.raterun" }).click();
      await lens(session, "write it anew").click();
      await lens(session, "record up to date").waitFor();
      assert.match(readFileSync(record, "utf8"), /"what": "run A: H2O2 taken", "text": "10\.1 mL"/);
      // Writing the record saves the description first: it is one of the text on disk.
      assert.match(await save(session, "gas.raterun"), /10\.1 mL/);
    });
  });

  it("writes it where the server has no files of its own", async () => {
    await withSession("record.web", { host: "web" }, async (session) => {
      const committed = await withoutRecord(session);
      await lens(session, "no record yet: write it").click();
      await lens(session, "record up to date").waitFor();
      assert.equal(readFileSync(join(session.workspace, "gas.raterecord"), "utf8"), committed);
      assert.equal(existsSync(join(session.workspace, "gas.raterecord.new")), false);
    });
  });

  it("without trust reads that it is up to date, and is offered no writing", async () => {
    await withSession("record.restricted", { trust: false }, async (session) => {
      await openFile(session, "gas.raterun");
      await lens(session, "record up to date").waitFor();
      assert.equal(await lens(session, "write").count(), 0);
    });
  });
});
