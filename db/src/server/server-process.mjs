import { spawn } from "node:child_process";
import { readFileSync, readdirSync, rmSync } from "node:fs";
import net from "node:net";
import { basename } from "node:path";
import { setTimeout as sleep } from "node:timers/promises";
import { runAsArguments } from "./data-folder.mjs";
import { PlainError } from "./plain-error.mjs";
import { endProcess, markProcess, readArguments } from "./processes.mjs";

/** @typedef {import("./data-folder.mjs").DataFolder} DataFolder */
/** @typedef {import("./processes.mjs").ProcessMark} ProcessMark */

// Recovery after a crash replays the redo log before the socket answers; a small log takes seconds, not minutes.
const startPatienceMs = 120_000;

/** Thrown inside this folder when the port was taken between choosing and binding it. */
export class PortTakenError extends Error {}

/**
 * Starts mariadbd on the loopback address and waits until it answers on its socket.
 *
 * Every acknowledged commit is on the disk (innodb_flush_log_at_trx_commit=1). Times are UTC. No option file of
 * the machine is read.
 *
 * @param {{ program: string, folder: DataFolder, port: number }} request
 * @returns {Promise<{ child: import("node:child_process").ChildProcess, mark: ProcessMark }>}
 * @throws {PortTakenError | PlainError}
 */
export async function launchServer({ program, folder, port }) {
  rmSync(folder.errorLog, { force: true });
  rmSync(folder.socket, { force: true });
  const child = spawn(program, serverArguments(folder, port), {
    // Its own process group: Ctrl-C in a terminal reaches whoever started it, which then stops it in order.
    detached: true,
    stdio: "ignore",
  });
  /** @type {string | undefined} */
  let ended;
  child.once("error", (error) => (ended = error.message));
  child.once("exit", (code, signal) => (ended = `it ended with ${signal ?? `code ${code}`}`));
  const deadline = Date.now() + startPatienceMs;
  while (!(await answers(folder.socket))) {
    if (ended !== undefined) throw explainFailedStart(folder, ended);
    if (Date.now() > deadline) {
      child.kill("SIGTERM");
      throw explainFailedStart(folder, `it did not answer within ${startPatienceMs / 1000} seconds`);
    }
    await sleep(30);
  }
  const mark = child.pid === undefined ? undefined : markProcess(child.pid);
  if (mark === undefined) throw explainFailedStart(folder, ended ?? "it ended at once");
  return { child, mark };
}

/**
 * Stops servers of this data folder that an earlier, killed run left behind. A server is recognised by the data
 * folder among its own arguments, so that no other MariaDB of the machine is ever touched.
 *
 * @param {DataFolder} folder
 * @param {{ report: (line: string) => void }} options
 * @returns {Promise<void>}
 */
export async function stopLeftoverServers(folder, { report }) {
  for (const pid of findServers(folder)) {
    const mark = markProcess(pid);
    if (mark === undefined) continue;
    report(`stopping the database server that an earlier, killed run left behind (process ${pid})`);
    await endProcess(mark, { patienceMs: 60_000 });
  }
}

/**
 * @param {DataFolder} folder
 * @returns {number[]}
 */
function findServers(folder) {
  return readdirSync("/proc")
    .filter((name) => /^\d+$/.test(name))
    .map(Number)
    .filter((pid) => {
      const args = readArguments(pid);
      return basename(args[0] ?? "") === "mariadbd" && args.includes(`--datadir=${folder.tables}`);
    });
}

/**
 * @param {DataFolder} folder
 * @param {number} port
 * @returns {string[]}
 */
function serverArguments(folder, port) {
  return [
    "--no-defaults",
    ...runAsArguments(),
    `--datadir=${folder.tables}`,
    `--socket=${folder.socket}`,
    `--pid-file=${folder.pidFile}`,
    `--log-error=${folder.errorLog}`,
    `--tmpdir=${folder.temporary}`,
    "--bind-address=127.0.0.1",
    `--port=${port}`,
    "--skip-name-resolve",
    "--character-set-server=utf8mb4",
    "--collation-server=utf8mb4_unicode_520_ci",
    "--default-time-zone=+00:00",
    "--innodb-flush-log-at-trx-commit=1",
    // Without locks on gaps, diagnoses that are opened side by side do not wait for each other or deadlock.
    "--transaction-isolation=READ-COMMITTED",
    "--innodb-buffer-pool-size=256M",
    "--max-connections=200",
    "--max-allowed-packet=16M",
    "--performance-schema=OFF",
  ];
}

/**
 * The server sends its greeting only when recovery is done and it takes connections.
 *
 * @param {string} socket
 * @returns {Promise<boolean>}
 */
async function answers(socket) {
  return new Promise((resolve) => {
    const connection = net.connect(socket);
    /** @param {boolean} result */
    const finish = (result) => {
      connection.destroy();
      resolve(result);
    };
    connection.setTimeout(1_000, () => finish(false));
    connection.once("data", () => finish(true));
    connection.once("error", () => finish(false));
    connection.once("end", () => finish(false));
  });
}

/**
 * @param {DataFolder} folder
 * @param {string} ended
 * @returns {Error}
 */
function explainFailedStart(folder, ended) {
  const log = readLog(folder.errorLog);
  if (/Bind on TCP\/IP port|Address already in use/i.test(log)) return new PortTakenError("port taken");
  const errors = log
    .split("\n")
    .filter((line) => line.includes("[ERROR]"))
    .slice(-5)
    .map((line) => `\n  ${line}`);
  return new PlainError(
    `The database server did not start: ${ended}. The data in ${folder.tables} was left as it is. ` +
      `Its log is ${folder.errorLog}${errors.length > 0 ? ` and says:${errors.join("")}` : "."}`,
  );
}

/** @param {string} path */
function readLog(path) {
  try {
    return readFileSync(path, "utf8");
  } catch {
    return "";
  }
}
