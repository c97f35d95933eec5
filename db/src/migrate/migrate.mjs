import { fileURLToPath } from "node:url";
import { createConnection } from "mysql2/promise";
import { PlainError } from "../server/plain-error.mjs";
import { changesRowsOnly, isAlreadyThere } from "./already-there.mjs";
import { takeLease } from "./lease.mjs";
import { readStatements } from "./read-statements.mjs";

/** @typedef {import("mysql2/promise").Connection} Connection */
/** @typedef {import("mysql2/promise").RowDataPacket} RowDataPacket */
/** @typedef {import("./read-statements.mjs").MigrationStatement} MigrationStatement */

/**
 * Where a migration stands: `started` (recorded, not run yet), `executed` (run, not recorded), `finished`.
 *
 * @typedef {"started" | "executed" | "finished"} Phase
 * @typedef {(phase: Phase, statement: MigrationStatement) => void | Promise<void>} PhaseListener
 */

/** The migrations of the product. */
export const migrationsFolder = fileURLToPath(new URL("../../migrations", import.meta.url));

/**
 * Brings a database to the newest schema, statement by statement.
 *
 * Each statement is recorded with its hash before it runs and again when it is done, so a run that was killed
 * after any statement goes on from there. One process migrates at a time; others wait for it. Applied files must
 * never change: a difference is refused before anything is run.
 *
 * @param {object} options
 * @param {string} options.url `mysql://...` of the migrator
 * @param {string} [options.folder] default {@link migrationsFolder}
 * @param {number} [options.leaseSeconds] how long one statement may take before others may take over, default 600
 * @param {number} [options.waitSeconds] how long to wait for another migration, default 120
 * @param {(line: string) => void} [options.report]
 * @param {PhaseListener} [options.onPhase] told of every step, for tests that stop in the middle
 * @returns {Promise<{ applied: number, total: number }>} statements run now, and statements in all
 * @throws {PlainError} when an applied statement was changed or removed, when a statement fails, or when another
 * migration does not end
 */
export async function applyMigrations({
  url,
  folder = migrationsFolder,
  leaseSeconds = 600,
  waitSeconds = 120,
  report = () => undefined,
  onPhase = () => undefined,
}) {
  const statements = readStatements(folder);
  const connection = await createConnection({ uri: url, timezone: "Z" });
  try {
    const lease = await takeLease(connection, { seconds: leaseSeconds, waitSeconds, report });
    try {
      const records = await readRecords(connection);
      refuseChanges(statements, records);
      const open = statements.filter((statement) => records.get(keyOf(statement))?.isFinished !== true);
      for (const [index, statement] of open.entries()) {
        await lease.renew();
        if (index === 0 || open[index - 1]?.file !== statement.file) report(`applying ${statement.file}`);
        await applyStatement(connection, statement, records.has(keyOf(statement)), onPhase);
      }
      return { applied: open.length, total: statements.length };
    } finally {
      await lease.release().catch(() => undefined);
    }
  } finally {
    await connection.end().catch(() => connection.destroy());
  }
}

/**
 * @param {Connection} connection
 * @param {MigrationStatement} statement
 * @param {boolean} wasStarted an earlier run recorded the start and was killed before recording the end
 * @param {PhaseListener} onPhase
 */
async function applyStatement(connection, statement, wasStarted, onPhase) {
  const { file, position, sql, hash } = statement;
  await connection.query(
    `insert ignore into migration_statement (file, position, hash, started_at) values (?, ?, ?, utc_timestamp(3))`,
    [file, position, hash],
  );
  await onPhase("started", statement);
  try {
    // Rows and the record of them are one transaction; a schema statement commits by itself either way.
    if (changesRowsOnly(sql)) await connection.beginTransaction();
    await connection.query(sql);
  } catch (error) {
    if (!wasStarted || !isAlreadyThere(sql, toSqlError(error))) {
      await forgetStart(connection, statement);
      throw new PlainError(
        `Statement ${position} of ${file} did not succeed: ${toSqlError(error).message ?? "unknown reason"}. ` +
          "Everything before it is applied and recorded; put the statement right, then start again.",
      );
    }
  }
  await onPhase("executed", statement);
  await connection.query(
    "update migration_statement set finished_at = utc_timestamp(3) where file = ? and position = ?",
    [file, position],
  );
  await connection.commit();
  await onPhase("finished", statement);
}

/**
 * A statement that failed in plain sight has changed nothing, so the next run must judge it as new. When the
 * connection is lost the record stays, because then nobody knows whether it ran.
 *
 * @param {Connection} connection
 * @param {MigrationStatement} statement
 */
async function forgetStart(connection, { file, position }) {
  try {
    await connection.rollback();
    await connection.query("delete from migration_statement where file = ? and position = ?", [
      file,
      position,
    ]);
  } catch {
    // Connection lost: see above.
  }
}

/**
 * @param {Connection} connection
 * @returns {Promise<Map<string, { hash: string, isFinished: boolean }>>}
 */
async function readRecords(connection) {
  await connection.query(
    `create table if not exists migration_statement (
       file varchar(200) not null,
       position int not null,
       hash char(64) not null,
       started_at datetime(3) not null,
       finished_at datetime(3) null,
       primary key (file, position)
     )`,
  );
  const [rows] = await connection.query("select file, position, hash, finished_at from migration_statement");
  return new Map(
    /** @type {RowDataPacket[]} */ (rows).map((row) => [
      keyOf({ file: String(row["file"]), position: Number(row["position"]) }),
      { hash: String(row["hash"]), isFinished: row["finished_at"] !== null },
    ]),
  );
}

/**
 * @param {MigrationStatement[]} statements
 * @param {Map<string, { hash: string, isFinished: boolean }>} records
 */
function refuseChanges(statements, records) {
  const known = new Map(statements.map((statement) => [keyOf(statement), statement]));
  for (const [key, record] of records) {
    const statement = known.get(key);
    if (statement === undefined) {
      throw new PlainError(
        `This database has a migration that this version of Emberladder does not know (${key}). Nothing was ` +
          "changed. Start the newer version, or restore a backup made with this one.",
      );
    }
    if (statement.hash !== record.hash) {
      throw new PlainError(
        `${key} was changed after it had been applied to this database. Nothing was changed now. ` +
          "Put the file back as it was, and write the change as a new migration.",
      );
    }
  }
}

/** @param {{ file: string, position: number }} statement */
function keyOf({ file, position }) {
  return `statement ${position} of ${file}`;
}

/**
 * @param {unknown} error
 * @returns {{ errno?: number, message?: string }}
 */
function toSqlError(error) {
  return error instanceof Error ? error : { message: String(error) };
}
