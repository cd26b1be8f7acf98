import type { Locator } from "playwright-core";
import { until } from "../editor/until.js";
import type { Session } from "./session.js";
import { type TextPlace, textPlace } from "./textPlace.js";

/** Time without movement after which a text is taken to stand still, ms. */
const atRest = 400;

/** What a hover shows. */
export interface ShownHover {
  /** Its words, in the order on screen. */
  text: string;
  /** Sources of its pictures. */
  pictures: string[];
  element: Locator;
}

/** Rests the mouse on the middle of a text in the active editor and waits for the hover that comes. */
export async function hoverAt(session: Session, text: string, occurrence = 1): Promise<ShownHover> {
  const { page } = session;
  const { left, top, width, height } = await placeAtRest(session, text, occurrence);
  const [x, y] = [left + width / 2, top + height / 2];
  // A short way to the place: the editor takes a jump without a last small step for no movement.
  await page.mouse.move(x - 2, y);
  await page.mouse.move(x, y);
  const element = page.locator(".monaco-hover:not(.hidden) .monaco-hover-content").first();
  await element.waitFor();
  await element.locator(".hover-contents, .hover-row").first().waitFor();
  const pictures = await element.locator("img").evaluateAll((images) => {
    return images.map((image) => image.getAttribute("src") ?? "");
  });
  // biome-ignore lint/performance/useDomNodeTextContent: the line breaks between the hover's parts are wanted as shown
  return { text: (await element.innerText()).replaceAll("\u00a0", " "), pictures, element };
}

/** Where the text stands once it has stood still: a line above it, as one about the record, moves it when it comes. */
async function placeAtRest(session: Session, text: string, occurrence: number): Promise<TextPlace> {
  let place = await textPlace(session, text, occurrence);
  await until("the text stands still", async () => {
    await session.page.waitForTimeout(atRest);
    const before = place;
    place = await textPlace(session, text, occurrence);
    return before.top === place.top && before.left === place.left;
  });
  return place;
}

/** Takes the mouse off the text, so that the hover goes. */
export async function leaveHover({ page }: Session): Promise<void> {
  await page.keyboard.press("Escape");
  await page.mouse.move(2, 2);
  await page.locator(".monaco-hover:not(.hidden) .monaco-hover-content").first().waitFor({ state: "hidden" });
}
