import { spawn } from "node:child_process";
import { closeSync, mkdirSync, openSync, readFileSync, renameSync, statSync } from "node:fs";
import { dirname } from "node:path";
import { endProcess, markProcess, PlainError } from "../../../db/src/server/server.mjs";

/** @typedef {import("../../../db/src/server/server.mjs").ProcessMark} ProcessMark */

/**
 * A program of the product to keep running.
 *
 * - `args`: arguments of node
 * - `logFile`: where its output goes; undefined lets it print to the terminal
 *
 * @typedef {{ name: string, args: string[], cwd: string, env: NodeJS.ProcessEnv, logFile: string | undefined }} Program
 */

const mostRestarts = 3;
const restartWindowMs = 60_000;
// A log that has grown past this is set aside at the next start, so that the demo cannot fill a disk.
const largestLogBytes = 5_000_000;

/**
 * Starts a program and keeps it running: when it ends by itself it is started again, at most three times in a
 * minute.
 *
 * @param {Program} program
 * @param {{ onStart: (mark: ProcessMark) => void, report: (text: string) => void,
 *   onGivenUp: (error: PlainError) => void }} options
 * @returns {{ stop: () => Promise<void> }}
 */
export function keepRunning(program, { onStart, report, onGivenUp }) {
  let isStopping = false;
  /** @type {number[]} */
  const restarts = [];
  /** @type {ProcessMark | undefined} */
  let mark;

  const start = () => {
    const child = spawnProgram(program);
    mark = child.pid === undefined ? undefined : markProcess(child.pid);
    if (mark !== undefined) onStart(mark);
    child.once("error", (error) => report(`could not be started: ${error.message}`));
    child.once("close", (code, signal) => {
      if (isStopping) return;
      const now = Date.now();
      restarts.push(now);
      const recent = restarts.filter((time) => now - time < restartWindowMs);
      const what = `${program.name} ended by itself (${signal ?? `code ${code}`})`;
      if (recent.length > mostRestarts) {
        onGivenUp(new PlainError(`${what} again and again.${quoteLog(program.logFile)}`));
        return;
      }
      report(`${what}; starting it again.${quoteLog(program.logFile)}`);
      start();
    });
  };
  start();

  return {
    stop: async () => {
      isStopping = true;
      if (mark !== undefined) await endProcess(mark, { patienceMs: 10_000 });
    },
  };
}

/**
 * Runs a program of the product to its end.
 *
 * @param {Program} program
 * @param {import("./shutdown.mjs").Shutdown} shutdown
 * @returns {Promise<void>}
 * @throws {PlainError} when it fails, with the end of its log
 */
export async function runToEnd(program, shutdown) {
  const child = spawnProgram(program);
  const mark = child.pid === undefined ? undefined : markProcess(child.pid);
  if (mark !== undefined) shutdown.add(program.name, async () => endProcess(mark));
  const code = await new Promise((resolve) => {
    child.once("error", () => resolve(127));
    child.once("close", resolve);
  });
  shutdown.check();
  if (code !== 0) throw new PlainError(`${program.name} did not succeed.${quoteLog(program.logFile)}`);
}

/** @param {Program} program */
function spawnProgram({ args, cwd, env, logFile }) {
  const log = logFile === undefined ? undefined : openLog(logFile);
  const child = spawn(process.execPath, args, {
    cwd,
    env,
    // Its own process group: Ctrl-C reaches the launcher alone, which then stops everything in order.
    detached: true,
    stdio: ["ignore", log ?? "inherit", log ?? "inherit"],
  });
  if (log !== undefined) closeSync(log);
  return child;
}

/** @param {string} path */
function openLog(path) {
  mkdirSync(dirname(path), { recursive: true, mode: 0o700 });
  if ((statSync(path, { throwIfNoEntry: false })?.size ?? 0) > largestLogBytes) renameSync(path, `${path}.1`);
  return openSync(path, "a", 0o600);
}

/** @param {string | undefined} path */
function quoteLog(path) {
  if (path === undefined) return "";
  try {
    const lines = readFileSync(path, "utf8").trim().split("\n").slice(-8);
    return ` Its log ${path} ends with:\n  ${lines.join("\n  ")}`;
  } catch {
    return ` Its log is ${path}.`;
  }
}
