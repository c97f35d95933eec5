import { readFileSync } from "node:fs";
import { setTimeout as sleep } from "node:timers/promises";

/**
 * A process that can be recognised again later. A process id alone is reused by the system; the id together
 * with the start time is not.
 *
 * @typedef {{ pid: number, startedAt: string }} ProcessMark
 */

/**
 * Reads when a process started, as the kernel counts it.
 *
 * @param {number} pid
 * @returns {string | undefined} boot id and clock ticks since boot (fields of /proc/<pid>/stat, proc(5));
 * undefined when there is no such process or it is a zombie
 */
export function readStartTime(pid) {
  try {
    const stat = readFileSync(`/proc/${pid}/stat`, "utf8");
    // The command name is in brackets and may itself hold spaces or brackets, so count from the last one.
    const fields = stat.slice(stat.lastIndexOf(")") + 2).split(" ");
    const state = fields[0];
    const ticks = fields[19];
    if (state === "Z" || state === "X" || ticks === undefined) return undefined;
    return `${readFileSync("/proc/sys/kernel/random/boot_id", "utf8").trim()}/${ticks}`;
  } catch {
    return undefined;
  }
}

/**
 * Marks a running process so that {@link isRunning} can tell it from a later one with the same id.
 *
 * @param {number} pid
 * @returns {ProcessMark | undefined} undefined when the process is gone already
 */
export function markProcess(pid) {
  const startedAt = readStartTime(pid);
  return startedAt === undefined ? undefined : { pid, startedAt };
}

/**
 * Tells whether the marked process still runs.
 *
 * @param {ProcessMark | undefined} mark
 * @returns {boolean}
 */
export function isRunning(mark) {
  return mark !== undefined && readStartTime(mark.pid) === mark.startedAt;
}

/**
 * Reads the arguments a process was started with.
 *
 * @param {number} pid
 * @returns {string[]} empty when the process is gone or belongs to somebody else
 */
export function readArguments(pid) {
  try {
    return readFileSync(`/proc/${pid}/cmdline`, "utf8").split("\0");
  } catch {
    return [];
  }
}

/**
 * Ends a marked process: SIGTERM first, SIGKILL when it has not gone in time. Does nothing when it is gone.
 *
 * @param {ProcessMark} mark
 * @param {{ patienceMs?: number }} [options] milliseconds between SIGTERM and SIGKILL, default 10 000
 * @returns {Promise<void>}
 */
export async function endProcess(mark, { patienceMs = 10_000 } = {}) {
  if (!isRunning(mark)) return;
  sendSignal(mark.pid, "SIGTERM");
  const deadline = Date.now() + patienceMs;
  while (isRunning(mark)) {
    if (Date.now() > deadline) sendSignal(mark.pid, "SIGKILL");
    if (Date.now() > deadline + 5_000) return;
    await sleep(25);
  }
}

/**
 * Sends a signal and does not mind when the process is gone already.
 *
 * @param {number} pid
 * @param {NodeJS.Signals} signal
 * @returns {void}
 */
export function sendSignal(pid, signal) {
  try {
    process.kill(pid, signal);
  } catch (error) {
    if (/** @type {NodeJS.ErrnoException} */ (error).code !== "ESRCH") throw error;
  }
}
