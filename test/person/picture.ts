import { mkdirSync } from "node:fs";
import { join } from "node:path";
import { projectFolder } from "../editor/projectFolder.js";
import type { Session } from "./session.js";
import { changeTheme } from "./theme.js";
import { type ThemeKind, themes } from "./themes.js";

/** Takes a picture of the whole window to `artefacts/NAME.png` and answers with its path. */
export async function takePicture({ page }: Session, name: string): Promise<string> {
  const folder = join(projectFolder(), "artefacts");
  mkdirSync(folder, { recursive: true });
  const path = join(folder, `${name}.png`);
  await page.screenshot({ path, animations: "disabled" });
  return path;
}

/** Takes the picture in each kind of theme, to `artefacts/NAME.KIND.png`. */
export async function takePictures(session: Session, name: string): Promise<void> {
  for (const kind of Object.keys(themes) as ThemeKind[]) {
    await changeTheme(session, kind);
    await takePicture(session, `${name}.${kind}`);
  }
}
