import assert from "node:assert/strict";
import { type CodeLens, commands, languages, Uri, window, workspace } from "vscode";
import { until } from "../editor/until.js";
import { folder, openCopy, openDescription, untilShown } from "./descriptions.js";

/** The lines above a description, as they read. */
async function lensTitles(uri: Uri): Promise<string[]> {
  const lenses = await commands.executeCommand<CodeLens[]>("vscode.executeCodeLensProvider", uri, 10);
  return lenses.map(({ command }) => command?.title ?? "");
}

async function untilLens(uri: Uri, wanted: string): Promise<void> {
  await until(`the line “${wanted}”`, async () => (await lensTitles(uri)).some((title) => title.startsWith(wanted)));
}

async function isThere(uri: Uri): Promise<boolean> {
  return workspace.fs.stat(uri).then(
    () => true,
    () => false,
  );
}

describe("records in the real editor", () => {
  it("stand above the text: up to date beside the sample, none beside its copy", async () => {
    const sample = await openDescription("gas.raterun");
    await untilLens(sample.uri, "record up to date");
    const copy = await openCopy("gas.raterun", "without-record.raterun");
    await untilShown(copy, []);
    // The folder is not trusted here, so nothing offers to write.
    assert.deepEqual(await lensTitles(copy.uri), []);
  });

  it("are not written in Restricted Mode", async () => {
    const copy = await openCopy("gas.raterun", "restricted.raterun");
    await untilShown(copy, []);
    assert.equal(workspace.isTrusted, false);
    void commands.executeCommand("ratewright.writeRecord", copy.uri);
    await new Promise((done) => setTimeout(done, 1_000));
    assert.equal(await isThere(Uri.joinPath(folder(), "restricted.raterecord")), false);
  });

  it("become stale with the text; the difference opens as a text to read", async () => {
    const record = Uri.joinPath(folder(), "stale.raterecord");
    await workspace.fs.copy(Uri.joinPath(folder(), "gas.raterecord"), record, { overwrite: true });
    const copy = await openCopy("gas.raterun", "stale.raterun", (text) => text.replace("10.0 mL", "10.1 mL"));
    await untilLens(copy.uri, "record stale: the description changed, ");
    await commands.executeCommand("ratewright.showRecordDifference", copy.uri);
    const shown = window.activeTextEditor?.document;
    assert.equal(shown?.uri.scheme, "ratewright-record");
    assert.match(
      shown?.getText() ?? "",
      /^stale\.raterun: not as recorded\.\n {2}What the description means changed\./,
    );
    assert.match(shown?.getText() ?? "", /\n {2}run A: H2O2 taken moved from 10 mL to 10\.1 mL\.\n/);
  });

  it("are JSON to the editor, checked by their schema", async () => {
    const record = Uri.joinPath(folder(), "checked.raterecord");
    const text = new TextDecoder().decode(await workspace.fs.readFile(Uri.joinPath(folder(), "gas.raterecord")));
    await workspace.fs.writeFile(
      record,
      new TextEncoder().encode(text.replace('"stop": "converged"', '"stop": "tired"')),
    );
    const document = await workspace.openTextDocument(record);
    assert.equal(document.languageId, "json");
    await window.showTextDocument(document);
    await until("the schema's complaint", () => languages.getDiagnostics(record).length > 0);
    const said = languages.getDiagnostics(record).map(({ message }) => message);
    assert.equal(said.length, 1, said.join("; "));
    assert.match(said[0] ?? "", /converged/);
    const sound = await workspace.openTextDocument(Uri.joinPath(folder(), "gas.raterecord"));
    await window.showTextDocument(sound);
    await new Promise((done) => setTimeout(done, 500));
    assert.deepEqual(languages.getDiagnostics(sound.uri), []);
  });
});
