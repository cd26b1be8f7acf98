import { Range, Uri, ViewColumn, window, workspace } from "vscode";

/** Opens a text at a line (from 1), beside the preview: in the column where it stands already, else in the first. */
export async function openAt(uri: string, line: number): Promise<void> {
  const address = Uri.parse(uri, true);
  const there = window.visibleTextEditors.find(({ document }) => document.uri.toString() === address.toString());
  const document = await workspace.openTextDocument(address);
  const row = document.lineAt(Math.max(0, Math.min(line, document.lineCount) - 1));
  const start = row.range.start.translate(0, row.firstNonWhitespaceCharacterIndex);
  await window.showTextDocument(document, {
    viewColumn: there?.viewColumn ?? ViewColumn.One,
    selection: new Range(start, start),
  });
}

/** Opens a data file with one of its rows selected. */
export async function openRow(uri: string, line: number): Promise<void> {
  const document = await workspace.openTextDocument(Uri.parse(uri, true));
  const row = document.lineAt(Math.max(0, Math.min(line, document.lineCount) - 1));
  await window.showTextDocument(document, { viewColumn: ViewColumn.One, selection: row.range });
}
