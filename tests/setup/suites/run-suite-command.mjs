import { spawn } from "node:child_process";

// A suite that takes this long hangs: the whole run has to end within 12 minutes.
const patienceMs = 11 * 60_000;

/**
 * Runs the command of a suite and keeps what it prints, both streams in order. It runs in its own process group, so
 * that an abandoned run or a hanging suite ends with everything it had started.
 *
 * @param {import("../../../apps/launcher/src/shutdown.mjs").Shutdown} shutdown
 * @param {{ name: string, args: string[], cwd: string, folder: import("../test-folder.mjs").TestFolder,
 *   env?: Record<string, string> }} command `args` of node
 * @returns {Promise<{ code: number, output: string }>}
 */
export async function runSuiteCommand(shutdown, { name, args, cwd, folder, env = {} }) {
  shutdown.check();
  const child = spawn(process.execPath, args, {
    cwd,
    env: { ...process.env, ...env, TMPDIR: folder.temporary, FORCE_COLOR: undefined, NO_COLOR: "1" },
    detached: true,
    stdio: ["ignore", "pipe", "pipe"],
  });
  let output = "";
  for (const stream of [child.stdout, child.stderr])
    stream.setEncoding("utf8").on("data", (text) => (output += text));
  let isDone = false;
  /** @type {Promise<number>} */
  const ended = new Promise((resolve) => {
    child.once("error", (error) => {
      output += error.message;
      resolve(127);
    });
    child.once("close", (code) => resolve(code ?? 128));
  });
  /** @param {NodeJS.Signals} signal */
  const end = (signal) => {
    if (!isDone && child.pid !== undefined) process.kill(-child.pid, signal);
  };
  const timer = setTimeout(() => {
    output += `\n${name} was ended because it took longer than ${patienceMs / 60_000} minutes.\n`;
    end("SIGKILL");
  }, patienceMs);
  shutdown.add(name, async () => {
    end("SIGTERM");
    await ended;
  });
  const code = await ended;
  isDone = true;
  clearTimeout(timer);
  return { code, output };
}
