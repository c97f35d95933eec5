import { userInfo } from "node:os";
import { findProgram } from "./debian-packages.mjs";
import { PlainError } from "./plain-error.mjs";
import { runCommand } from "./run-command.mjs";

/**
 * Arguments with which MariaDB's own tools reach the server as its administrator: over the socket only, as the
 * operating-system user who made the data folder. There is no administrator password and no way in over TCP.
 *
 * @param {string} socket
 * @returns {string[]}
 */
export function administratorArguments(socket) {
  return ["--no-defaults", `--socket=${socket}`, `--user=${userInfo().username}`];
}

/**
 * Runs SQL as the administrator.
 *
 * @param {{ socket: string, sql: string, database?: string }} request
 * @returns {Promise<string[][]>} the rows of every result, as text, without headings
 * @throws {PlainError} with MariaDB's own message
 */
export async function administer({ socket, sql, database }) {
  const result = await runCommand(
    findProgram("mariadb") ?? "mariadb",
    [...administratorArguments(socket), "--batch", "--skip-column-names", ...(database ? [database] : [])],
    { input: sql },
  );
  if (result.code !== 0)
    throw new PlainError(`MariaDB refused an administrative step: ${result.stderr.trim()}`);
  return result.stdout
    .split("\n")
    .filter((line) => line !== "")
    .map((line) => line.split("\t"));
}

/**
 * Copies every table of one database, with keys, checks and rows, into another one that is made new.
 *
 * @param {{ socket: string, from: string, to: string }} request
 * @returns {Promise<void>}
 * @throws {PlainError} with MariaDB's own message
 */
export async function copyDatabase({ socket, from, to }) {
  const dump = await runCommand(findProgram("mariadb-dump") ?? "mariadb-dump", [
    ...administratorArguments(socket),
    "--single-transaction",
    "--skip-comments",
    from,
  ]);
  if (dump.code !== 0) throw new PlainError(`MariaDB could not copy ${from}: ${readError(dump.stderr)}`);
  await administer({ socket, sql: `drop database if exists ${quoteName(to)}; ${createDatabaseSql(to)}` });
  await administer({ socket, sql: dump.stdout, database: to });
}

/**
 * The statement that makes a database with the project's collation.
 *
 * The collation is written out because `character set utf8mb4` alone picks utf8mb4_general_ci, whatever the
 * server's default is.
 *
 * @param {string} name
 * @returns {string} SQL, with its semicolon
 */
export function createDatabaseSql(name) {
  return `create database if not exists ${quoteName(name)} character set utf8mb4 collate utf8mb4_unicode_520_ci;`;
}

/**
 * Quotes a database, table or column name for SQL.
 *
 * @param {string} name
 * @returns {string}
 */
export function quoteName(name) {
  return `\`${name.replaceAll("`", "``")}\``;
}

/**
 * Quotes text for SQL.
 *
 * @param {string} text
 * @returns {string}
 */
export function quoteText(text) {
  return `'${text.replaceAll("\\", "\\\\").replaceAll("'", "''")}'`;
}

/**
 * The client prints the statement beside the reason; the statement may hold a password and is left out.
 *
 * @param {string} text
 * @returns {string}
 */
function readError(text) {
  const reasons = text
    .split("\n")
    .filter((line) => /\b(ERROR|error)\b/.test(line) && !/identified by/i.test(line));
  return reasons.join(" ") || "no reason given";
}
