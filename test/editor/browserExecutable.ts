import { chmodSync, existsSync, mkdirSync, renameSync, rmSync } from "node:fs";
import { delimiter, join } from "node:path";
import { projectFolder } from "./projectFolder.js";

/** Names under which a suitable browser is commonly found on the path of a Unix system (common practice). */
const commonNames = ["chromium", "chromium-browser", "google-chrome", "google-chrome-stable", "microsoft-edge"];

/** Where the installers of the two other systems put a suitable browser (common practice). */
const commonPlaces = [
  "/Applications/Chromium.app/Contents/MacOS/Chromium",
  "/Applications/Google Chrome.app/Contents/MacOS/Google Chrome",
  "/Applications/Microsoft Edge.app/Contents/MacOS/Microsoft Edge",
  ...["PROGRAMFILES", "PROGRAMFILES(X86)", "LOCALAPPDATA"].flatMap((name) => {
    const folder = process.env[name];
    if (folder === undefined) return [];
    return [
      join(folder, "Google", "Chrome", "Application", "chrome.exe"),
      join(folder, "Microsoft", "Edge", "Application", "msedge.exe"),
    ];
  }),
];

/**
 * The browser that drives the editor: the one named by `RATEWRIGHT_BROWSER` or `CHROME_PATH`, else one found on this
 * machine, else the one that a package carries. Refuses where a named one is not there.
 */
export async function browserExecutable(): Promise<string> {
  for (const name of ["RATEWRIGHT_BROWSER", "CHROME_PATH"]) {
    const named = process.env[name];
    if (!named) continue;
    if (existsSync(named)) return named;
    throw new Error(`${name} names ${named}, which is not there`);
  }
  const onPath = (process.env["PATH"] ?? "").split(delimiter).flatMap((folder) => {
    return commonNames.map((name) => join(folder, name));
  });
  const found = [...onPath, ...commonPlaces].find((path) => existsSync(path));
  return found ?? (await carriedBrowser());
}

/**
 * Unpacks the carried browser once. The package always unpacks to the system's temporary folder and takes whatever file
 * stands there for whole; a folder of our own, renamed when complete, survives an unpacking that was cut off.
 */
async function carriedBrowser(): Promise<string> {
  const folder = join(projectFolder(), "node_modules", ".cache", "ratewright-browser");
  const executable = join(folder, "chromium");
  if (existsSync(executable)) return executable;
  const { default: carried } = await import("@sparticuz/chromium");
  const unpacking = `${folder}-${process.pid}`;
  mkdirSync(unpacking, { recursive: true });
  const usual = process.env["TMPDIR"];
  process.env["TMPDIR"] = unpacking;
  try {
    await carried.executablePath();
    chmodSync(join(unpacking, "chromium"), 0o755);
    rmSync(folder, { recursive: true, force: true });
    renameSync(unpacking, folder);
  } finally {
    if (usual === undefined) delete process.env["TMPDIR"];
    else process.env["TMPDIR"] = usual;
    rmSync(unpacking, { recursive: true, force: true });
  }
  return executable;
}
