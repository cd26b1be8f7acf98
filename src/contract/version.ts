import { version as packageVersion } from "../../package.json";

/** Version of the program, as findings and records state it. */
export const version: string = packageVersion;
