import { join } from "node:path";
import {
  endProcess,
  isPortFree,
  isRunning,
  markProcess,
  PlainError,
  readJson,
  writePrivateJson,
} from "../../../db/src/server/server.mjs";

/** @typedef {import("../../../db/src/server/server.mjs").ProcessMark} ProcessMark */
/** @typedef {{ owner?: ProcessMark, address: string, children: ProcessMark[] }} LockContent */

/**
 * Says who serves a data folder.
 *
 * - `noteChild(mark)`: remembers a process, so that the next start can end it if this one is killed
 * - `release()`: forgets everything, after a clean stop
 *
 * @typedef {{ noteChild: (mark: ProcessMark) => void, release: () => void }} LaunchLock
 */

/**
 * Makes sure that nobody else serves this data folder and that the port is free, and ends what a killed earlier
 * run has left behind.
 *
 * @param {{ dataDir: string, port: number, report: (text: string) => void }} options `dataDir` has to exist
 * @returns {Promise<LaunchLock>}
 * @throws {PlainError} when the product is running already or another program has the port
 */
export async function takeLaunchLock({ dataDir, port, report }) {
  const path = join(dataDir, "launcher.json");
  const earlier = /** @type {LockContent | undefined} */ (readJson(path));
  if (earlier?.owner !== undefined && isRunning(earlier.owner)) {
    throw new PlainError(
      `Emberladder is already running at ${earlier.address} (process ${earlier.owner.pid}). ` +
        "Open that address, or stop it first with Ctrl-C in its window.",
    );
  }
  for (const mark of earlier?.children ?? []) {
    if (!isRunning(mark)) continue;
    report(`stopping process ${mark.pid}, which an earlier, killed run left behind`);
    await endProcess(mark);
  }
  if (!(await isPortFree(port))) {
    throw new PlainError(
      `Port ${port} is in use by another program. Stop that program, or choose another port: PORT=${port + 1} npm start`,
    );
  }
  /** @type {LockContent} */
  const content = { owner: markProcess(process.pid), address: `http://127.0.0.1:${port}`, children: [] };
  writePrivateJson(path, content);
  return {
    noteChild: (mark) => {
      content.children = [...content.children.filter((child) => isRunning(child)), mark];
      writePrivateJson(path, content);
    },
    release: () => writePrivateJson(path, { ...content, owner: undefined, children: [] }),
  };
}
