import { pino } from "pino";
import type { DestinationStream, Logger } from "pino";
import type { Environment } from "#config/environment.ts";

/** JSON lines, times in UTC, on standard output where no other place is named. Callers pass ids and codes; nothing secret is ever logged. */
export function createLog(
  { logLevel }: Pick<Environment, "logLevel">,
  program: string,
  destination?: DestinationStream,
): Logger {
  const options = {
    level: logLevel,
    base: { program },
    timestamp: pino.stdTimeFunctions.isoTime,
    redact: { paths: ["*.password", "*.token", "*.cookie", "*.secret"], censor: "[kept secret]" },
  };
  return destination ? pino(options, destination) : pino(options);
}
