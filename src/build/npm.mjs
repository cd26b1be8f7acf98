/**
 * How npm is started from a script: by the file that runs already where this script was started by npm, else by name.
 * @param {readonly string[]} args
 * @returns {{ command: string, args: string[], shell: boolean }}
 */
export function npmCommand(args) {
  const running = process.env.npm_execpath;
  if (running?.endsWith(".js")) return { command: process.execPath, args: [running, ...args], shell: false };
  const windows = process.platform === "win32";
  return { command: windows ? "npm.cmd" : "npm", args: [...args], shell: windows };
}

/** Variables with which npm tells its scripts about their own package; an npm started from there must not hear them. */
const aboutThisPackage =
  /^(npm_package_|npm_lifecycle_|npm_config_local_prefix$|npm_command$|npm_config_global_prefix$|INIT_CWD$)/;

/**
 * The environment for an npm started from a script: the caller's own, without what npm says of the running script.
 * @returns {{ [name: string]: string | undefined }}
 */
export function npmEnvironment() {
  const environment = { ...process.env };
  for (const name of Object.keys(environment)) if (aboutThisPackage.test(name)) environment[name] = undefined;
  // Development packages are needed here whatever the caller's NODE_ENV says.
  environment.NODE_ENV = undefined;
  return environment;
}
