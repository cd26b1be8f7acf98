import type { Command } from "./command.js";
import { check } from "./commands/check.js";
import { format } from "./commands/format.js";
import { record } from "./commands/record.js";
import { report } from "./commands/report.js";
import { verify } from "./commands/verify.js";

/** Every command, in the order of the help. */
export const commands: readonly Command[] = [check, report, record, verify, format];
