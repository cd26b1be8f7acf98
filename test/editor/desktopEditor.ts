import { existsSync } from "node:fs";

/**
 * The desktop editor to test with: the executable that `RATEWRIGHT_VSCODE` names, where there is a display for it.
 * `undefined` where it names none or nothing can be shown; refuses where the named file is not there.
 */
export function desktopEditor(environment: { [name: string]: string | undefined } = process.env): string | undefined {
  const executable = environment["RATEWRIGHT_VSCODE"];
  if (!executable) return undefined;
  if (!existsSync(executable)) throw new Error(`RATEWRIGHT_VSCODE names ${executable}, which is not there`);
  const display = process.platform !== "linux" || environment["DISPLAY"] || environment["WAYLAND_DISPLAY"];
  return display ? executable : undefined;
}
