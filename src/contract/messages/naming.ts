import { message } from "../message.js";

/** Giving something another name: why it is refused. */
export const namingMessages = {
  "rename-formula": message(
    "error",
    "A formula was to be renamed, which says itself what it is.",
    ({ formula }: { formula: string }) =>
      `${formula} is a formula, not a name, so it cannot be renamed. Declare a name with a line such as: species NAME is ${formula}.`,
  ),
  "rename-unsure": message(
    "error",
    "A name was not changed, because a line with a mistake may use it too.",
    ({ name, line }: { name: string; line: number }) =>
      `Line ${line} has a mistake and holds “${name}” too, so it is not sure what it means there. Put that line right first.`,
  ),
  "rename-changes": message(
    "error",
    "A name was not changed, because the description would then say something else.",
    ({ name, why }: { name: string; why: string }) =>
      `With the name “${name}” the description would say something else. ${why} Choose another name.`,
  ),
} as const;
