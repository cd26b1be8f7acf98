import { type StatusChanged, statusChanged } from "../../contract/editorProtocol.js";
import type { Feature } from "../context.js";

/** Tells the client where each description stands; what failed goes into the log too. */
export const status: Feature = {
  capabilities: {},
  start(context) {
    context.loop.onStatus((uri, { state, ...more }) => {
      const milliseconds = "milliseconds" in more ? more.milliseconds : null;
      if ("why" in more) context.log(`The findings of ${uri} could not be worked out: ${more.why}`);
      const message: StatusChanged = { uri, state, milliseconds };
      void context.connection.sendNotification(statusChanged, message);
    });
  },
};
