import { mkdirSync, mkdtempSync, readdirSync, rmSync } from "node:fs";
import { tmpdir } from "node:os";
import { join } from "node:path";
import { endProcess, isRunning, markProcess, readJson, writePrivateJson } from "@emberladder/db/server";

/** @typedef {import("@emberladder/db/server").ProcessMark} ProcessMark */

const prefix = "emberladder-test-";

/**
 * The folder of one test run. `temporary` is for what the tests make themselves (TMPDIR); `remove` ends whatever
 * database or server was left running in it, and deletes it.
 *
 * @typedef {{ path: string, temporary: string, remove: () => Promise<void> }} TestFolder
 */

/**
 * Makes a folder for one test run in the system's temporary folder, and clears away those of runs that were
 * killed, with the servers they left behind.
 *
 * @returns {Promise<TestFolder>}
 */
export async function makeTestFolder() {
  await clearAbandonedFolders();
  const path = mkdtempSync(join(tmpdir(), prefix));
  writePrivateJson(join(path, "owner.json"), markProcess(process.pid));
  const temporary = join(path, "tmp");
  mkdirSync(temporary);
  return { path, temporary, remove: async () => clearFolder(path) };
}

async function clearAbandonedFolders() {
  for (const name of readdirSync(tmpdir()).filter((entry) => entry.startsWith(prefix))) {
    const path = join(tmpdir(), name);
    const owner = /** @type {ProcessMark | undefined} */ (readJson(join(path, "owner.json")));
    // Without a mark the folder is being made at this moment by another run.
    if (owner !== undefined && !isRunning(owner)) await clearFolder(path);
  }
}

/** @param {string} path */
async function clearFolder(path) {
  for (const mark of findMarks(path)) await endProcess(mark);
  // A process that is just ending may still write; then the folder is not empty at the first attempt.
  rmSync(path, { recursive: true, force: true, maxRetries: 10, retryDelay: 100 });
}

/**
 * The processes of a run, as its database and its launcher have written them down.
 *
 * @param {string} path
 * @returns {ProcessMark[]}
 */
function findMarks(path) {
  const folders = readdirSync(path, { withFileTypes: true, recursive: true });
  return folders.flatMap((entry) => {
    const file = join(entry.parentPath, entry.name);
    if (entry.name === "launcher.json") {
      return /** @type {{ children?: ProcessMark[] } | undefined} */ (readJson(file))?.children ?? [];
    }
    if (entry.name !== "server.json") return [];
    const server = /** @type {{ server?: ProcessMark } | undefined} */ (readJson(file))?.server;
    return server === undefined ? [] : [server];
  });
}
