import { setTimeout as sleep } from "node:timers/promises";
import { drizzle } from "drizzle-orm/mysql2";
import type { Database, Transaction } from "./client.ts";
import { transactionPoolOf } from "./client.ts";

/** Deadlock, lock wait too long, and (on a cluster) node not ready: the same work may succeed when repeated. */
const REPEATABLE = new Set([1213, 1205, 1047]);
const ATTEMPTS = 4;

/**
 * The error of the database driver inside an error of the query builder, without its message: that may hold
 * the values of the query.
 */
export function readDatabaseError(error: unknown): { code: string; errno: number } | undefined {
  let current: unknown = error;
  for (let depth = 0; depth < 4 && current instanceof Error; depth += 1) {
    const { code, errno } = current as { code?: unknown; errno?: unknown };
    if (typeof code === "string" && (typeof errno === "number" || errno === undefined))
      return { code, errno: errno ?? 0 };
    current = current.cause;
  }
  return undefined;
}

/** Whether an error says that a unique key is taken already, and by which key (MariaDB error 1062). */
export function readDuplicateKey(error: unknown): string | undefined {
  let current: unknown = error;
  for (let depth = 0; depth < 4 && current instanceof Error; depth += 1) {
    const { errno, sqlMessage } = current as { errno?: unknown; sqlMessage?: unknown };
    if (errno === 1062) return /for key '(?:[^'.]*\.)?([^']+)'/.exec(String(sqlMessage))?.[1] ?? "";
    current = current.cause;
  }
  return undefined;
}

/** Whether an error says that a row names another row that there is not (MariaDB error 1452). */
export function isReferenceMissing(error: unknown): boolean {
  return readDatabaseError(error)?.errno === 1452;
}

const AWAY_CODES = new Set([
  "ECONNREFUSED",
  "ECONNRESET",
  "EPIPE",
  "ETIMEDOUT",
  "ENOENT",
  "PROTOCOL_CONNECTION_LOST",
  "PROTOCOL_ENQUEUE_AFTER_FATAL_ERROR",
  "PROTOCOL_SEQUENCE_TIMEOUT",
  "POOL_CLOSED",
  "ER_SERVER_SHUTDOWN",
  "ER_CON_COUNT_ERROR",
  "ER_TOO_MANY_USER_CONNECTIONS",
  "ER_CONNECTION_KILLED",
  "ER_QUERY_INTERRUPTED",
  "ER_UNKNOWN_COM_ERROR",
  "ER_LOCK_DEADLOCK",
  "ER_LOCK_WAIT_TIMEOUT",
  "ER_RECORD_FILE_FULL",
  "ER_DISK_FULL",
]);

/** Whether an error means that the database is away or overloaded, so that trying again later can help. */
export function isDatabaseAway(error: unknown): boolean {
  const found = readDatabaseError(error);
  if (found) return AWAY_CODES.has(found.code);
  let current: unknown = error;
  for (let depth = 0; depth < 4 && current instanceof Error; depth += 1) {
    // The driver's own refusals carry no code. The last is what undoing a transaction meets on a broken connection.
    if (
      /^(Queue limit reached|Pool is closed|No connections available|Can't add new command)/.test(
        current.message,
      )
    )
      return true;
    current = current.cause;
  }
  return false;
}

/**
 * Runs work in a transaction: all of it or nothing. Work that lost a deadlock is repeated a few times with a
 * short random pause, so it must not do anything outside the database.
 *
 * @param pause random number from 0 to 1, for tests
 */
export async function inTransaction<T>(
  database: Database,
  work: (transaction: Transaction) => Promise<T>,
  pause: () => number = Math.random,
): Promise<T> {
  return repeatWhereItHelps(async () => runOnce(database, work), pause);
}

/** Does work again, a few times with a short random pause, where it lost a deadlock or waited too long. */
export async function repeatWhereItHelps<T>(
  work: () => Promise<T>,
  pause: () => number = Math.random,
): Promise<T> {
  for (let attempt = 1; ; attempt += 1) {
    try {
      return await work();
    } catch (error) {
      const { errno } = readDatabaseError(error) ?? { errno: 0 };
      if (attempt === ATTEMPTS || !REPEATABLE.has(errno)) throw error;
      await sleep(attempt * 10 + pause() * 20);
    }
  }
}

async function runOnce<T>(database: Database, work: (transaction: Transaction) => Promise<T>): Promise<T> {
  const connection = await transactionPoolOf(database).getConnection();
  let result: T;
  try {
    result = await work(drizzle({ client: connection }));
    await connection.commit();
  } catch (error) {
    // A connection on which the undoing fails is broken; ending it undoes the transaction as well.
    await connection.rollback().then(
      () => connection.release(),
      () => connection.destroy(),
    );
    throw error;
  }
  connection.release();
  return result;
}
