import { randomUUID } from "node:crypto";
import { hostname } from "node:os";
import { setTimeout as sleep } from "node:timers/promises";
import { PlainError } from "../server/plain-error.mjs";
import { isRunning, markProcess } from "../server/processes.mjs";

/** @typedef {import("mysql2/promise").Connection} Connection */
/** @typedef {import("mysql2/promise").RowDataPacket} RowDataPacket */
/** @typedef {import("mysql2/promise").ResultSetHeader} ResultSetHeader */

/**
 * The right to migrate, held by one process at a time in the only row of `migration_lease`. A row with an expiry
 * is used because a named lock of the server is not seen by the other nodes of a cluster.
 *
 * - `renew()` must be called before each statement; it throws when somebody else has taken over
 * - `release()` gives it back
 *
 * @typedef {{ renew: () => Promise<void>, release: () => Promise<void> }} Lease
 */

/**
 * Waits for the lease and takes it. A lease that has run out is taken, and at once the lease of a process of this
 * machine that is no longer running.
 *
 * @param {Connection} connection
 * @param {{ seconds: number, waitSeconds: number, report: (line: string) => void }} options `seconds` is how long
 * the lease lasts when it is not renewed
 * @returns {Promise<Lease>}
 * @throws {PlainError} when it is still held after `waitSeconds`
 */
export async function takeLease(connection, { seconds, waitSeconds, report }) {
  const holder = describeHolder();
  await connection.query(
    `create table if not exists migration_lease (
       id tinyint not null primary key,
       holder varchar(200) null,
       expires_at datetime(3) not null
     )`,
  );
  await connection.query(
    "insert ignore into migration_lease (id, holder, expires_at) values (1, null, utc_timestamp(3))",
  );
  const deadline = Date.now() + waitSeconds * 1000;
  for (let isFirst = true; ; isFirst = false) {
    const other = await tryToTake(connection, holder, seconds);
    if (other === undefined) break;
    if (isFirst) report(`waiting for another migration to finish (${other})`);
    if (Date.now() > deadline) {
      throw new PlainError(
        `Another process is migrating this database (${other}) and did not finish within ${waitSeconds} seconds. ` +
          "Nothing was changed by this one. Try again when it is done.",
      );
    }
    await sleep(200);
  }
  return {
    renew: async () => {
      const [result] = await connection.query(
        `update migration_lease set expires_at = utc_timestamp(3) + interval ? second where id = 1 and holder = ?`,
        [seconds, holder],
      );
      if (/** @type {ResultSetHeader} */ (result).affectedRows !== 1) {
        throw new PlainError(
          "Another process has taken over this migration. This one stops; nothing is lost.",
        );
      }
    },
    release: async () => {
      await connection.query("update migration_lease set holder = null where id = 1 and holder = ?", [
        holder,
      ]);
    },
  };
}

/**
 * @param {Connection} connection
 * @param {string} holder
 * @param {number} seconds
 * @returns {Promise<string | undefined>} the holder who still has it; undefined when it is ours now
 */
async function tryToTake(connection, holder, seconds) {
  const [rows] = await connection.query("select holder from migration_lease where id = 1");
  const current = /** @type {RowDataPacket[]} */ (rows)[0]?.["holder"] ?? null;
  const isAbandoned = current !== null && hasEnded(current);
  const [result] = await connection.query(
    `update migration_lease set holder = ?, expires_at = utc_timestamp(3) + interval ? second
     where id = 1 and holder <=> ? and (holder is null or expires_at < utc_timestamp(3) or ?)`,
    [holder, seconds, current, isAbandoned],
  );
  return /** @type {ResultSetHeader} */ (result).affectedRows === 1 ? undefined : String(current);
}

/** @returns {string} `machine process start-time random` */
function describeHolder() {
  const mark = markProcess(process.pid);
  return `${hostname()} ${process.pid} ${mark?.startedAt ?? "unknown"} ${randomUUID()}`;
}

/**
 * Only a process of this very machine, in this boot, can be judged.
 *
 * @param {string} holder
 */
function hasEnded(holder) {
  const [machine, pid, startedAt = ""] = holder.split(" ");
  const ourBoot = markProcess(process.pid)?.startedAt.split("/")[0];
  if (machine !== hostname() || ourBoot === undefined || startedAt.split("/")[0] !== ourBoot) return false;
  return !isRunning({ pid: Number(pid), startedAt });
}
