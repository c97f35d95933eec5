import { spawn } from "node:child_process";
import { PlainError } from "../../../db/src/server/server.mjs";

/**
 * Runs a tool such as the package manager or the bundler to its end, and ends it when the start is cancelled.
 *
 * @param {import("./shutdown.mjs").Shutdown} shutdown
 * @param {{ name: string, command: string, args: string[], cwd: string, env?: NodeJS.ProcessEnv }} tool
 * @returns {Promise<string>} what it printed
 * @throws {PlainError} with the last lines it printed when it fails
 */
export async function runTool(shutdown, { name, command, args, cwd, env = {} }) {
  shutdown.check();
  const child = spawn(command, args, {
    cwd,
    env: { ...process.env, ...env },
    // Its own process group, so that one signal ends it together with whatever it started.
    detached: true,
    stdio: ["ignore", "pipe", "pipe"],
  });
  let output = "";
  for (const stream of [child.stdout, child.stderr])
    stream.setEncoding("utf8").on("data", (text) => (output += text));
  const code = new Promise((resolve) => {
    child.once("error", (error) => {
      output += error.message;
      resolve(127);
    });
    child.once("close", resolve);
  });
  let isDone = false;
  shutdown.add(name, async () => {
    if (isDone || child.pid === undefined) return;
    process.kill(-child.pid, "SIGTERM");
    await code;
  });
  const result = await code;
  isDone = true;
  shutdown.check();
  if (result === 0) return output;
  const tail = output.trim().split("\n").slice(-25).join("\n  ");
  throw new PlainError(`${name} did not succeed. It said:\n  ${tail}`);
}
