import { takePicture } from "./picture.js";
import { openSession, type Session, type SessionOptions } from "./session.js";

/** Lines of the page's console shown with a failure. */
const linesShown = 20;

/**
 * Opens a session, does what a person does, and closes it whatever happens. After a failure a picture of the window is
 * left as `artefacts/failed-NAME.png` and the end of the page's console stands in the failure's words.
 */
export async function withSession<T>(
  name: string,
  options: SessionOptions,
  act: (session: Session) => Promise<T>,
): Promise<T> {
  const session = await openSession(options);
  try {
    return await act(session);
  } catch (failure) {
    const words = failure instanceof Error ? failure.message : String(failure);
    const picture = await takePicture(session, `failed-${name}`).then(
      () => `the window then: artefacts/failed-${name}.png`,
      (why: Error) => `no picture: ${why.message}`,
    );
    const lines = session.console.slice(-linesShown).map((line) => line.slice(0, 500));
    throw new Error([words, picture, "the page's console:", ...lines].join("\n"), { cause: failure });
  } finally {
    await session.close();
  }
}
