import { createHash } from "node:crypto";
import { chmodSync, existsSync, mkdirSync, readdirSync, renameSync, rmSync, statSync } from "node:fs";
import { tmpdir, userInfo } from "node:os";
import { join, resolve } from "node:path";
import { findProgram } from "./debian-packages.mjs";
import { PlainError } from "./plain-error.mjs";
import { runCommand } from "./run-command.mjs";

/**
 * Where one database keeps its things. `tables` is MariaDB's own data folder.
 *
 * @typedef {{ root: string, tables: string, unfinished: string, temporary: string, errorLog: string,
 *   pidFile: string, socket: string, settings: string }} DataFolder
 */

// The kernel's address of a socket holds 108 bytes with its final zero (unix(7)); stay clear of it.
const longestSocketPath = 100;

/**
 * Names every path of a data folder. Touches nothing.
 *
 * @param {string} dataDir
 * @returns {DataFolder}
 */
export function locateDataFolder(dataDir) {
  const root = resolve(dataDir);
  const near = join(root, "mariadb.sock");
  const mark = createHash("sha256").update(root).digest("hex").slice(0, 12);
  return {
    root,
    tables: join(root, "tables"),
    unfinished: join(root, "tables.unfinished"),
    temporary: join(root, "temporary"),
    errorLog: join(root, "mariadb-error.log"),
    pidFile: join(root, "mariadb.pid"),
    socket:
      Buffer.byteLength(near) <= longestSocketPath
        ? near
        : join(tmpdir(), `emberladder-${mark}`, "mariadb.sock"),
    settings: join(root, "server.json"),
  };
}

/**
 * Makes the data folder ready to be served: creates what is missing, clears away what a killed first start left
 * half made, and never deletes a folder that may hold data.
 *
 * The tables are made under another name and renamed when they are complete, so a folder called `tables` is
 * always whole, and one called `tables.unfinished` never held anything of the project's.
 *
 * @param {DataFolder} folder
 * @param {{ report: (line: string) => void }} options
 * @returns {Promise<{ isNew: boolean }>}
 * @throws {PlainError} when the tables folder is there, is not empty and is not a database
 */
export async function prepareDataFolder(folder, { report }) {
  for (const path of [folder.root, folder.temporary]) mkdirSync(path, { recursive: true, mode: 0o700 });
  makePrivateFolderFor(folder.socket);
  if (existsSync(folder.unfinished)) {
    report("removing a half-made data folder that an interrupted first start left behind (it held no data)");
    rmSync(folder.unfinished, { recursive: true, force: true });
  }
  if (existsSync(folder.tables)) {
    if (isWholeDatabase(folder.tables)) return { isNew: false };
    if (readdirSync(folder.tables).length > 0) {
      throw new PlainError(
        `The folder ${folder.tables} is not a complete database, and it is not empty. Nothing in it was changed. ` +
          "Restore it from a backup, or move it away to start with an empty database.",
      );
    }
    rmSync(folder.tables, { recursive: true });
  }
  report("making a new data folder");
  await initialiseTables(folder);
  return { isNew: true };
}

/**
 * The arguments that let the server's programs run as whoever started them: MariaDB refuses to run as root
 * unless it is told so.
 *
 * @returns {string[]}
 */
export function runAsArguments() {
  return process.getuid?.() === 0 ? ["--user=root"] : [];
}

/** @param {DataFolder} folder */
async function initialiseTables(folder) {
  const result = await runCommand(findProgram("mariadb-install-db") ?? "mariadb-install-db", [
    "--no-defaults",
    ...runAsArguments(),
    "--auth-root-authentication-method=socket",
    `--auth-root-socket-user=${userInfo().username}`,
    "--skip-test-db",
    `--datadir=${folder.unfinished}`,
    "--basedir=/usr",
  ]);
  if (result.code !== 0 || !isWholeDatabase(folder.unfinished)) {
    rmSync(folder.unfinished, { recursive: true, force: true });
    const said = `${result.stdout}\n${result.stderr}`.trim().split("\n").slice(-8).join("\n  ");
    throw new PlainError(`MariaDB could not make its data folder ${folder.tables}. It said:\n  ${said}`);
  }
  renameSync(folder.unfinished, folder.tables);
}

/** @param {string} path */
function isWholeDatabase(path) {
  return ["mysql", "ibdata1"].every((name) => existsSync(join(path, name)));
}

/**
 * A long data path puts the socket into the system's temporary folder, where others may write; so its folder
 * has to be our own and closed to them.
 *
 * @param {string} socket
 */
function makePrivateFolderFor(socket) {
  const path = resolve(socket, "..");
  mkdirSync(path, { recursive: true, mode: 0o700 });
  if (process.getuid !== undefined && statSync(path).uid !== process.getuid()) {
    throw new PlainError(`The folder ${path} belongs to another user. Remove it, then try again.`);
  }
  chmodSync(path, 0o700);
}

/**
 * Removes the socket's folder when it lies outside the data folder. Nothing else is ever in it.
 *
 * @param {DataFolder} folder
 * @returns {void}
 */
export function removeSocketFolder(folder) {
  const path = resolve(folder.socket, "..");
  if (path !== folder.root) rmSync(path, { recursive: true, force: true });
}
