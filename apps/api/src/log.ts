import { pino } from "pino";
import type { Logger } from "pino";
import type { Environment } from "#config/environment.ts";

/** JSON lines on standard output, times in UTC. Callers pass ids and codes; nothing secret is ever logged. */
export function createLog({ logLevel }: Pick<Environment, "logLevel">, program: string): Logger {
  return pino({
    level: logLevel,
    base: { program },
    timestamp: pino.stdTimeFunctions.isoTime,
    redact: { paths: ["*.password", "*.token", "*.cookie", "*.secret"], censor: "[kept secret]" },
  });
}
