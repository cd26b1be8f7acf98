/** How npm is started from a script. */
export function npmCommand(args: readonly string[]): { command: string; args: string[]; shell: boolean };

/** The environment for an npm started from a script; a name with `undefined` is not passed on. */
export function npmEnvironment(): { [name: string]: string | undefined };
