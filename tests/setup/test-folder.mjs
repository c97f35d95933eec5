import { mkdtempSync, readdirSync, rmSync } from "node:fs";
import { tmpdir } from "node:os";
import { join } from "node:path";
import { endProcess, isRunning, markProcess, readJson, writePrivateJson } from "@emberladder/db/server";

/** @typedef {import("@emberladder/db/server").ProcessMark} ProcessMark */

const prefix = "emberladder-test-";

/**
 * Makes a folder for one test run in the system's temporary folder, and clears away those of runs that were
 * killed, with the database servers they left behind.
 *
 * @returns {Promise<{ path: string, remove: () => void }>}
 */
export async function makeTestFolder() {
  await clearAbandonedFolders();
  const path = mkdtempSync(join(tmpdir(), prefix));
  writePrivateJson(join(path, "owner.json"), markProcess(process.pid));
  return { path, remove: () => rmSync(path, { recursive: true, force: true }) };
}

async function clearAbandonedFolders() {
  for (const name of readdirSync(tmpdir()).filter((entry) => entry.startsWith(prefix))) {
    const path = join(tmpdir(), name);
    const owner = /** @type {ProcessMark | undefined} */ (readJson(join(path, "owner.json")));
    // Without a mark the folder is being made at this moment by another run.
    if (owner === undefined || isRunning(owner)) continue;
    for (const mark of findMarks(path)) await endProcess(mark);
    rmSync(path, { recursive: true, force: true });
  }
}

/**
 * The processes of an abandoned run, as its database and its launcher have written them down.
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
