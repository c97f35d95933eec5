/** Checks the types of every part of the workspace that has a tsconfig: `node tests/typecheck.mjs`. */
import { existsSync, readdirSync } from "node:fs";
import { availableParallelism } from "node:os";
import { join } from "node:path";
import { fileURLToPath } from "node:url";
import { runCommand } from "@emberladder/db/server";

const root = fileURLToPath(new URL("..", import.meta.url));
const projects = ["packages", "apps"]
  .flatMap((folder) => readdirSync(join(root, folder)).map((name) => `${folder}/${name}`))
  .concat("db", "tests")
  .filter((path) => existsSync(join(root, path, "tsconfig.json")));

let failures = 0;

/** Takes one project after the other from the list until it is empty. */
async function checkNext() {
  for (let path = projects.shift(); path !== undefined; path = projects.shift()) {
    const result = await runCommand(
      join(root, "node_modules/.bin/tsc"),
      ["--noEmit", "--pretty", "false", "-p", path],
      {
        cwd: root,
      },
    );
    if (result.code === 0) continue;
    failures += 1;
    process.stdout.write(`${path}:\n${result.stdout}${result.stderr}\n`);
  }
}

await Promise.all(Array.from({ length: Math.min(2, availableParallelism()) }, checkNext));
process.exitCode = failures === 0 ? 0 : 1;
