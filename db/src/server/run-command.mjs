import { spawn } from "node:child_process";

/**
 * Runs a program to its end.
 *
 * @param {string} command
 * @param {string[]} args
 * @param {{ input?: string, cwd?: string, env?: NodeJS.ProcessEnv }} [options] `input` is written to its
 * standard input
 * @returns {Promise<{ code: number, stdout: string, stderr: string }>} code 127 when the program is not there,
 * 128 when a signal ended it
 */
export async function runCommand(command, args, { input = "", cwd, env } = {}) {
  return new Promise((resolve) => {
    const child = spawn(command, args, { cwd, env, stdio: ["pipe", "pipe", "pipe"] });
    let stdout = "";
    let stderr = "";
    child.stdout.setEncoding("utf8").on("data", (text) => (stdout += text));
    child.stderr.setEncoding("utf8").on("data", (text) => (stderr += text));
    child.once("error", (error) => resolve({ code: 127, stdout, stderr: `${stderr}${error.message}` }));
    child.once("close", (code) => resolve({ code: code ?? 128, stdout, stderr }));
    // A program that ends before reading everything closes its input; its exit code says what happened.
    child.stdin.on("error", () => undefined);
    child.stdin.end(input);
  });
}
