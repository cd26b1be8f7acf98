/** What a command writes to and where it stands; injected, so that tests need no process. */
export interface Io {
  readonly cwd: string;
  out(text: string): void;
  err(text: string): void;
}

/** 0: no error and nothing moved; 1: an error, or something moved; 2: misuse. */
export type ExitStatus = 0 | 1 | 2;
