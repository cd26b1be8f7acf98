/**
 * What the editor's server and page complain of although nothing is wrong here: the native modules that are left out on
 * purpose, the extension gallery that is out of reach, the trust dialog refused in tests, and its talk of connections.
 */
const harmless = [
  /spdlog|watchdog|native-watchdog|kerberos|node-pty|ripgrep|Could not locate the bindings file/,
  /open-vsx\.org|extension gallery|Updating additional builtin extensions cache/,
  /refused to show dialog in tests\. Contents: Do you trust/,
  /(Creating a socket|Resolving connection token|Resolved connection token)/,
  /ChatSessionStore|\[Service Worker\] registration/,
];

/** Whether a line of the editor's log is one of those that mean nothing for the tests. */
export const isHarmless = (line: string): boolean => harmless.some((pattern) => pattern.test(line));
