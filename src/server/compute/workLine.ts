/** A worker of either kind, seen from the server: messages there and back, and its end. */
export interface WorkLine {
  post(message: unknown): void;
  /** Ends it at once, whatever it does. */
  end(): void;
}

/** What a line tells whoever opened it. After `broken` nothing comes any more. */
export interface WorkLineEvents {
  message(message: unknown): void;
  /** it ended by itself: a crash, or its memory is full */
  broken(words: string): void;
}

export type OpenWorkLine = (events: WorkLineEvents) => WorkLine;
