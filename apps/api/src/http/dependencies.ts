import { randomBytes } from "node:crypto";
import type { Database } from "@emberladder/db";
import type { Logger } from "pino";
import { v7 as uuidv7 } from "uuid";
import type { Environment } from "#config/environment.ts";

/** What the whole server is built on; tests put in their own clock and their own database. */
export interface Dependencies {
  environment: Environment;
  database: Database;
  log: Logger;
  /** The server's clock, UTC milliseconds. */
  clock: () => number;
  /** A new id of a row: UUIDv7. */
  newId: () => string;
  /** Random bytes from the system's own source, for secrets. */
  random: (bytes: number) => Uint8Array;
}

/** Clock, ids and randomness as a running server uses them. */
export const realSources = {
  clock: () => Date.now(),
  newId: () => uuidv7(),
  random: (bytes: number) => new Uint8Array(randomBytes(bytes)),
};
