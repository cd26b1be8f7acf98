import type { CancellationToken } from "vscode-languageserver";

/** The protocol's cancellation as the signal that work is stopped by. */
export function abortSignalOf(token: CancellationToken): AbortSignal {
  const abort = new AbortController();
  if (token.isCancellationRequested) abort.abort();
  token.onCancellationRequested(() => abort.abort());
  return abort.signal;
}
