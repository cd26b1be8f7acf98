import type { TextEdit } from "vscode-languageserver";
import type { TextDocument } from "vscode-languageserver-textdocument";
import { messageOf } from "../../contract/words.js";
import { type FormatNotation, type FormatOptions, formatEdits } from "../../language/format/formatText.js";
import type { Feature, ServerContext } from "../context.js";

/**
 * Formats a description, or a selection of its lines; the editor asks for the first on saving too where a person wants
 * that. The width of a level belongs to the language: the editor's tab size is not asked.
 */
export const formatting: Feature = {
  capabilities: { documentFormattingProvider: true, documentRangeFormattingProvider: true },
  start(context) {
    const { connection, documents } = context;
    connection.onDocumentFormatting(async ({ textDocument: { uri } }) => {
      const notation = await chosenNotation(context, uri);
      return editsOf(context, documents.get(uri), { notation });
    });
    connection.onDocumentRangeFormatting(async ({ textDocument: { uri }, range: { start, end } }) => {
      const notation = await chosenNotation(context, uri);
      // A selection of whole lines ends at the beginning of the line below them.
      const last = end.character === 0 && end.line > start.line ? end.line - 1 : end.line;
      return editsOf(context, documents.get(uri), { notation, lines: { first: start.line, last } });
    });
  },
};

function editsOf(context: ServerContext, document: TextDocument | undefined, options: FormatOptions): TextEdit[] {
  if (document === undefined) return [];
  const edits = formatEdits(document.uri, document.getText(), options);
  if (!edits.ok) {
    context.connection.window.showWarningMessage(messageOf(edits.problem));
    return [];
  }
  return edits.value.map(({ start, end, text }) => ({
    range: { start: document.positionAt(start), end: document.positionAt(end) },
    newText: text,
  }));
}

/** The setting `ratewright.notation.ascii` as it is for this description: folders may differ in it. */
async function chosenNotation({ connection, client }: ServerContext, scopeUri: string): Promise<FormatNotation> {
  if (!client.abilities.configuration) return "unicode";
  const answer: unknown = await connection.workspace.getConfiguration({ scopeUri, section: "ratewright" });
  const notation = valueIn(answer, "notation");
  return valueIn(notation, "ascii") === true ? "ascii" : "unicode";
}

function valueIn(record: unknown, name: string): unknown {
  if (typeof record !== "object" || record === null) return undefined;
  return new Map<string, unknown>(Object.entries(record)).get(name);
}
