import { createHash } from "node:crypto";
import { existsSync, readFileSync, rmSync, writeFileSync } from "node:fs";
import { join } from "node:path";
import { runTool } from "./tools.mjs";

// The version in package.json "packageManager"; called through npx because a bare machine has npm only.
const packageManager = "pnpm@12.4.2";

/**
 * Installs exactly what the lock file says, unless the last install was of this very lock file.
 *
 * @param {{ root: string, shutdown: import("./shutdown.mjs").Shutdown, say: (text: string) => void }} options
 * @returns {Promise<"unchanged" | "installed">}
 * @throws {import("../../../db/src/server/server.mjs").PlainError} with what the package manager said
 */
export async function installDependencies({ root, shutdown, say }) {
  const markPath = join(root, "node_modules/.emberladder-lock");
  const mark = createHash("sha256")
    .update(readFileSync(join(root, "pnpm-lock.yaml")))
    .digest("hex");
  const isComplete = existsSync(join(root, "node_modules/.modules.yaml"));
  if (isComplete && existsSync(markPath) && readFileSync(markPath, "utf8") === mark) return "unchanged";
  say("installing, about half a minute the first time");
  // Without the mark an install that is killed half way is done again next time.
  rmSync(markPath, { force: true });
  await runTool(shutdown, {
    name: "The package manager",
    command: "npx",
    args: ["--yes", packageManager, "install", "--frozen-lockfile"],
    cwd: root,
    // Makes it ask nothing when there is a terminal.
    env: { CI: "true" },
  });
  writeFileSync(markPath, mark);
  return "installed";
}
