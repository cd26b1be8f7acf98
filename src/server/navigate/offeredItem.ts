import type { CompletionItem } from "vscode-languageserver";

/** Something that completion offers, before it is known what it replaces. */
export interface OfferedItem extends Omit<CompletionItem, "textEdit" | "insertText"> {
  readonly newText: string;
  /** offered also when it is typed out: it adds more than the word */
  readonly keepWhenTyped?: boolean;
}
